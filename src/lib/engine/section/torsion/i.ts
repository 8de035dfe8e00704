import type { Fabrication } from '../definition';
import type { TorsionFigures } from '../shape';
import { rectangleTorsion } from './bars';
import { continentalTee, elDarwishJohnstonTee } from './junction';

interface Flanged {
	readonly h: number;
	readonly bTop: number;
	readonly tfTop: number;
	readonly bBottom: number;
	readonly tfBottom: number;
	readonly tw: number;
	readonly r: number;
	readonly middle: number;
}

type Junction = (tw: number, tf: number, r: number) => number;

/** Torsion, warping and shear centre of an I; see the functions below for the sources. */
export function iTorsion(sizes: Flanged, fabrication: Fabrication): TorsionFigures {
	return {
		torsionConstant:
			fabrication === 'rolled'
				? rolledITorsion(sizes, elDarwishJohnstonTee)
				: weldedITorsion(sizes),
		...warpingOf(sizes)
	};
}

/**
 * Rolled I, mm⁴: walls as bt³/3, less 0.105t⁴ at each free flange end, plus the junctions.
 * The default junction is El Darwish & Johnston's (1965), which the UK tables (UB, UC) and the AISC
 * tables (W) print. The continental tables (IPE, HE) print `continentalITorsion`: from 4 % below to
 * 8 % above it over the shipped shapes.
 */
export function rolledITorsion(sizes: Flanged, junction: Junction): number {
	const { h, bTop, tfTop, bBottom, tfBottom, tw, r } = sizes;
	const flange = (b: number, t: number) => (b * t ** 3) / 3 - 0.21 * t ** 4 + junction(tw, t, r);
	const web = ((h - tfTop - tfBottom) * tw ** 3) / 3;
	return flange(bTop, tfTop) + flange(bBottom, tfBottom) + web;
}

/** Rolled I as the continental IPE and HE tables take it, mm⁴. */
export const continentalITorsion = (sizes: Flanged): number =>
	rolledITorsion(sizes, continentalTee);

/**
 * Welded I, mm⁴: each flange as a rectangle by Saint-Venant's series, the web as its length × tw³/3
 * (Timoshenko & Goodier, art. 109, sum of rectangles). What junctions and welds add is left out.
 */
function weldedITorsion({ h, bTop, tfTop, bBottom, tfBottom, tw }: Flanged): number {
	const web = ((h - tfTop - tfBottom) * tw ** 3) / 3;
	return rectangleTorsion(bTop, tfTop) + rectangleTorsion(bBottom, tfBottom) + web;
}

/**
 * Warping constant mm⁶ and shear centre by the flanges alone, as in Galambos (ed.), Guide to
 * Stability Design Criteria for Metal Structures: Iw = ho² I₁I₂/(I₁ + I₂), ho between the flange
 * middles; the shear centre divides ho in the inverse ratio of the flanges' second moments. Equal
 * flanges: tf b³(h − tf)²/24.
 */
function warpingOf({ h, bTop, tfTop, bBottom, tfBottom, middle }: Flanged) {
	const ho = h - (tfTop + tfBottom) / 2;
	const top = (tfTop * bTop ** 3) / 12;
	const bottom = (tfBottom * bBottom ** 3) / 12;
	return {
		warpingConstant: (ho * ho * top * bottom) / (top + bottom),
		shearCentre: { y: middle, z: tfBottom / 2 + (ho * top) / (top + bottom) }
	};
}
