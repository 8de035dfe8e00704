import { flushSync } from 'svelte';

/** Carries out a change that the page passes over to in one short move, where motion is welcome. */
export function morph(change: () => void): void {
	const still = !('startViewTransition' in document) || matchMedia(quiet).matches;
	if (still) change();
	else document.startViewTransition(() => flushSync(change));
}

const quiet = '(prefers-reduced-motion: reduce)';
