import { workingKey } from '$lib/engine/explain/keys';
import type { DemandState, ReducedFigures, Resistance } from '$lib/engine/rules/result';
import { formatQuantity, unitLabel, type Preferences, type Quantity } from '$lib/units';

export interface ResistanceRow {
	readonly name: string;
	readonly figure: string;
	readonly unit: string;
	readonly key: string;
}

type Own = 'MyRd' | 'MyRdNegative' | 'MzRd' | 'NRd' | 'NtRd' | 'VzRd' | 'VyRd';

const own: readonly (readonly [Own, string, Quantity])[] = [
	['MyRd', 'Moment, bottom in tension', 'moment'],
	['MyRdNegative', 'Moment, top in tension', 'moment'],
	['MzRd', 'Moment, z–z', 'moment'],
	['NRd', 'Compression', 'force'],
	['NtRd', 'Tension', 'force'],
	['VzRd', 'Shear along z', 'force'],
	['VyRd', 'Shear along y', 'force']
];

const beside: readonly (readonly [keyof ReducedFigures, string, Quantity])[] = [
	['VbRd', 'Shear buckling with the flanges', 'force'],
	['MyVRd', 'Moment y–y beside V', 'moment'],
	['MzVRd', 'Moment z–z beside V', 'moment'],
	['MyNRd', 'Moment y–y beside N, by the code', 'moment'],
	['MyNRdExact', 'Moment y–y beside N, exact block', 'moment'],
	['MzNRd', 'Moment z–z beside N, by the code', 'moment'],
	['MzNRdExact', 'Moment z–z beside N, exact block', 'moment'],
	['MNRd', 'Moment in its own direction beside N', 'moment'],
	['MNVRd', 'Moment beside N and V', 'moment'],
	['NVRd', 'N beside V', 'force'],
	['deltaMy', 'Moment that N adds about y–y', 'moment'],
	['deltaMz', 'Moment that N adds about z–z', 'moment'],
	['Mcr', 'Critical moment', 'moment'],
	['lambdaLT', 'Slenderness λLT', 'ratio'],
	['chiLT', 'Reduction χLT', 'ratio'],
	['MbRd', 'Moment, lateral–torsional buckling', 'moment']
];

/** Design resistances of the section alone, each effect by itself. */
export const resistanceRows = (resistance: Resistance, preferences: Preferences): ResistanceRow[] =>
	own.map(([figure, name, quantity]) => ({
		name,
		...shown(resistance[figure], quantity, preferences),
		key: workingKey.resistance(figure)
	}));

/** What is left of them beside the other effects of a case; only what applies. */
export const besideRows = (
	{ demand, reduced }: Pick<DemandState, 'demand' | 'reduced'>,
	preferences: Preferences
): ResistanceRow[] =>
	beside
		.filter(([figure]) => reduced[figure] !== undefined)
		.map(([figure, name, quantity]) => ({
			name,
			...shown(reduced[figure] ?? null, quantity, preferences),
			key: workingKey.reduced(demand, figure)
		}));

const shown = (value: number | null, quantity: Quantity, preferences: Preferences) => ({
	figure: formatQuantity(value, quantity, preferences, {
		digits: quantity === 'ratio' ? 3 : 4,
		grouping: 'always'
	}),
	unit: unitLabel(quantity, preferences)
});
