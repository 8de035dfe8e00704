import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import type { GrossProperties, PreparedSection } from '../../section/prepared';
import type { Demand } from '../result';

/** Factors of the moment's shape: C1, and C2 for the height of the load. */
export interface MomentShape {
	readonly C1: number;
	readonly C2: number;
	/** Height of the load above the shear centre that counts, mm; > 0 destabilises. */
	readonly zg: number;
}

/** Pairs of C1 and C2 for loads between supports that turn freely: uniform load, and load at midspan. */
const loadFactors = [
	{ C1: 1.13, C2: 0.45 },
	{ C1: 1.35, C2: 0.63 }
] as const;

/** How near a given C1 must be to a known pair: published values differ in the second decimal. */
const sameFactor = 0.02;

const loadPair = (C1: number) => loadFactors.find((known) => Math.abs(known.C1 - C1) <= sameFactor);

/** Largest C1 that is counted: end moments of opposite sense reach 2.7 (common practice, no source). */
const mostC1 = 2.7;

/**
 * C1, C2 and zg of a demand. A load that stabilises (zg < 0) is counted at the shear centre. Null where
 * a destabilising load has no known C2.
 */
export function momentShape({ C1 = 1, zg = 0 }: Demand): MomentShape | null {
	const counted = Math.min(C1, mostC1);
	if (zg <= 0) return { C1: counted, C2: 0, zg: 0 };
	const pair = loadPair(C1);
	return pair ? { C1: counted, C2: pair.C2, zg } : null;
}

/** What the critical moment is made of, mm and N/mm². */
export interface LateralStiffness {
	readonly E: number;
	readonly G: number;
	/** About the axis that it buckles about, mm⁴. */
	readonly Iz: number;
	readonly It: number;
	/** mm⁶ */
	readonly Iw: number;
	/** Asymmetry about the axis of bending, mm; > 0 with the larger flange in compression. */
	readonly zj: number;
}

/** G = E/2.6, ν = 0.3 (3.2.6). */
export const shearModulus = (E: number): number => E / 2.6;

/**
 * Stiffness against lateral–torsional buckling in bending about y (or about z for a tube or box that is
 * stiffer that way), or null where no formula is given here.
 */
export function lateralStiffness(
	section: PreparedSection,
	E: number,
	demand: Demand
): LateralStiffness | null {
	const { definition, gross } = section;
	const found = (Iz: number, It: number | null, Iw: number | null, zj = 0) =>
		It === null || Iw === null ? null : { E, G: shearModulus(E), Iz, It, Iw, zj };
	switch (definition.kind) {
		case 'i': {
			if ((demand.My ?? 0) === 0) return null;
			const zj = countedAsymmetry(section, demand);
			return found(gross.secondMomentZ, gross.torsionConstant, gross.warpingConstant, zj);
		}
		case 'channel':
			if ((demand.My ?? 0) === 0) return null;
			return found(gross.secondMomentZ, gross.torsionConstant, gross.warpingConstant);
		case 'rectangular-hollow':
			return found(weakerMoment(gross), gross.torsionConstant, 0);
		case 'box': {
			const { bTop, bBottom, tfTop, tfBottom } = boxSizes(definition);
			const even = bTop === bBottom && tfTop === tfBottom;
			return even ? found(weakerMoment(gross), gross.torsionConstant, 0) : null;
		}
		default:
			return null;
	}
}

const weakerMoment = ({ secondMomentY, secondMomentZ }: GrossProperties): number =>
	Math.min(secondMomentY, secondMomentZ);

/**
 * The zj that is counted. Against the member it always counts (C3 = 1, the greatest for any linear moment);
 * in its favour only under a moment said to be uniform (C1 = 1 given), where C3 = 1 is exact. A C1 that is
 * neither 1 nor of a load on a simple span may belong to a moment that changes its sense, so that either
 * flange may be compressed.
 */
function countedAsymmetry(section: PreparedSection, { My = 0, C1 }: Demand): number {
	const own = asymmetry(section) * (My < 0 ? -1 : 1);
	if (C1 === 1) return own;
	const oneSense = C1 === undefined || loadPair(C1) !== undefined;
	return oneSense ? Math.min(own, 0) : -Math.abs(own);
}

/**
 * zj = zs − ∫z(y² + z²)dA/(2Iy) of an I with the top in compression, mm, from the centroid (ENV 1993-1-1:1992
 * F.1.2; Galambos, Guide to Stability Design Criteria: βx = −2zj). The plates count, root fillets do not.
 */
export function asymmetry({ definition, gross }: PreparedSection): number {
	if (definition.kind !== 'i' || gross.shearCentre === null) return 0;
	const { h, bTop, tfTop, bBottom, tfBottom, tw } = iSizes(definition);
	if (bTop === bBottom && tfTop === tfBottom) return 0;
	const zc = gross.centroid.z;
	const third =
		plateMoment(bTop, h - tfTop - zc, h - zc) +
		plateMoment(tw, tfBottom - zc, h - tfTop - zc) +
		plateMoment(bBottom, -zc, tfBottom - zc);
	return gross.shearCentre.z - zc - third / (2 * gross.secondMomentY);
}

/** ∫z(y² + z²)dA of a rectangle as wide as `b`, centred on y = 0, between two levels. */
const plateMoment = (b: number, low: number, high: number): number =>
	(b * (high ** 4 - low ** 4)) / 4 + ((b ** 3 / 12) * (high ** 2 - low ** 2)) / 2;

/**
 * Elastic critical moment, kNm, of a length L held against twist and sideways at both ends, free to warp and
 * to turn in plan there (k = kw = 1), load through the shear centre's plane:
 * C1 π²EIz/L² {√[Iw/Iz + L²GIt/(π²EIz) + (C2zg − zj)²] − (C2zg − zj)} (ENV 1993-1-1:1992 F.1.2, C3 = 1).
 */
export function criticalMoment(
	{ E, G, Iz, It, Iw, zj }: LateralStiffness,
	{ C1, C2, zg }: MomentShape,
	L: number
): number {
	const euler = (Math.PI ** 2 * E * Iz) / L ** 2;
	const shift = C2 * zg - zj;
	return C1 * euler * (Math.sqrt(Iw / Iz + (G * It) / euler + shift ** 2) - shift) * 1e-6;
}
