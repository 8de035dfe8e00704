import { flushSync, tick } from 'svelte';

/** The printed page is built only while it is printed, so that bending never waits for it. */
export class Printing {
	under = $state(false);
	/** An appendix tells how the figures came about. */
	withWorking = $state(false);

	begin = () => {
		flushSync(() => (this.under = true));
	};

	end = () => {
		this.under = false;
	};

	print = async () => {
		this.under = true;
		await tick();
		window.print();
	};
}
