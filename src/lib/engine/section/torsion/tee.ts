import type { Fabrication } from '../definition';
import type { TorsionFigures } from '../shape';
import { rectangleTorsion } from './bars';
import { elDarwishJohnstonTee } from './junction';

interface TeeSizes {
	readonly h: number;
	readonly b: number;
	readonly tw: number;
	readonly tf: number;
	readonly r: number;
}

/**
 * Torsion figures of a tee. Warping constant of two thin plates that meet in a line,
 * (tf³b³/4 + tw³d³)/36 with d = h − tf/2, and shear centre where their middle lines cross
 * (Seaburg & Carter, Torsional Analysis of Structural Steel Members, AISC 1997, appendix C).
 */
export function teeTorsion(sizes: TeeSizes, fabrication: Fabrication): TorsionFigures {
	const { h, b, tw, tf } = sizes;
	const depth = h - tf / 2;
	return {
		torsionConstant: fabrication === 'rolled' ? rolledTee(sizes) : weldedTee(sizes),
		warpingConstant: ((tf * b) ** 3 / 4 + (tw * depth) ** 3) / 36,
		shearCentre: { y: b / 2, z: h - tf / 2 }
	};
}

/** El Darwish & Johnston (1965), mm⁴: walls as bt³/3 less 0.105t⁴ at each of the three free ends. */
function rolledTee({ h, b, tw, tf, r }: TeeSizes): number {
	const flange = (b * tf ** 3) / 3 - 0.21 * tf ** 4;
	const web = ((h - tf) * tw ** 3) / 3 - 0.105 * tw ** 4;
	return flange + web + elDarwishJohnstonTee(tw, tf, r);
}

/** Flange as a rectangle by Saint-Venant's series, web as a strip with one free end; junction left out. */
function weldedTee({ h, b, tw, tf }: TeeSizes): number {
	const web = ((h - tf) * tw ** 3) / 3 - 0.105 * tw ** 4;
	return rectangleTorsion(b, tf) + Math.max(web, 0);
}
