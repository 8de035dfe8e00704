import type { Flank } from './flank';
import { addArcAntiderivative, addLineMoments, type Moments } from './flank-moments';

/**
 * Adds the moments of all steel below a level (mm, in the frame of the flanks; `Infinity` for all of
 * it). For bodies that are cut once: nothing is prepared.
 */
export function addMomentsBelow(out: Moments, flanks: readonly Flank[], level: number): void {
	for (const flank of flanks) {
		if (flank.low >= level) continue;
		const to = flank.high < level ? flank.high : level;
		if (flank.kind === 'line') addLineMoments(out, flank, flank.low, to, flank.sign);
		else {
			addArcAntiderivative(out, flank, to, flank.sign);
			addArcAntiderivative(out, flank, flank.low, -flank.sign);
		}
	}
}
