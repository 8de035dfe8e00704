import type { PreparedSection } from '../section/prepared';
import { bentAtCurvature, bender, type Bender, type Bent } from './bender';
import { bentAtMoment, bentByPlane } from './bent-at';
import { elasticPath, type ElasticPath } from './elastic-path';
import { firstYieldOf } from './first-yield';
import type { History } from './history/history';
import { bendingFrom } from './history/history-bending';
import { keepsStrength } from './kept-strength';
import { mechanicsOf } from './law-groups';
import { canCarry, isWithinReach, momentLimits } from './limits';
import { plasticMomentOf } from './plastic';
import { noState, stateReport } from './state-report';
import { isWithinLaws, lawEnd, type PathEnd } from './strain-limits';
import type { BendingPath, FirstYield, ResponseState, StrainPlane } from './state';

const radians = Math.PI / 180;

/** What is imposed: curvatures (1/m), their ratio to first yield, moments (kNm) or whole strain planes. */
export type Imposed =
	| { curvature: readonly number[] }
	| { curvatureRatio: readonly number[] }
	| { moment: readonly number[] }
	| { strainPlanes: readonly StrainPlane[] };

export interface Response {
	states: ResponseState[];
	firstYield: FirstYield;
	/** kNm about the asked axis under the same N; null when N alone exceeds the section, or a law does not keep its strength. */
	plasticMoment: number | null;
}

/** A section ready to be bent about one axis at constant N: prepared once, asked many times. */
export interface Bending {
	readonly path: BendingPath;
	readonly firstYield: FirstYield;
	readonly plasticMoment: number | null;
	/** State at a curvature, 1/m. */
	atCurvature(curvature: number): ResponseState;
	/** State at a moment about the asked axis, kNm. */
	atMoment(moment: number): ResponseState;
	/** State of a whole strain plane, whatever N it carries. */
	atPlane(plane: StrainPlane): ResponseState;
	/** Where a fibre comes to the end of its law as the curvature grows; null where none does. */
	ended?(): PathEnd | null;
	/** Moment (kNm) at a curvature (1/m), without the rest of the state; null when not balanced. */
	momentAt(curvature: number): number | null;
}

/**
 * Prepares bending of a section along a path (axis, N in kN, free or held across the axis); from where
 * a history leaves it, if one is given.
 */
export function bending(
	section: PreparedSection,
	path: BendingPath,
	history?: History | null
): Bending {
	if (history) return bendingFrom(history, path);
	const mechanics = mechanicsOf(section);
	const angle = path.axisAngle * radians;
	const b = bender(mechanics, angle);
	const elastic = elasticPath(mechanics, angle, path.transverse, path.N * 1e3);
	const firstYield = firstYieldOf(mechanics, path);
	const plasticMoment = keepsStrength(mechanics) ? plasticMomentOf(mechanics, path).moment : null;
	const bent = balancer(b, path, elastic);
	const carries = canCarry(mechanics, path.N * 1e3);
	const limits = once(() => (carries ? momentLimits(mechanics, path) : null));
	const report = (state: Bent) =>
		isWithinLaws(b, state) ? stateReport(b, state, firstYield.curvature) : noState;
	return {
		path,
		ended: once(() => (carries ? lawEnd(b, bent, (firstYield.curvature ?? 1) * 1e-3) : null)),
		firstYield,
		plasticMoment,
		atCurvature: (curvature) =>
			carries && isWithinReach(mechanics, curvature * 1e-3)
				? report(bent(curvature * 1e-3))
				: noState,
		atMoment: (moment) => {
			const within = limits();
			if (!within || !(moment > within.least && moment < within.most)) return noState;
			const state = bentAtMoment(b, path.transverse, elastic, bent, moment * 1e6);
			return state ? report(state) : noState;
		},
		atPlane: (plane) => report(bentByPlane(b, plane)),
		momentAt: (curvature) => {
			if (!carries || !isWithinReach(mechanics, curvature * 1e-3)) return null;
			const state = bent(curvature * 1e-3);
			return state.converged && isWithinLaws(b, state) ? state.forces.M * 1e-6 : null;
		}
	};
}

function once<T>(make: () => T): () => T {
	let made: { value: T } | undefined;
	return () => (made ??= { value: make() }).value;
}

/** Balanced planes by curvature (1/mm); each search begins from the plane before, scaled. */
function balancer(b: Bender, path: BendingPath, elastic: ElasticPath) {
	let last: Bent | undefined;
	return (curvature: number): Bent => {
		const near =
			last !== undefined && last.converged && last.curvature * curvature > 0
				? curvature / last.curvature
				: null;
		const guess =
			near === null
				? { e0: elastic.e0(curvature), turn: elastic.turn(curvature) }
				: { e0: last!.e0 * near, turn: last!.turn * near };
		const bent = bentAtCurvature(b, path.transverse, path.N * 1e3, curvature, guess);
		last = bent;
		return bent;
	};
}

/** States along a path as the contract's POST /response gives them. */
export function respond(section: PreparedSection, path: BendingPath, at: Imposed): Response {
	const bent = bending(section, path);
	return {
		states: imposedStates(bent, at),
		firstYield: bent.firstYield,
		plasticMoment: bent.plasticMoment
	};
}

function imposedStates(bent: Bending, at: Imposed): ResponseState[] {
	if ('curvature' in at) return at.curvature.map((value) => bent.atCurvature(value));
	if ('moment' in at) return at.moment.map((value) => bent.atMoment(value));
	if ('strainPlanes' in at) return at.strainPlanes.map((plane) => bent.atPlane(plane));
	const unit = bent.firstYield.curvature;
	return at.curvatureRatio.map((ratio) =>
		unit === null ? noState : bent.atCurvature(ratio * unit)
	);
}
