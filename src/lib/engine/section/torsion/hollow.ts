import type { TorsionFigures } from '../shape';

interface RectangularTube {
	readonly h: number;
	readonly b: number;
	readonly t: number;
	readonly ro: number;
	readonly ri: number;
}

/** Area within the middle line of the wall, mm², and the length of that line, mm. */
function middleLine({ h, b, t, ro, ri }: RectangularTube) {
	const rc = (ro + ri) / 2;
	const lost = 4 - Math.PI;
	return {
		enclosed: (b - t) * (h - t) - lost * rc * rc,
		length: 2 * (b - t + h - t) - 2 * lost * rc
	};
}

/**
 * Rectangular hollow section: It = p t³/3 + 4 Ah² t/p, mm⁴ (EN 10210-2:2006 and EN 10219-2:2006,
 * p and Ah of the wall's middle line). Warping constant: no published formula.
 */
export function rectangularHollowTorsion(tube: RectangularTube): TorsionFigures {
	const { enclosed, length } = middleLine(tube);
	return {
		torsionConstant: (length * tube.t ** 3) / 3 + (4 * enclosed ** 2 * tube.t) / length,
		warpingConstant: null,
		shearCentre: { y: tube.b / 2, z: tube.h / 2 }
	};
}

/** The closed-cell term alone, 4 Ah² t/p, mm⁴ (Bredt 1896), as the AISC tables of HSS print it. */
export function bredtHollowTorsion(tube: RectangularTube): number {
	const { enclosed, length } = middleLine(tube);
	return (4 * enclosed ** 2 * tube.t) / length;
}

/** Round tube: exact polar second moment; a circle does not warp (Timoshenko & Goodier, art. 101). */
export const circularHollowTorsion = (d: number, t: number): TorsionFigures => ({
	torsionConstant: (Math.PI / 32) * (d ** 4 - (d - 2 * t) ** 4),
	warpingConstant: 0,
	shearCentre: { y: d / 2, z: d / 2 }
});
