import { SvelteSet } from 'svelte/reactivity';

const left = new SvelteSet<() => void>();

/** Texts that fields could not read and still show. Changed from events only: it is the browser's. */
export const badText = {
	get stands(): boolean {
		return left.size > 0;
	},
	/** `clear` puts the field back to its value. */
	tell(clear: () => void): void {
		left.add(clear);
	},
	forget(clear: () => void): void {
		left.delete(clear);
	},
	/** Clears every such text; false when there was none. */
	clear(): boolean {
		const all = [...left];
		left.clear();
		for (const clear of all) clear();
		return all.length > 0;
	}
};
