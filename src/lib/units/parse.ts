import type { Preferences } from './preferences';
import { plainText, readDigits, readFraction, scaled, type Reading } from './number-text';
import { quantityNoun, shownUnit, typedUnits, type Quantity } from './quantity';

/** A value in engine units, or one sentence for the person who typed it. */
export type ParsedQuantity = { ok: true; value: number } | { ok: false; error: string };

const refused = (error: string): ParsedQuantity => ({ ok: false, error });

/** `kN·m`, `kip-ft`, `in.` and `mm^2` as they stand in the unit table: `knm`, `kipft`, `in`, `mm2`. */
const unitKey = (text: string): string => text.toLowerCase().replace(/[\s·*^.-]/g, '');

function listed(labels: string[]): string {
	if (labels.length < 2) return labels.join('');
	return `${labels.slice(0, -1).join(', ')} or ${labels.at(-1)}`;
}

/** Engine units in one of the typed unit; the shown unit when none was typed. */
function unitSize(typed: string, quantity: Quantity, preferences: Preferences): Reading {
	const key = unitKey(typed);
	if (key === '') return { ok: true, value: shownUnit(quantity, preferences.system).size };
	const units = typedUnits(quantity);
	const found = units.find((unit) => unit.names.includes(key));
	if (found) return { ok: true, value: found.size };
	const known = units.map((unit) => unit.label).filter((label) => label !== '');
	return refused(
		`“${typed.trim()}” is not a unit of ${quantityNoun(quantity)}. Use ${listed(known)}.`
	);
}

const fractionForm = /^(?:(\d[\d ]*)[ -] ?)?(\d+) ?\/ ?(\d+)(?![\d.,])(.*)$/;
const decimalForm = /^([\d., ]*\d[.,]?)(?: ?e([+-]?\d+)| ?[x×*·] ?10 ?\^?([+-]?\d+))?(.*)$/i;

/** Splits unsigned text into its number and the unit that follows it. */
function numberAndUnit(text: string, decimal: Preferences['decimal']): [Reading, string] {
	const fraction = fractionForm.exec(text);
	if (fraction) {
		const [, whole, above = '', below = '', rest = ''] = fraction;
		return [readFraction(whole, above, below), rest];
	}
	const parts = decimalForm.exec(text);
	if (!parts) return [readDigits(text, decimal), ''];
	const [, digits = '', e, power, rest = ''] = parts;
	return [scaled(readDigits(digits, decimal), 10 ** Number(e ?? power ?? 0)), rest];
}

function unsignedQuantity(text: string, quantity: Quantity, preferences: Preferences): Reading {
	const [number, unit] = numberAndUnit(text, preferences.decimal);
	if (!number.ok) return number;
	const size = unitSize(unit, quantity, preferences);
	return size.ok ? scaled(number, size.value) : size;
}

const feetForm = /^(.*\d) ?(?:'|ft|foot|feet)[ -]*(\d.*?) ?(?:"|''|in\.?|inch|inches)?$/i;

/** `1'-6 1/2"`, `2 ft 3 in`: feet and then inches. */
function feetAndInches(text: string, preferences: Preferences): Reading | null {
	const match = feetForm.exec(text);
	if (!match) return null;
	const feet = unsignedQuantity(`${match[1]} ft`, 'length', preferences);
	if (!feet.ok) return feet;
	const inches = unsignedQuantity(`${match[2]} in`, 'length', preferences);
	return inches.ok ? { ok: true, value: feet.value + inches.value } : inches;
}

/**
 * Reads what a person typed as a quantity, in engine units (see `Quantity`). Decimal comma or
 * point, thousands spaces, fractions, feet and inches, an exponent and a unit are understood;
 * without a unit the shown one is meant. Text that can be read two ways is refused.
 */
export function parseQuantity(
	text: string,
	quantity: Quantity,
	preferences: Preferences
): ParsedQuantity {
	const plain = plainText(text).replace(/(\d) 1 ?\/ ?(?=[a-z])/i, '$1 /');
	if (plain === '') return refused('Type a figure.');
	const signed = /^([+-]?) ?(.*)$/.exec(plain);
	const unsigned = signed?.[2] ?? '';
	const reading =
		(quantity === 'length' && feetAndInches(unsigned, preferences)) ||
		unsignedQuantity(unsigned, quantity, preferences);
	return signed?.[1] === '-' ? scaled(reading, -1) : reading;
}
