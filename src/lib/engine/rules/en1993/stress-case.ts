import type { Point } from '../../geometry/boundary';
import { firstYieldOf } from '../../response/first-yield';
import type { Mechanics } from '../../response/law-groups';
import { plasticMomentOf, type PlasticState } from '../../response/plastic';
import type { BendingPath } from '../../response/state';
import type { GrossProperties } from '../../section/prepared';
import type { Symmetry } from '../../section/symmetry';
import { proportionalBlock } from './proportional-block';

/** Design effects, kN and kNm, signs of the contract. */
export interface Effects {
	readonly N: number;
	readonly My: number;
	readonly Mz: number;
}

/** How a section is stressed at both limits; compression positive. */
export interface StressCase {
	/** Distance into the compressed side of the plastic block, mm; its sign is what counts. */
	readonly plastic: (at: Point) => number;
	/** Elastic stress at first yield, N/mm² (any scale where only its ratios are asked). */
	readonly elastic: (at: Point) => number;
}

/** What a stress case is taken from. */
export interface StressSource {
	readonly mechanics: Mechanics;
	readonly gross: GrossProperties;
	/** Multiplies N, so that block and first yield are at design strength. */
	readonly gammaM0: number;
	readonly classAlpha: 'actual-N' | 'proportional';
	readonly hybrid: boolean;
	readonly symmetry: Symmetry;
}

const uniform = (sign: number): StressCase => ({ plastic: () => sign, elastic: () => sign });

export const uniformCompression: StressCase = uniform(1);
export const uniformTension: StressCase = uniform(-1);

/** Block and elastic stress under N with bending: the actual N with M filling the rest, or both in proportion. */
export function stressCase(source: StressSource, effects: Effects): StressCase {
	const size = Math.hypot(effects.My, effects.Mz);
	if (size === 0) return effects.N < 0 ? uniformCompression : uniformTension;
	const path = pathOf(effects, source.gammaM0, source.symmetry);
	return source.classAlpha === 'proportional' && effects.N !== 0
		? proportionalCase(source, effects, path, size)
		: actualCase(source, effects, path, size);
}

/**
 * The axis that the moment turns about, with no moment across it. A section bends straight about an
 * axis that its steel is even about, and without N also about the one across that.
 */
export function pathOf({ N, My, Mz }: Effects, gammaM0: number, symmetry: Symmetry): BendingPath {
	const axisAngle = Mz === 0 ? (My < 0 ? 180 : 0) : (Math.atan2(Mz, My) * 180) / Math.PI;
	const { leftRight, topBottom } = symmetry;
	const free = N === 0 && (leftRight || topBottom);
	const straight = (Mz === 0 && (leftRight || free)) || (My === 0 && (topBottom || free));
	return { axisAngle, transverse: straight ? 'curvature-zero' : 'moment-zero', N: N * gammaM0 };
}

/**
 * A pull relieves the elastic stress of a plate; in a hybrid, whose weaker part yields early, that
 * relief is not relied on.
 */
function actualCase(
	source: StressSource,
	effects: Effects,
	path: BendingPath,
	size: number
): StressCase {
	const state = plasticMomentOf(source.mechanics, path);
	const yielding = effects.N === 0 ? size : firstYieldOf(source.mechanics, path).moment;
	return caseFrom(source.gross, effects, {
		plastic: compressedSide(source.gross, path.axisAngle, state),
		axial: source.hybrid && path.N > 0 ? 0 : path.N,
		grown: yielding === null ? null : yielding / size
	});
}

function proportionalCase(
	source: StressSource,
	effects: Effects,
	path: BendingPath,
	size: number
): StressCase {
	const state = proportionalBlock(source.mechanics, path, effects.N, size);
	return caseFrom(source.gross, effects, {
		plastic: compressedSide(source.gross, path.axisAngle, state),
		axial: effects.N,
		grown: 1
	});
}

/** Where N alone is too much for a limit, its stress is taken as uniform: the harder case. */
function caseFrom(
	gross: GrossProperties,
	effects: Effects,
	at: { plastic: StressCase['plastic'] | null; axial: number; grown: number | null }
): StressCase {
	const alone = effects.N < 0 ? uniformCompression : uniformTension;
	return {
		plastic: at.plastic ?? alone.plastic,
		elastic: at.grown === null ? alone.elastic : elasticStress(gross, at.axial, effects, at.grown)
	};
}

/** Share of the lesser second moment below which Iyz is rounding. */
const noProduct = 1e-9;

/**
 * Elastic stress, compression positive, of N (kN) and moments (kNm) times `grown` on the gross
 * section: with its product of inertia where y and z are not its principal axes.
 */
export function elasticStress(
	{ area, centroid, secondMomentY: Iy, secondMomentZ: Iz, productYZ }: GrossProperties,
	N: number,
	{ My, Mz }: Effects,
	grown: number
): StressCase['elastic'] {
	const direct = (-N * 1e3) / area;
	const { y: yc, z: zc } = centroid;
	const Iyz = Math.abs(productYZ) <= noProduct * Math.min(Iy, Iz) ? 0 : productYZ;
	const size = (grown * 1e6) / (1 - (Iyz / Iy) * (Iyz / Iz));
	const perZ = size * (My / Iy + ((Mz / Iy) * Iyz) / Iz);
	const perY = -size * (Mz / Iz + ((My / Iz) * Iyz) / Iy);
	return ({ y, z }) => direct + perZ * (z - zc) + perY * (y - yc);
}

/** Signed distance from the neutral axis towards the side that positive bending compresses. */
export function compressedSide(
	{ centroid }: GrossProperties,
	axisAngle: number,
	{ neutralAxis }: PlasticState
): StressCase['plastic'] | null {
	if (neutralAxis === null) return null;
	const turn = (neutralAxis.angle * Math.PI) / 180;
	const asked = (axisAngle * Math.PI) / 180;
	const sense = Math.cos(turn - asked) < 0 ? -1 : 1;
	const [ny, nz] = [-Math.sin(turn), Math.cos(turn)];
	return ({ y, z }) =>
		sense * (ny * (y - centroid.y) + nz * (z - centroid.z) - neutralAxis.distance);
}
