import type { StrengthBasis } from '../material/material';
import { analyse } from '../rules/analyse';
import type { Analysis } from '../rules/analysis';
import type { CodeChoice, Demand } from '../rules/result';
import { prepareSection } from '../section/prepare';
import { classOf, countableOf, isReached, type Goal } from './goal';
import type { Change, Girder, UnlockOption } from './proposal';
import type { Variable } from './variable';

/** Under what the section stands. */
export interface Standing {
	readonly code: Partial<CodeChoice>;
	readonly demands: readonly Demand[];
	readonly strengthBasis: StrengthBasis;
}

/** The present section with its analysis. */
export interface Present {
	readonly girder: Girder;
	readonly analysis: Analysis;
}

/** For a better class, at most this many times the section's mass: more is another section. */
const heaviest = 2;

/** kg/m; what a demand takes is not bounded. */
export const mostMass = (goal: Goal, { analysis }: Present): number =>
	goal === 'class' ? heaviest * analysis.gross.mass : Number.POSITIVE_INFINITY;

/** Mass, kg/m; null where it cannot be built. */
export function massOf({ definition }: Girder, { strengthBasis }: Standing): number | null {
	const section = prepareSection(definition, strengthBasis);
	return section.ok ? section.value.gross.mass : null;
}

/** Analysis of a girder; null where it cannot be built, or is heavier than `most` kg/m. */
export function analysisOf(
	{ definition, stiffeners }: Girder,
	standing: Standing,
	most = Number.POSITIVE_INFINITY
): Analysis | null {
	const section = prepareSection(definition, standing.strengthBasis);
	if (!section.ok || section.value.gross.mass > most) return null;
	const { code, demands } = standing;
	return analyse(section.value, { code, demands, stiffeners: stiffeners ?? undefined });
}

/** A combination of changes, not yet verified. */
export interface Trial {
	readonly changes: readonly Change[];
	readonly girder: Girder;
}

/** One run of values of one variable. */
export interface Run {
	readonly variable: Variable;
	readonly values: readonly number[];
}

/** All runs of a variable, each no longer than `reach`. */
export const runsOf = (variable: Variable, reach = Number.POSITIVE_INFINITY): Run[] =>
	variable.runs
		.map((values) => ({ variable, values: values.slice(0, reach) }))
		.filter(({ values }) => values.length > 0);

/** The girder with one value of each run put in. */
export const trialOf = (girder: Girder, steps: readonly (readonly [Run, number])[]): Trial => ({
	changes: steps.map(([{ variable, values }, at]) => changeOf(variable, values[at]!)),
	girder: steps.reduce(
		(changed, [{ variable, values }, at]) => variable.changed(changed, values[at]!),
		girder
	)
});

const changeOf = ({ part, field, value }: Variable, to: number): Change => ({
	part,
	field,
	from: value,
	to
});

/** What a full analysis says of a trial. */
export interface Verified {
	/** Null when it does not reach the goal. */
	readonly option: UnlockOption | null;
	/** Full plastic moment along the demand that decides, kNm: no less steel counts more. */
	readonly ceiling: number | null;
}

export function verified(trial: Trial, goal: Goal, present: Present, standing: Standing): Verified {
	const analysis = analysisOf(trial.girder, standing, mostMass(goal, present));
	if (analysis === null) return { option: null, ceiling: null };
	const ceiling = analysis.verdict.ruler.fullPlastic;
	if (!isReached(goal, present.analysis, analysis)) return { option: null, ceiling };
	return { option: optionOf(trial, analysis, present), ceiling };
}

function optionOf(trial: Trial, analysis: Analysis, present: Present): UnlockOption {
	const { resistance, gross, verdict } = analysis;
	return {
		changes: trial.changes,
		girder: trial.girder,
		class: classOf(analysis) as UnlockOption['class'],
		basis: verdict.countable.basis ?? resistance!.basis,
		MyRd: resistance!.MyRd,
		countable: countableOf(analysis),
		mass: gross.mass,
		addedMass: gross.mass - present.analysis.gross.mass,
		utilisation: resistance!.utilisation?.value ?? null
	};
}

/** Least added steel first, then fewest changes, then most counted. */
export function smallestFirst(a: UnlockOption, b: UnlockOption): number {
	const mass = a.addedMass - b.addedMass;
	if (Math.abs(mass) > 1e-9 * a.mass) return mass;
	return a.changes.length - b.changes.length || (b.countable ?? 0) - (a.countable ?? 0);
}
