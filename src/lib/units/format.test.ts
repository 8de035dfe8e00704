import { describe, expect, it } from 'vitest';
import { formatNumber, formatQuantity } from './format';
import { defaultPreferences as si, preferencesFrom, preferencesText } from './preferences';

const us = { system: 'us', decimal: 'point' } as const;

describe('figures as engineers write them', () => {
	it('keeps significant figures and never rounds the whole part away', () => {
		expect(formatNumber(1.13956, si)).toBe('1.140');
		expect(formatNumber(63.14, si, { digits: 3 })).toBe('63.1');
		expect(formatNumber(10195.4, si)).toBe('10\u202f195');
		expect(formatNumber(9.9999, si, { digits: 3 })).toBe('10.0');
		expect(formatNumber(0.0012345, si, { digits: 3 })).toBe('0.00123');
	});

	it('parts thousands from five digits on, or from four in a column', () => {
		expect(formatNumber(9014, si)).toBe('9014');
		expect(formatNumber(9014, si, { grouping: 'always' })).toBe('9\u202f014');
		expect(formatNumber(1234567, si)).toBe('1\u202f234\u202f567');
	});

	it('writes a true minus, and none before a figure that shows as zero', () => {
		expect(formatNumber(-345, si, { digits: 3 })).toBe('−345');
		expect(formatNumber(-0.0001, si, { decimals: 1 })).toBe('0.0');
		expect(formatNumber(3.45, si, { digits: 3, plus: true })).toBe('+3.45');
	});

	it('follows the decimal mark of the person', () => {
		expect(formatNumber(9.25, { decimal: 'comma' }, { digits: 3 })).toBe('9,25');
	});

	it('drops zeros at the end only when asked', () => {
		expect(formatNumber(400, si, { digits: 6, trim: true })).toBe('400');
		expect(formatNumber(400, si, { digits: 4 })).toBe('400.0');
	});

	it('shows a dash where there is no figure', () => {
		expect(formatQuantity(null, 'moment', si, { unit: true })).toBe('–');
		expect(formatNumber(Number.NaN, si)).toBe('–');
	});

	it('puts the unit of the person’s system behind the figure', () => {
		expect(formatQuantity(3110, 'moment', si, { unit: true })).toBe('3110\u00a0kNm');
		expect(formatQuantity(9014000, 'modulus', si, { unit: true })).toBe('9014\u00a0cm³');
		expect(formatQuantity(304.8, 'length', us, { unit: true, digits: 3 })).toBe('12.0\u00a0in');
		expect(formatQuantity(90, 'angle', si, { unit: true, digits: 2 })).toBe('90°');
		expect(formatQuantity(0.00345, 'strain', si, { unit: true, digits: 3 })).toBe('3.45\u00a0‰');
	});
});

describe('preferences', () => {
	it('come back from their text, and unknown text is the default', () => {
		const chosen = { system: 'us', decimal: 'comma' } as const;
		expect(preferencesFrom(preferencesText(chosen))).toEqual(chosen);
		expect(preferencesFrom('x.y.z')).toEqual(si);
		expect(preferencesFrom(undefined)).toEqual(si);
	});
});
