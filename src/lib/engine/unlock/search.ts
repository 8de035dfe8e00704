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

/** Analysis of a girder; null where it cannot be built. */
export function analysisOf(
	{ definition, stiffeners }: Girder,
	standing: Standing
): Analysis | null {
	const section = prepareSection(definition, standing.strengthBasis);
	if (!section.ok) return null;
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

/** The option that a trial is, by a full analysis; null when it does not reach the goal. */
export function verified(
	trial: Trial,
	goal: Goal,
	present: Present,
	standing: Standing
): UnlockOption | null {
	const analysis = analysisOf(trial.girder, standing);
	if (analysis === null || !isReached(goal, present.analysis, analysis)) return null;
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
