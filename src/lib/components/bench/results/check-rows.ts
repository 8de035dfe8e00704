import type { Note } from '$lib/engine/result';
import type { DemandState, ResistanceCheck } from '$lib/engine/rules/result';
import { uncheckedNames } from '$lib/engine/rules/unchecked';
import {
	formatNumber,
	formatQuantity,
	unitLabel,
	type Preferences,
	type Quantity
} from '$lib/units';

export type CheckState = 'passes' | 'fails';

/** A check as shown: figures in the reader's units, the unit once behind both. */
export interface CheckRow {
	/** As the engine names it: part of the key of its working. */
	readonly name: string;
	readonly demand: string;
	readonly title: string;
	readonly clause: string;
	readonly value: string;
	readonly limit: string;
	/** Empty for a plain ratio. */
	readonly unit: string;
	/** Value over limit. */
	readonly use: number;
	readonly useText: string;
	readonly state: CheckState;
}

/** A check that applies, or may, and is not made. */
export interface UncheckedRow {
	readonly title: string;
	readonly reason: string;
	readonly clause: string;
}

type Compared = Pick<ResistanceCheck, 'name' | 'limit'>;

/**
 * What a check compares: kN, kNm, N/mm² or plain ratios. Effects that act together are a sum with the
 * limit 1, a fibre's stress, or a moment against what the others leave of it; `together` says which.
 */
export function checkQuantity(
	{ name, limit }: Compared,
	together: DemandState['together'] = null
): Quantity {
	if (/^(compression|tension|shear)\b/.test(name)) return 'force';
	if (/^(bending about (y–y|z–z)|lateral)/.test(name)) return 'moment';
	if (limit === 1 || name === 'flange-induced buckling') return 'ratio';
	return together === 'fibre' ? 'stress' : 'moment';
}

/** Every check with its demand and clause, in the order given. */
export const checkRows = (
	checks: readonly ResistanceCheck[],
	states: readonly Pick<DemandState, 'demand' | 'together'>[],
	preferences: Preferences
): CheckRow[] =>
	checks.map(({ demand, name, clause, value, limit, utilisation }) => {
		const state = states.find((one) => one.demand === demand);
		const quantity = checkQuantity({ name, limit }, state?.together);
		const figure = (size: number) => formatQuantity(size, quantity, preferences, { digits: 4 });
		return {
			name,
			demand,
			title: name.charAt(0).toUpperCase() + name.slice(1),
			clause,
			value: figure(value),
			limit: figure(limit),
			unit: quantity === 'ratio' ? '' : unitLabel(quantity, preferences),
			use: utilisation,
			useText: percent(utilisation, preferences),
			state: utilisation > 1 ? 'fails' : 'passes'
		};
	});

/** A use in percent; just over the limit never reads 100 %. */
export function percent(use: number, preferences: Preferences): string {
	const shown = 100 * use;
	const rounded = Number(shown.toPrecision(3));
	const digits = use > 1 && rounded <= 100 ? 6 : 3;
	return `${formatNumber(shown, preferences, { digits })} %`;
}

/**
 * Checks that are missing for one demand, then those of the member that are made for none; each once.
 * `others`: the states of the other demands, whose own gaps are not this one's.
 */
export function uncheckedRows(
	state: DemandState | undefined,
	others: readonly DemandState[],
	notes: readonly Note[]
): UncheckedRow[] {
	const own = state?.missing ?? [];
	const foreign = others.flatMap(({ missing }) => missing.map(({ message }) => message));
	const general = notes.filter(
		({ code, message }) =>
			uncheckedNames([code]).length > 0 &&
			!foreign.includes(message) &&
			(code !== 'class-4-not-built' || state === undefined || state.class === 4)
	);
	const all = [...own, ...general];
	return all
		.filter((note, at) => all.findIndex(({ message }) => message === note.message) === at)
		.map(({ code, message, clause }) => ({
			title: sentence(uncheckedNames([code])[0] ?? 'a check that applies'),
			reason: message,
			clause: clause ?? ''
		}));
}

const sentence = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);
