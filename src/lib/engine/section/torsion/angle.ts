import type { TorsionFigures } from '../shape';
import { elDarwishJohnstonAngle } from './junction';

interface AngleSizes {
	readonly h: number;
	readonly b: number;
	readonly t: number;
	readonly r: number;
}

/**
 * Torsion figures of an angle: torsion constant by El Darwish & Johnston (1965) with the L junction
 * of equal thickness, mm⁴; warping constant of two thin plates that meet in a line,
 * t³(h'³ + b'³)/36 with legs to the middle line, mm⁶, and shear centre where the middle lines cross
 * (Timoshenko & Gere, Theory of Elastic Stability, table A-1).
 */
export function angleTorsion({ h, b, t, r }: AngleSizes): TorsionFigures {
	const legs = ((h + b - t) * t ** 3) / 3 - 0.21 * t ** 4;
	return {
		torsionConstant: legs + elDarwishJohnstonAngle(t, r),
		warpingConstant: (t ** 3 / 36) * ((h - t / 2) ** 3 + (b - t / 2) ** 3),
		shearCentre: { y: t / 2, z: t / 2 }
	};
}
