import type { Note } from '../../result';
import type { Demand, DemandState, ResistanceCheck } from '../result';
import type { ClassifiedCase } from './classify';
import { countedByClass } from './countable-by-class';
import { directionOf, type DemandCase } from './demand-case';
import { demandChecks, type DemandChecks } from './demand-checks';
import { classifyDemand, effectsOf, type DemandClass } from './demand-class';
import { demandLimits } from './demand-state';
import { clauseOf } from './edition';
import { elasticUse } from './elastic-use';
import type { EnContext } from './en-context';
import { flangeFirstYieldNote, heldToFirstYield } from './flange-checks';
import { reducedWorkings } from './reduced-workings';
import { shearResistances, type ShearResistances } from './shear-resistance';
import { shearState } from './shear-state';
import type { EnModel } from './model';
import type { Effects } from './stress-case';
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
	const shown = raised ?? classed.classified;
	const c: DemandCase = {
		context,
		demand,
		name,
		effects,
		...directionOf(effects),
		...ruledClasses(model, shown, classed.classified, effects),
		shear: shearState(model, demand, sheared)
	};
	const used = demandChecks(c);
	const counted = changesWithMoment(c, classed) ? countedByOwnClass(c, used) : used;
	reducedWorkings(c, used.reduced);
	return {
		state: {
			demand: name,
			class: shown.overall,
			governing: shown.governing,
			basis: classed.basis,
			elements: shown.elements,
			N: effects.N,
			...demandLimits(model, effects),
			moment: c.size,
			countable: counted.countable,
			countableBasis: counted.countable === null ? null : counted.basis,
			countableForce: used.countableForce,
			limitedBy: counted.limitedBy,
			together: counted.together,
			besideShear: isBesideShear(c, used),
			reduced: used.reduced,
			elastic: elasticUse(c),
			withheld: used.withheld,
			utilisation: greatest(used.checks, used.missing)?.value ?? null,
			missing: used.missing
		},
		classed: raised === null ? classed : { ...classed, classified: raised },
		checks: used.checks,
		notes: [
			...counted.notes,
			...(raised === null ? [] : [stressLevelNote(model)]),
			...(c.classified.firstYieldOnly ? [flangeFirstYieldNote(name)] : [])
		]
	};
}

/** The classes that the rules go by: where the flange would buckle into the web beyond, first yield. */
function ruledClasses(
	model: EnModel,
	classified: ClassifiedCase,
	memberClass: ClassifiedCase,
	{ My }: Effects
): Pick<DemandCase, 'classified' | 'memberClass'> {
	return {
		classified: heldToFirstYield(model, classified, My),
		memberClass: heldToFirstYield(model, memberClass, My)
	};
}

/** Whether the demand's shear lowers what its moment may use. */
const isBesideShear = ({ shear }: DemandCase, { reduced, limitedBy }: DemandChecks): boolean =>
	shear.high || reduced.MyVRd !== undefined || limitedBy === 'web-shear' || limitedBy === 'shear';

/**
 * Whether the class depends on the size of the moment: with N and moment in proportion, and where class 4
 * is taken as class 3 for low stress.
 */
function changesWithMoment({ context, effects, size }: DemandCase, { classified }: DemandClass) {
	const { classAlpha, useStressLevel } = context.model.code;
	if (classAlpha === 'proportional' && effects.N !== 0) return size > 0;
	return useStressLevel && classified.overall === 4;
}

/** What counts along the demand's direction with every moment judged by the class that it has itself. */
function countedByOwnClass(c: DemandCase, used: DemandChecks): DemandChecks {
	if (used.countable === null) return used;
	const at = memo((moment) => atMoment(c, moment));
	const checked = memo((moment) => demandChecks(at(moment)));
	const { moment, failsBelow } = countedByClass(
		{
			nameAt: (size) => className(at(size).classified),
			countedAt: (size) => checked(size).countable ?? 0
		},
		c.size
	);
	const { basis, limitedBy, together } = checked(moment > 0 ? moment : c.size);
	const notes = failsBelow ? [...used.notes, failsBelowNote(c)] : used.notes;
	return { ...used, countable: moment, basis, limitedBy, together, notes };
}

/** The demand with a moment of that size, and the class that it then has. */
function atMoment(c: DemandCase, size: number): DemandCase {
	const { direction, effects, name } = c;
	const model = { ...c.context.model, workings: null };
	const context = { ...c.context, model };
	const own = { N: effects.N, My: size * direction.y, Mz: size * direction.z };
	const { classified } = classifyDemand(model, context.cases, own, name);
	const raised = stressLevelClass(model, classified, own);
	return {
		...c,
		context,
		size,
		effects: own,
		demand: { ...c.demand, My: own.My, Mz: own.Mz },
		...ruledClasses(model, raised ?? classified, classified, own)
	};
}

/** Class of every part, and which parts are compressed. */
const className = ({ overall, firstYieldOnly, elements }: ClassifiedCase): string =>
	`${overall}${firstYieldOnly ? 'y' : ''} ${elements
		.map((row) => `${row.part}${row.type}${row.class}${row.limits.length}`)
		.join(' ')}`;

function memo<T>(find: (moment: number) => T): (moment: number) => T {
	const found = new Map<number, T>();
	return (moment) => {
		const own = found.get(moment) ?? find(moment);
		found.set(moment, own);
		return own;
	};
}

const failsBelowNote = ({ name, context }: DemandCase): Note => ({
	code: 'smaller-moment-fails',
	message: `Under ${name} the class is better with a larger share of moment: a smaller moment beside the same N would be in a worse class and fails.`,
	clause: clauseOf(context.model.code.standard, 'classification')
});

/** The greatest use of all checks; null while one that applies is missing, or without any. */
export function greatest(checks: readonly ResistanceCheck[], missing: readonly Note[]) {
	if (missing.length > 0 || checks.length === 0) return null;
	const worst = checks.reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
	return { governing: worst.name, value: worst.utilisation };
}
