import type { AxialResistance } from './axial-resistance';
import type { EnModel } from './model';

/** A shift below this share of the section's reach is rounding where symmetry makes it zero. */
const noShift = 1e-12;

/**
 * Moments (kNm) that N at the gross centroid adds about the axes of the effective section, 6.2.9.3:
 * N eN,y and N eN,z with the contract's signs.
 */
export function addedMoments(
	{ mechanics }: EnModel,
	N: number,
	axial: Pick<AxialResistance, 'shiftY' | 'shiftZ'> | null
): { addedY: number; addedZ: number } {
	const arm = (shift = 0) => (Math.abs(shift) <= noShift * mechanics.reach ? 0 : shift);
	return {
		addedY: N * arm(axial?.shiftZ) * 1e-3 + 0,
		addedZ: -N * arm(axial?.shiftY) * 1e-3 + 0
	};
}
