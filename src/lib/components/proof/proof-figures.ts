import type { ProofCheck } from '$lib/api/proof';
import { formatNumber, NO_FIGURE, type Preferences } from '$lib/units';

type Decimal = Pick<Preferences, 'decimal'>;

/** The published value as it is printed, with the reader's decimal mark; words as they are. */
export function printedText({ published, printed }: ProofCheck, { decimal }: Decimal): string {
	if (typeof published === 'string') return published;
	const [whole = '', fraction] = printed.replace(/^-/, '−').split('.');
	const parted = whole.length < 5 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, '\u202f');
	return fraction === undefined ? parted : parted + (decimal === 'comma' ? ',' : '.') + fraction;
}

/** Digits printed, without the zeros that only fill up to the unit. */
function significant(printed: string): number {
	const filled = printed.includes('.') ? printed : printed.replace(/0+$/, '');
	return filled.replace(/^[-0.]+|[^\d]/g, '').length;
}

/** Our value with two figures more than the published one is printed with. */
export function oursText(check: ProofCheck, preferences: Decimal): string {
	const { ours, published, printed } = check;
	if (typeof ours === 'string') return ours;
	if (ours === null || typeof published === 'string') return NO_FIGURE;
	const digits = Math.max(4, significant(printed) + 2);
	return formatNumber(ours, preferences, { digits, trim: true });
}

/** The difference in per cent, or in the unit where the tolerance is one; what is the same says so. */
export function differenceText(check: ProofCheck, preferences: Decimal): string {
	const { difference, relativeDifference, tolerance, pass } = check;
	if (difference === null) return pass ? 'same' : check.ours === null ? 'no figure' : 'differs';
	if (tolerance === 'exact' && pass) return 'same';
	const format = { digits: 2, plus: true } as const;
	if (inUnit(check)) return formatNumber(difference, preferences, format);
	return `${formatNumber((relativeDifference ?? 0) * 100, preferences, format)} %`;
}

/** What is allowed, in the terms of `differenceText`. */
export function allowedText(check: ProofCheck, preferences: Decimal): string {
	const { allowed, published, tolerance } = check;
	if (allowed === null || typeof published === 'string' || tolerance === 'exact') return 'none';
	const format = { digits: 2, trim: true } as const;
	if (inUnit(check)) return `± ${formatNumber(allowed, preferences, format)}`;
	return `± ${formatNumber((allowed / Math.abs(published)) * 100, preferences, format)} %`;
}

const inUnit = ({ tolerance, relativeDifference }: ProofCheck): boolean =>
	tolerance === 'absolute' || relativeDifference === null;

/** "8 408", with a narrow space between thousands. */
export const countText = (count: number): string =>
	formatNumber(count, { decimal: 'point' }, { decimals: 0, grouping: 'always' });
