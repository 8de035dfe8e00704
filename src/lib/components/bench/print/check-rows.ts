import type { ResistanceCheck } from '$lib/engine/rules/result';
import {
	formatNumber,
	formatQuantity,
	unitLabel,
	type Preferences,
	type Quantity
} from '$lib/units';

/** A check as printed: figures in the reader's units, the unit once behind both. */
export interface CheckRow {
	readonly name: string;
	readonly value: string;
	readonly limit: string;
	readonly unit: string;
	readonly use: string;
}

/** What a check compares, by its name: kN, kNm, or shares of 1 where effects act together. */
export function checkQuantity(name: string): Quantity {
	if (/^(compression|tension|shear)\b/.test(name)) return 'force';
	return /^bending about (y–y|z–z)$/.test(name) ? 'moment' : 'ratio';
}

/** Every check with its demand and clause, in the order given. */
export const checkRows = (
	checks: readonly ResistanceCheck[],
	preferences: Preferences
): CheckRow[] =>
	checks.map(({ demand, name, clause, value, limit, utilisation }) => {
		const quantity = checkQuantity(name);
		return {
			name: `${demand}: ${name}, ${clause}`,
			value: formatQuantity(value, quantity, preferences, { digits: 4 }),
			limit: formatQuantity(limit, quantity, preferences, { digits: 4 }),
			unit: quantity === 'ratio' ? 'share' : unitLabel(quantity, preferences),
			use: formatNumber(utilisation, preferences, { decimals: 3 })
		};
	});
