import { mostRatio } from './bend-state.svelte';

const steps: Record<string, number> = {
	ArrowRight: 0.1,
	ArrowUp: 0.1,
	ArrowLeft: -0.1,
	ArrowDown: -0.1,
	PageUp: 1,
	PageDown: -1
};

const round = (ratio: number) => Math.round(ratio * 1e6) / 1e6;

/**
 * The curvature ratio after a key: arrows by 0.1 (with Shift 1), pages by 1, Home and End to the
 * most in either sense; null for any other key.
 */
export function steppedRatio(
	{ key, shiftKey }: Pick<KeyboardEvent, 'key' | 'shiftKey'>,
	ratio: number
): number | null {
	if (key === 'Home') return -mostRatio;
	if (key === 'End') return mostRatio;
	const step = steps[key];
	if (step === undefined) return null;
	return Math.max(-mostRatio, Math.min(mostRatio, round(ratio + step * (shiftKey ? 10 : 1))));
}
