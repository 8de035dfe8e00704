import { badText } from '$lib/components/ui/bad-text.svelte';
import type { Bench } from './bench.svelte';

/** Takes back the last thing: a text that could not be read before any change that was made. */
export function undoStep(bench: Pick<Bench, 'undo'>): void {
	if (!badText.clear()) bench.undo();
}
