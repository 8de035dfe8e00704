import type { BendState } from '../bend-state.svelte';
import { mostTurns } from '../turns';

export const mostCycles = mostTurns / 2;
/** Reach of a cycle, in multiples of the curvature at first yield. */
const furthest = 50;

/**
 * The ratios between which a section from mill or shop is bent to and fro: ±size itself, or the
 * curvatures that carry ±size kNm; null when no state carries them.
 */
export function cycleRatios(
	{ fresh, unit }: Pick<BendState, 'fresh' | 'unit'>,
	by: 'ratio' | 'moment',
	size: number
): { there: number; back: number } | null {
	if (by === 'ratio') {
		const ratio = Math.max(-furthest, Math.min(furthest, size));
		return { there: ratio, back: -ratio };
	}
	const there = fresh.atMoment(size).curvature;
	const back = fresh.atMoment(-size).curvature;
	return there === null || back === null ? null : { there: there / unit, back: back / unit };
}
