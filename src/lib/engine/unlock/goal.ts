import type { Analysis } from '../rules/analysis';

/** What a change must bring: the demands met, or more of the section's strength counted. */
export type Goal = 'demand' | 'class';

/** Growth below this is rounding. */
const same = 1e-9;

/** What is locked in a section under its demands; null when nothing is. */
export function goalOf(analysis: Analysis): Goal | null {
	if (analysis.classification === null || analysis.resistance === null) return null;
	if (analysis.demands.some(({ utilisation }) => utilisation === null || utilisation > 1))
		return 'demand';
	return classOf(analysis) > 2 ? 'class' : null;
}

/** Whether an analysis reaches the goal without making any demand fail that passed. */
export function isReached(goal: Goal, before: Analysis, after: Analysis): boolean {
	if (!passesAll(after, goal === 'demand' ? null : before)) return false;
	if (goal === 'demand') return true;
	const [was, is] = [countableOf(before), countableOf(after)];
	return classOf(after) < classOf(before) && is !== null && is > (was ?? 0) * (1 + same);
}

/** With `before`: a demand that had no use to begin with need not have one. */
function passesAll(after: Analysis, before: Analysis | null): boolean {
	return after.demands.every(({ utilisation, moment, N }, i) => {
		if (utilisation !== null) return utilisation <= 1;
		if (before !== null) return before.demands[i]?.utilisation === null;
		return moment === 0 && N === 0;
	});
}

/** Class in which the section stands under its demands. */
export function classOf({ classification }: Analysis): number {
	const overall = classification?.overall;
	return typeof overall === 'number' ? overall : 4;
}

/** kNm that may be counted: along the demand that decides, else in bending with the bottom in tension. */
export function countableOf({ verdict, resistance }: Analysis): number | null {
	return verdict.ruler.countable ?? resistance?.MyRd ?? null;
}
