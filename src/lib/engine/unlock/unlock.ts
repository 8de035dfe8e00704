import type { Note } from '../result';
import type { Analysis } from '../rules/analysis';
import { firstReached } from './first-reached';
import { goalOf, type Goal } from './goal';
import type { PlateStock } from './plate-stock';
import type { Girder, UnlockOption } from './proposal';
import {
	analysisOf,
	massOf,
	mostMass,
	runsOf,
	smallestFirst,
	trialOf,
	verified,
	type Present,
	type Run,
	type Standing,
	type Verified
} from './search';
import type { Variable } from './variable';
import { variablesOf } from './variables';

export interface UnlockRequest extends Standing {
	readonly girder: Girder;
	readonly stock: PlateStock;
}

/** What would unlock more. */
export interface Unlocking {
	/** Null when nothing is locked or no class is given. */
	readonly goal: Goal | null;
	readonly before: Analysis;
	/** Least added steel first. */
	readonly options: readonly UnlockOption[];
	readonly notes: readonly Note[];
}

/** Options shown at most. */
const shown = 6;
/** Steps of each of two sizes that are combined. */
const pairReach = 8;

/**
 * Changes in stock steps after which the demands are met or, where they are, more of the strength may
 * be counted: one change, or two where no single one does. Each is verified by a full analysis. Grades
 * and welds stay as they are. A generator, so that a long search can pause: it yields the share done.
 * Null where the section itself cannot be built.
 */
export function* unlocking(request: UnlockRequest): Generator<number, Unlocking | null> {
	const { girder, stock } = request;
	const before = analysisOf(girder, request);
	if (before === null) return null;
	const goal = goalOf(before);
	if (goal === null) return { goal, before, options: [], notes: nothingLocked(before) };
	const variables = variablesOf(girder, stock);
	const present: Present = { girder, analysis: before };
	const hunt: Hunt = { girder, goal, present, standing: request, best: new Map() };
	yield* singles(hunt, variables);
	if (hunt.best.size === 0) yield* pairs(hunt, variables);
	const options = [...hunt.best.values()];
	const notes = options.length > 0 ? [] : nothingFound(variables);
	return { goal, before, options: options.sort(smallestFirst).slice(0, shown), notes };
}

/** What is looked for, and the smallest of each set of changed sizes found so far. */
interface Hunt {
	readonly girder: Girder;
	readonly goal: Goal;
	readonly present: Present;
	readonly standing: Standing;
	readonly best: Map<string, UnlockOption>;
}

/** Verifies a trial and keeps it when it is the smallest of its kind. */
function tried(hunt: Hunt, steps: readonly (readonly [Run, number])[]): Verified {
	const { girder, goal, present, standing, best } = hunt;
	const found = verified(trialOf(girder, steps), goal, present, standing);
	const { option } = found;
	if (option === null) return found;
	const key = keyOf(option, goal);
	const other = best.get(key);
	if (!other || smallestFirst(option, other) < 0) best.set(key, option);
	return found;
}

/** Each run from its nearest value on. */
function* singles(hunt: Hunt, variables: readonly Variable[]): Generator<number, void> {
	const runs = variables.flatMap((variable) => runsOf(variable));
	for (const [i, run] of runs.entries()) {
		if (isLess(run)) lessSteel(hunt, run);
		else moreSteel(hunt, run);
		yield ((i + 1) / runs.length) * 0.5;
	}
}

/** Whether a run takes steel away; stiffeners set closer do not. */
const isLess = ({ variable: { value, field }, values }: Run) =>
	field !== 'spacing' && values[0]! < value;

/** With less steel the last before the goal is lost, or before even the full block would miss it. */
function lessSteel(hunt: Hunt, run: Run): void {
	const { verdict } = hunt.present.analysis;
	const { countable, demand } = verdict.ruler;
	const asked = hunt.goal === 'class' ? countable : demand;
	let reached = false;
	for (const at of run.values.keys()) {
		const { option, ceiling } = tried(hunt, [[run, at]]);
		if (option === null && reached) return;
		reached ||= option !== null;
		if (ceiling !== null && asked !== null && ceiling <= asked) return;
	}
}

/** With more steel the first that reaches the goal, and the first that reaches the full block. */
function moreSteel(hunt: Hunt, run: Run): void {
	const known = new Map<number, Verified>();
	const at = (place: number) => {
		const found = known.get(place) ?? tried(hunt, [[run, place]]);
		known.set(place, found);
		return found.option;
	};
	const count = withinMass(hunt, run);
	const first = firstReached(count, 0, (place) => at(place) !== null);
	const option = first === null ? null : at(first);
	if (first === null || option === null) return;
	if (hunt.goal === 'class' && option.class > 2)
		firstReached(count, first + 1, (place) => (at(place)?.class ?? 4) <= 2);
}

/** How many values of a run are not too heavy. */
function withinMass({ girder, goal, present, standing }: Hunt, run: Run): number {
	if (goal === 'demand') return run.values.length;
	const most = mostMass(goal, present);
	const tooHeavy = (at: number) => {
		const mass = massOf(trialOf(girder, [[run, at]]).girder, standing);
		return mass !== null && mass > most;
	};
	return firstReached(run.values.length, 0, tooHeavy) ?? run.values.length;
}

/**
 * Two runs at a time along the edge between what reaches the goal and what does not, taking it that a
 * longer step of either helps: where it does not, an option may be missed, never a wrong one given.
 */
function* pairs(hunt: Hunt, variables: readonly Variable[]): Generator<number, void> {
	const couples = variables.flatMap((first, i) =>
		variables
			.slice(i + 1)
			.flatMap((second) =>
				runsOf(first, pairReach).flatMap((a) =>
					runsOf(second, pairReach).map((b) => [a, b] as const)
				)
			)
	);
	for (const [i, [a, b]] of couples.entries()) {
		let [atA, atB] = [0, b.values.length - 1];
		while (atA < a.values.length && atB >= 0) {
			if (
				tried(hunt, [
					[a, atA],
					[b, atB]
				]).option
			)
				atB--;
			else atA++;
		}
		yield 0.5 + ((i + 1) / couples.length) * 0.5;
	}
}

const keyOf = ({ changes, class: reached }: UnlockOption, goal: Goal): string => {
	const sizes = changes.map(({ part, field }) => `${part}.${field}`).join(' ');
	return goal === 'class' ? `${sizes} ${reached > 2 ? 'elastic' : 'plastic'}` : sizes;
};

const nothingLocked = ({ classification }: Analysis): Note[] => [
	classification === null
		? { code: 'unlock-no-class', message: 'No class is given, so nothing can be unlocked.' }
		: { code: 'nothing-locked', message: 'The full plastic block counts and the demands are met.' }
];

const nothingFound = (variables: readonly Variable[]): Note[] => [
	variables.length === 0
		? {
				code: 'comes-as-it-is',
				message:
					'This shape comes as it is rolled or drawn: choose another one, or build it of plates.'
			}
		: {
				code: 'nothing-unlocks',
				message:
					'No one or two changes in stock steps reach it. Change more sizes together by hand.'
			}
];

/** The whole search at once. */
export function unlocked(request: UnlockRequest): Unlocking | null {
	const search = unlocking(request);
	for (;;) {
		const { done, value } = search.next();
		if (done) return value;
	}
}
