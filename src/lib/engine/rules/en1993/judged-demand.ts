import type { Note } from '../../result';
import type { Demand, DemandState, ResistanceCheck } from '../result';
import { directionOf, type DemandCase } from './demand-case';
import { demandChecks, type DemandChecks } from './demand-checks';
import { classifyDemand, effectsOf, type DemandClass } from './demand-class';
import { demandLimits } from './demand-state';
import { elasticUse } from './elastic-use';
import type { EnContext } from './en-context';
import { largestMoment } from './largest-moment';
import { reducedWorkings } from './reduced-workings';
import { shearResistances, type ShearResistances } from './shear-resistance';
import { shearState } from './shear-state';
import { stressLevelClass, stressLevelNote } from './stress-level';

/** A demand with its class, its checks and its place on the ruler. */
export interface JudgedDemand {
	readonly state: DemandState;
	readonly classed: DemandClass;
	readonly checks: ResistanceCheck[];
	readonly notes: Note[];
}

/** Everything of one demand; `tubeHolds`: a round tube is no worse than class 3 in compression. */
export function judgeDemand(
	context: EnContext,
	demand: Demand,
	name: string,
	shear: ShearResistances,
	tubeHolds: boolean
): JudgedDemand {
	const { model, cases } = context;
	const effects = effectsOf(demand);
	const classed = classifyDemand(model, cases, effects, name);
	const sheared = demand.Vy || demand.Vz ? shearResistances(model, tubeHolds, demand, name) : shear;
	const raised = stressLevelClass(model, classed.classified, effects);
	const c: DemandCase = {
		context,
		demand,
		name,
		effects,
		...directionOf(effects),
		classified: raised ?? classed.classified,
		memberClass: classed.classified,
		shear: shearState(model, demand, sheared)
	};
	const used = demandChecks(c);
	const counted = model.code.useStressLevel ? countedByLevel(c, classed, used) : used;
	reducedWorkings(c, used.reduced);
	return {
		state: {
			demand: name,
			class: c.classified.overall,
			governing: c.classified.governing,
			basis: classed.basis,
			elements: c.classified.elements,
			N: effects.N,
			...demandLimits(model, effects),
			moment: c.size,
			countable: counted.countable,
			countableBasis: counted.countable === null ? null : counted.basis,
			countableForce: used.countableForce,
			limitedBy: counted.limitedBy,
			together: used.together,
			besideShear: isBesideShear(c, used),
			reduced: used.reduced,
			elastic: elasticUse(c),
			withheld: used.withheld,
			utilisation: greatest(used.checks, used.missing)?.value ?? null,
			missing: used.missing
		},
		classed: raised === null ? classed : { ...classed, classified: raised },
		checks: used.checks,
		notes: raised === null ? used.notes : [...used.notes, stressLevelNote(model)]
	};
}

/** Whether the demand's shear lowers what its moment may use. */
const isBesideShear = ({ shear }: DemandCase, { reduced, limitedBy }: DemandChecks): boolean =>
	shear.high || reduced.MyVRd !== undefined || limitedBy === 'web-shear' || limitedBy === 'shear';

/**
 * With class 4 taken as class 3 for low stress the class changes with the moment: what counts is the
 * greatest moment that still passes under the class that it puts the section in itself.
 */
function countedByLevel(
	c: DemandCase,
	{ classified }: DemandClass,
	used: DemandChecks
): DemandChecks {
	if (used.countable === null || classified.overall < 4) return used;
	const { direction, effects, context } = c;
	const plain = { ...context, model: { ...context.model, workings: null } };
	const at = (moment: number): DemandChecks => {
		const own = { N: effects.N, My: moment * direction.y, Mz: moment * direction.z };
		const raised = stressLevelClass(plain.model, classified, own);
		const demand = { ...c.demand, My: own.My, Mz: own.Mz };
		const as = { ...c, demand, effects: own, size: moment, classified: raised ?? classified };
		return demandChecks({ ...as, context: plain });
	};
	const use = (moment: number) => moment / Math.max(at(moment).countable ?? 0, leastMoment);
	const countable = largestMoment(use, used.countable);
	const found = at(countable);
	return { ...used, countable, basis: found.basis, limitedBy: found.limitedBy };
}

/** kNm; keeps a share of nothing finite. */
const leastMoment = 1e-300;

/** The greatest use of all checks; null while one that applies is missing, or without any. */
export function greatest(checks: readonly ResistanceCheck[], missing: readonly Note[]) {
	if (missing.length > 0 || checks.length === 0) return null;
	const worst = checks.reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
	return { governing: worst.name, value: worst.utilisation };
}
