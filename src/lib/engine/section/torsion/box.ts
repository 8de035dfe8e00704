import type { TorsionFigures } from '../shape';

interface BoxSizes {
	readonly h: number;
	readonly bTop: number;
	readonly bBottom: number;
	readonly tw: number;
	readonly tfTop: number;
	readonly tfBottom: number;
	readonly webGap: number;
	readonly middle: number;
}

/**
 * Box girder: 4 Ah²/∮ds/t over the middle lines of the cell, mm⁴ (Bredt 1896). What the walls and
 * the flange overhangs add on their own is left out. Shear centre by symmetry only; warping
 * constant: no published formula.
 */
export function boxTorsion(sizes: BoxSizes): TorsionFigures {
	const { h, tw, tfTop, tfBottom, webGap, middle } = sizes;
	const width = webGap + tw;
	const depth = h - (tfTop + tfBottom) / 2;
	const round = width / tfTop + width / tfBottom + (2 * depth) / tw;
	return {
		torsionConstant: (4 * (width * depth) ** 2) / round,
		warpingConstant: null,
		shearCentre: isDoublySymmetric(sizes) ? { y: middle, z: h / 2 } : null
	};
}

const isDoublySymmetric = ({ bTop, bBottom, tfTop, tfBottom }: BoxSizes): boolean =>
	bTop === bBottom && tfTop === tfBottom;
