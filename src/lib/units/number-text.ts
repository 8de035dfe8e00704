import type { Preferences } from './preferences';

/** A number read from text, or the sentence that says why it could not be. */
export type Reading = { ok: true; value: number } | { ok: false; error: string };

const read = (value: number): Reading =>
	Number.isFinite(value) ? { ok: true, value } : refused('This number is too large.');
const refused = (error: string): Reading => ({ ok: false, error });

const notANumber = (text: string): Reading =>
	refused(`“${text.trim()}” is not a number. Type a figure such as 12.5.`);

const marks = { point: '.', comma: ',' } as const;
const groupedBy = (mark: string) => new RegExp(`^\\d{1,3}(?:\\${mark}\\d{3})+$`);

/** The plain digits behind `1.234,5`, `1,234.5`, `12,5`: the last mark is the decimal one. */
function withTwoMarks(text: string): string | null {
	const last = Math.max(text.lastIndexOf('.'), text.lastIndexOf(','));
	const groupMark = text[last] === '.' ? ',' : '.';
	const whole = text.slice(0, last);
	if (!groupedBy(groupMark).test(whole)) return null;
	return `${whole.replaceAll(groupMark, '')}.${text.slice(last + 1)}`;
}

/**
 * One kind of mark in the text. The person's own mark is decimal. The other one is decimal too,
 * unless three digits follow a whole that could be thousands: that is refused, not guessed.
 */
function withOneMark(text: string, mark: '.' | ',', own: '.' | ','): string | 'unclear' | null {
	const pieces = text.split(mark);
	if (pieces.length > 2) return groupedBy(mark).test(text) ? pieces.join('') : null;
	const [whole = '', fraction = ''] = pieces;
	if (mark !== own && fraction.length === 3 && /^[1-9]\d{0,2}$/.test(whole)) return 'unclear';
	return `${whole}.${fraction}`;
}

function plainDigits(text: string, decimal: Preferences['decimal']): string | 'unclear' | null {
	const hasPoint = text.includes('.');
	const hasComma = text.includes(',');
	if (hasPoint && hasComma) return withTwoMarks(text);
	if (!hasPoint && !hasComma) return text;
	return withOneMark(text, hasPoint ? '.' : ',', marks[decimal]);
}

/** Takes out spaces that part thousands; null when they part anything else. */
function withoutSpaces(text: string): string | null {
	if (!text.includes(' ')) return text;
	return /^\d{1,3}(?: \d{3})+(?:[.,]\d*)?$/.test(text) ? text.replaceAll(' ', '') : null;
}

function unclear(text: string): Reading {
	const joined = text.replace(/[.,]/, '');
	const other = text.includes(',') ? text.replace(',', '.') : text.replace('.', ',');
	return refused(`“${text}” can be read two ways. Type ${joined} or ${other}.`);
}

/**
 * Reads unsigned digits: decimal comma or point, thousands parted by spaces or the other mark.
 * No exponent, no unit. `text` is already free of odd spaces (see `plainText`).
 */
export function readDigits(text: string, decimal: Preferences['decimal']): Reading {
	const closed = withoutSpaces(text.trim());
	if (closed === null || !/\d/.test(closed)) return notANumber(text);
	const digits = plainDigits(closed, decimal);
	if (digits === 'unclear') return unclear(closed);
	if (digits === null || !/^\d*\.?\d*$/.test(digits)) return notANumber(text);
	return read(Number(digits));
}

/** `3/8` or `6 1/2`: whole part in digits or absent. */
export function readFraction(whole: string | undefined, above: string, below: string): Reading {
	if (Number(below) === 0) return refused('The lower figure of a fraction cannot be 0.');
	return read(Number((whole ?? '').replaceAll(' ', '') || 0) + Number(above) / Number(below));
}

const KEPT_DIGITS = 15;

/** A reading times a factor, kept to fifteen figures so that 12 in is 304.8 mm without dust. */
export const scaled = (reading: Reading, by: number): Reading =>
	reading.ok ? read(Number((reading.value * by).toPrecision(KEPT_DIGITS))) : reading;

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const plainCharacters: readonly [RegExp, string][] = [
	[/[\u00a0\u2000-\u200a\u202f\u205f\s]+/g, ' '],
	[/[−‐‑–⁻]/g, '-'],
	[/[’‘′]/g, "'"],
	[/[”“″]/g, '"'],
	[/μ/g, 'µ']
];

/** Typed text in plain characters: one kind of space, minus, quote; superscripts as digits. */
export function plainText(text: string): string {
	const lowered = text.replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹]/g, (sign) => String(superscripts.indexOf(sign)));
	return plainCharacters.reduce((now, [from, to]) => now.replace(from, to), lowered).trim();
}
