import type { BeforeNavigate } from '@sveltejs/kit';

/** Holds a navigation back until the person has chosen what becomes of their changes. */
export class Leaving {
	asked = $state(false);
	#onward: (() => void) | null = null;
	#free = false;

	/** Call from beforeNavigate; `go` follows a path. The browser itself asks on closing. */
	hold({ to, type, delta, willUnload, cancel }: BeforeNavigate, go: (path: string) => void): void {
		if (this.#free) return;
		cancel();
		if (willUnload || !to) return;
		const { pathname, search, hash } = to.url;
		this.#onward =
			type === 'popstate' ? () => history.go(delta) : () => go(pathname + search + hash);
		this.asked = true;
	}

	/** Leaves for where it was held back from. */
	leave = (): void => {
		this.asked = false;
		this.#free = true;
		this.#onward?.();
	};
}
