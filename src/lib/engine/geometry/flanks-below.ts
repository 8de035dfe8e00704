import type { Flank } from './flank';
import { addArcAntiderivative, addLineMoments, type Moments } from './flank-moments';

/**
 * Adds the moments of all steel below a level, straight from its flanks: for a single cut, where
 * preparing a whole profile would cost more.
 */
export function addMomentsBelow(out: Moments, flanks: readonly Flank[], level: number): void {
	for (const flank of flanks) {
		const to = Math.min(level, flank.high);
		if (to <= flank.low) continue;
		if (flank.kind === 'line') addLineMoments(out, flank, flank.low, to, flank.sign);
		else {
			addArcAntiderivative(out, flank, to, flank.sign);
			addArcAntiderivative(out, flank, flank.low, -flank.sign);
		}
	}
}

/** Width of the slice at a level, mm. */
export function widthBetween(flanks: readonly Flank[], level: number): number {
	let width = 0;
	for (const flank of flanks) {
		if (level < flank.low || level >= flank.high) continue;
		if (flank.kind === 'line')
			width += flank.sign * (flank.start + flank.slope * (level - flank.low));
		else {
			const u = level - flank.across;
			const half = Math.sqrt(Math.max(0, (flank.radius - u) * (flank.radius + u)));
			width += flank.sign * (flank.along + flank.side * half);
		}
	}
	return width;
}
