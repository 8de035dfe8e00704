import { bentAtCurvature, type Bent, type Forces } from '../bender';
import { bentAtMoment, bentByPlane } from '../bent-at';
import { elasticPath, type ElasticPath } from '../elastic-path';
import { keepsStrength } from '../kept-strength';
import { canCarry, isWithinReach, momentLimits } from '../limits';
import { plasticMomentOf } from '../plastic';
import type { Bending } from '../respond';
import { noState } from '../state-report';
import type { BendingPath, FirstYield, ResponseState, StrainPlane } from '../state';
import { addCellForces, forcesInFrame, noForces } from './cell-forces';
import { strainedCells } from './cut-cells';
import { mostCells, type History } from './history';
import { historyFirstYield } from './history-first-yield';
import { historyReport } from './history-report';
import { strainField, type LinearField } from './linear-field';
import { frameAt } from '../../geometry/frame';

const radians = Math.PI / 180;

/** One value of any of the forms in which a state is imposed; see `Imposed`. */
export type ImposedOnce =
	| { curvature: number }
	| { curvatureRatio: number }
	| { moment: number }
	| { strainPlane: StrainPlane };

/** A section with a history, ready to be bent on about one axis at constant N. */
export interface HistoryBending extends Bending {
	/** State under what is imposed. */
	at(imposed: ImposedOnce): ResponseState;
	/** The history once that state is reached; null where it cannot exist or has become too fine to follow. */
	after(imposed: ImposedOnce): History | null;
}

/**
 * Prepares bending of a section from where its history leaves it: loading on, unloading, or loading the
 * other way. Each fibre yields by its strain since the last turn of the history (the strains in between
 * are taken to run one way). `firstYield` is that of the section as it was at first, residual stress
 * counted; `plasticMoment` does not depend on the history.
 */
export function bendingFrom(history: History, path: BendingPath): HistoryBending {
	const { mechanics } = history;
	const frame = frameAt({ y: 0, z: 0 }, path.axisAngle * radians);
	const N = path.N * 1e3;
	const straight = elasticPath(mechanics, path.axisAngle * radians, path.transverse, N);
	const firstYield = historyFirstYield(history, straight, frame, N);
	const b = forcesOf(history, path.axisAngle * radians);
	const elastic = elasticFrom(history, b, path);
	const bent = balancer(b, path, elastic);
	const carries = canCarry(mechanics, N);
	const limits = once(() => (carries ? momentLimits(mechanics, path) : null));
	const strain = (state: Bent) => strainField(frame, state);
	const cells = (state: Bent) =>
		strainedCells(history.cells, history.layers, strain(state), mechanics.reach);

	const atCurvature = (curvature: number): Bent | null =>
		carries && isWithinReach(mechanics, curvature * 1e-3) ? bent(curvature * 1e-3) : null;
	const atMoment = (moment: number): Bent | null => {
		const within = limits();
		if (!within || !(moment > within.least && moment < within.most)) return null;
		return bentAtMoment(b, path.transverse, elastic, bent, moment * 1e6) ?? null;
	};
	const find = (imposed: ImposedOnce): Bent | null => {
		if ('curvature' in imposed) return atCurvature(imposed.curvature);
		if ('moment' in imposed) return atMoment(imposed.moment);
		if ('strainPlane' in imposed) return bentByPlane(b, imposed.strainPlane);
		const unit = unitOf(firstYield);
		return unit === null ? null : atCurvature(imposed.curvatureRatio * unit);
	};
	const report = (state: Bent | null): ResponseState =>
		state?.converged
			? historyReport(
					{ ...history, cells: cells(state), strain: strain(state) },
					path,
					state,
					unitOf(firstYield)
				)
			: noState;
	return {
		path,
		firstYield,
		plasticMoment: keepsStrength(mechanics) ? plasticMomentOf(mechanics, path).moment : null,
		atCurvature: (curvature) => report(atCurvature(curvature)),
		atMoment: (moment) => report(atMoment(moment)),
		atPlane: (strainPlane) => report(find({ strainPlane })),
		momentAt: (curvature) => {
			const state = atCurvature(curvature);
			return state?.converged ? state.forces.M * 1e-6 : null;
		},
		at: (imposed) => report(find(imposed)),
		after: (imposed) => {
			const state = find(imposed);
			if (!state?.converged) return null;
			const after = cells(state);
			return after.length > mostCells ? null : { ...history, cells: after, strain: strain(state) };
		}
	};
}

/** Curvature that ratios are counted in; null where there is none or it is zero. */
const unitOf = ({ curvature }: FirstYield): number | null => (curvature === 0 ? null : curvature);

/** Forces of strain planes over the cells of a history, in the frame of an axis. */
function forcesOf(
	{ mechanics, cells, layers }: History,
	angle: number
): Forces & { angle: number } {
	const frame = frameAt({ y: 0, z: 0 }, angle);
	const evaluate = (e0: number, curvature: number, turn: number) => {
		const strain = strainField(frame, { e0, curvature, turn });
		const sums = noForces();
		for (const cell of cells) addCellForces(sums, cell, layers[cell.part]!, strain);
		return forcesInFrame(sums, frame);
	};
	return { mechanics, angle, evaluate };
}

/** The straight line of elastic bending from the present state: where each search begins. */
function elasticFrom(
	{ mechanics, strain }: History,
	b: Forces & { angle: number },
	{ transverse, N }: BendingPath
): ElasticPath {
	const present = inFrame(b.angle, strain);
	const forces = b.evaluate(present.e0, present.curvature, present.turn);
	const on = elasticPath(mechanics, b.angle, transverse, N * 1e3 - forces.N);
	const turn = transverse === 'curvature-zero' ? 0 : present.turn;
	return {
		e0: (curvature) => present.e0 + on.e0(curvature - present.curvature),
		turn: (curvature) => turn + on.turn(curvature - present.curvature),
		moment: (curvature) => forces.M + on.moment(curvature - present.curvature)
	};
}

function inFrame(angle: number, { c, y, z }: LinearField) {
	const { cos, sin } = frameAt({ y: 0, z: 0 }, angle);
	return { e0: c, curvature: y * sin - z * cos, turn: y * cos + z * sin };
}

/** Balanced planes by curvature (1/mm); each search begins from the plane before, carried on elastically. */
function balancer(b: Forces, { transverse, N }: BendingPath, elastic: ElasticPath) {
	let last: Bent | undefined;
	return (curvature: number): Bent => {
		const [e0, turn] = [elastic.e0(curvature), elastic.turn(curvature)];
		const near = last?.converged ? last : undefined;
		const guess = {
			e0: near ? near.e0 + e0 - elastic.e0(near.curvature) : e0,
			turn: near ? near.turn + turn - elastic.turn(near.curvature) : turn
		};
		last = bentAtCurvature(b, transverse, N * 1e3, curvature, guess);
		return last;
	};
}

function once<T>(make: () => T): () => T {
	let made: { value: T } | undefined;
	return () => (made ??= { value: make() }).value;
}
