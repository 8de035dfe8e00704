import type { Preferences } from './preferences';
import { toShown, unitLabel, type Quantity } from './quantity';

export interface NumberFormat {
	/** Significant figures; a whole part longer than this is shown whole, never rounded to tens. */
	digits?: number;
	/** Places after the decimal mark; overrules `digits`. */
	decimals?: number;
	/** Drop zeros at the end: 400, not 400.0. */
	trim?: boolean;
	/** Part thousands from five digits on (`long`, the default), from four (`always`), or `never`. */
	grouping?: 'long' | 'always' | 'never';
	/** A plus sign before positive figures. */
	plus?: boolean;
}

export interface QuantityFormat extends NumberFormat {
	/** Put the unit behind the figure. */
	unit?: boolean;
}

const NARROW_SPACE = '\u202f';
const NO_BREAK_SPACE = '\u00a0';
const MINUS = '−';
/** What stands for a figure that is not there. */
export const NO_FIGURE = '–';

const DEFAULT_DIGITS = 4;
const SMALLEST_PLAIN = 1e-5;
const LARGEST_PLAIN = 1e15;
const MOST_DECIMALS = 20;

function decimalsFor(size: number, format: NumberFormat): number {
	if (format.decimals !== undefined) return format.decimals;
	const digits = format.digits ?? DEFAULT_DIGITS;
	if (size === 0) return 0;
	const rounded = Number(size.toPrecision(Math.max(1, digits)));
	const magnitude = Math.floor(Math.log10(rounded));
	return Math.min(MOST_DECIMALS, Math.max(0, digits - 1 - magnitude));
}

function grouped(whole: string, grouping: NumberFormat['grouping']): string {
	const from = grouping === 'always' ? 4 : 5;
	if (grouping === 'never' || whole.length < from) return whole;
	return whole.replace(/\B(?=(\d{3})+$)/g, NARROW_SPACE);
}

const superscript = (power: number): string =>
	[...String(power)].map((sign) => '⁻⁰¹²³⁴⁵⁶⁷⁸⁹'['-0123456789'.indexOf(sign)] ?? '').join('');

/** Unsigned digits with a point, and the power of ten when plain digits would be unreadable. */
function digitsOf(size: number, format: NumberFormat): [string, string] {
	const plain = size === 0 || (size >= SMALLEST_PLAIN && size < LARGEST_PLAIN);
	if (plain || format.decimals !== undefined) return [size.toFixed(decimalsFor(size, format)), ''];
	const digits = Math.max(1, format.digits ?? DEFAULT_DIGITS);
	const [mantissa = '', power = '0'] = size.toExponential(digits - 1).split('e');
	return [mantissa, `×10${superscript(Number(power))}`];
}

/** A number as text: true minus, narrow space between thousands, the person's decimal mark. */
export function formatNumber(
	value: number | null | undefined,
	preferences: Pick<Preferences, 'decimal'>,
	format: NumberFormat = {}
): string {
	if (value === null || value === undefined || !Number.isFinite(value)) return NO_FIGURE;
	const [text, power] = digitsOf(Math.abs(value), format);
	const [whole = '0', places = ''] = text.split('.');
	const fraction = format.trim ? places.replace(/0+$/, '') : places;
	const mark = preferences.decimal === 'comma' ? ',' : '.';
	const body = grouped(whole, format.grouping) + (fraction && mark + fraction) + power;
	const isZero = !/[1-9]/.test(text);
	const sign = isZero ? '' : value < 0 ? MINUS : format.plus ? '+' : '';
	return sign + body;
}

/**
 * An engine value as a person reads it, in the shown unit of their system; an absent or
 * infinite one as a dash. `parseQuantity` reads it back to within the digits shown.
 */
export function formatQuantity(
	value: number | null | undefined,
	quantity: Quantity,
	preferences: Preferences,
	format: QuantityFormat = {}
): string {
	if (value === null || value === undefined || !Number.isFinite(value)) return NO_FIGURE;
	const text = formatNumber(toShown(value, quantity, preferences.system), preferences, format);
	const label = unitLabel(quantity, preferences);
	if (!format.unit || label === '') return text;
	return quantity === 'angle' ? text + label : text + NO_BREAK_SPACE + label;
}
