import { formatNumber, formatQuantity, type Preferences, type Quantity } from '$lib/units';

const quantities: Readonly<Record<string, Quantity>> = {
	mm: 'length',
	'mm²': 'area',
	'mm³': 'modulus',
	'mm⁴': 'secondMoment',
	'mm⁶': 'warping',
	'N/mm²': 'stress',
	kN: 'force',
	kNm: 'moment',
	'kg/m': 'massPerLength',
	'°': 'angle'
};

interface Measured {
	readonly value: number;
	readonly unit: string;
}

/** A number of a working in the unit that its formula is in. */
export const formulaFigure = ({ value, unit }: Measured, preferences: Preferences): string =>
	`${formatNumber(value, preferences, { digits: 5, trim: true })} ${unit}`.trim();

/** The same in the reader's unit; null where that is the formula's own. */
export function readerFigure({ value, unit }: Measured, preferences: Preferences): string | null {
	const quantity = quantities[unit];
	if (quantity === undefined) return null;
	const shown = formatQuantity(value, quantity, preferences, { digits: 4, unit: true });
	return shown.endsWith(`\u00a0${unit}`) ? null : shown;
}
