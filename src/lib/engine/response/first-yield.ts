import type { PreparedSection } from '../section/prepared';
import { bender, bentAtCurvature } from './bender';
import { elasticPath, elasticUse, type ElasticPath } from './elastic-path';
import { mechanicsOf, type Mechanics } from './law-groups';
import type { BendingPath, FirstYield } from './state';

const radians = Math.PI / 180;

/**
 * Curvature (1/m) and moment (kNm, about the asked axis) at which a fibre first reaches its own
 * yield strength while N (kN) is held and the curvature grows from zero in the positive sense.
 * Null figures when N alone already yields the section.
 */
export function firstYield(section: PreparedSection, path: BendingPath): FirstYield {
	return firstYieldOf(mechanicsOf(section), path);
}

export function firstYieldOf(mechanics: Mechanics, path: BendingPath): FirstYield {
	if (!Number.isFinite(path.N * 1e3)) return { curvature: null, moment: null };
	const angle = path.axisAngle * radians;
	const elastic = elasticPath(mechanics, angle, path.transverse, path.N * 1e3);
	const straight = mechanics.groups.some(({ law }) => law.kinks.includes(0))
		? balancedPath(mechanics, path, elastic)
		: elastic;
	const curvature = yieldCurvature(mechanics, angle, straight);
	if (curvature === null) return { curvature: null, moment: null };
	return { curvature: curvature * 1e3, moment: straight.moment(curvature) * 1e-6 };
}

/**
 * The path of a section whose steel is stiffer in one sense than in the other: no straight lines,
 * so that each curvature is balanced.
 */
function balancedPath(
	mechanics: Mechanics,
	{ axisAngle, transverse, N }: BendingPath,
	elastic: ElasticPath
): ElasticPath {
	const b = bender(mechanics, axisAngle * radians);
	const at = (curvature: number) => {
		const guess = { e0: elastic.e0(curvature), turn: elastic.turn(curvature) };
		return bentAtCurvature(b, transverse, N * 1e3, curvature, guess);
	};
	return {
		e0: (curvature) => at(curvature).e0,
		turn: (curvature) => at(curvature).turn,
		moment: (curvature) => at(curvature).forces.M
	};
}

function yieldCurvature(
	mechanics: Mechanics,
	angle: number,
	{ e0, turn }: ElasticPath
): number | null {
	const excess = (curvature: number) =>
		elasticUse(mechanics, angle, e0(curvature), curvature, turn(curvature)) - 1;
	return curvatureAtYield(excess, mechanics.reach);
}

/**
 * 1/mm: where the use of a section less 1 passes zero; null where it is not below zero to begin with.
 * The use is convex in the curvature, so that secants from beyond close in.
 */
export function curvatureAtYield(
	excess: (curvature: number) => number,
	reach: number
): number | null {
	let low = 0;
	let atLow = excess(0);
	if (!(atLow < 0)) return null;
	let high = 1e-3 / reach;
	let atHigh = excess(high);
	while (atHigh < 0) {
		[low, atLow, high] = [high, atHigh, high * 2];
		atHigh = excess(high);
	}
	for (let i = 0; i < 200 && atHigh > 0; i++) {
		const secant = low - (atLow * (high - low)) / (atHigh - atLow);
		const atSecant = excess(secant);
		if (atSecant >= 0 || secant <= low || secant >= high) return Math.min(secant, high);
		if (Math.abs(atSecant) < 4e-16) return secant;
		[low, atLow] = [secant, atSecant];
		const middle = (low + high) / 2;
		const atMiddle = excess(middle);
		if (atMiddle >= 0) [high, atHigh] = [middle, atMiddle];
		else [low, atLow] = [middle, atMiddle];
	}
	return high;
}

/**
 * Least |M| (kNm) at which a fibre reaches its own fy, N = 0, the section held to bend about the
 * axis at `axisAngle` degrees; the smaller of both senses.
 */
export function firstYieldMoment(section: PreparedSection, axisAngle: number): number {
	const mechanics = mechanicsOf(section);
	const senses = [axisAngle, axisAngle + 180].map(
		(angle) =>
			firstYieldOf(mechanics, { axisAngle: angle, transverse: 'curvature-zero', N: 0 }).moment ?? 0
	);
	return Math.min(...senses);
}
