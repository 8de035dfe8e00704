import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatQuantity } from './format';
import { parseQuantity } from './parse';
import type { Preferences } from './preferences';
import { quantities, toShown, type Quantity } from './quantity';

const si: Preferences = { system: 'si', decimal: 'point' };
const comma: Preferences = { system: 'si', decimal: 'comma' };
const us: Preferences = { system: 'us', decimal: 'point' };

function value(text: string, quantity: Quantity, preferences = si): number {
	const parsed = parseQuantity(text, quantity, preferences);
	if (!parsed.ok) throw new Error(parsed.error);
	return parsed.value;
}
function sentence(text: string, quantity: Quantity, preferences = si): string {
	const parsed = parseQuantity(text, quantity, preferences);
	return parsed.ok ? '' : parsed.error;
}

describe('typed figures', () => {
	it.each([
		['12.5', 12.5],
		['12,5', 12.5],
		[' 1 234.5 ', 1234.5],
		['1\u202f234\u202f567', 1234567],
		['1,234.5', 1234.5],
		['1.234,5', 1234.5],
		['1,234,567', 1234567],
		['0,125', 0.125],
		['.5', 0.5],
		['5.', 5],
		['−3', -3],
		['+3', 3],
		['2.1e5', 210000],
		['1.5×10⁻⁷', 1.5e-7],
		['3/8', 0.375],
		['6 1/2', 6.5],
		['6-1/2', 6.5]
	])('reads %s', (text, expected) => {
		expect(value(text, 'length')).toBeCloseTo(expected, 12);
	});

	it('takes the person’s own mark as decimal whatever follows it', () => {
		expect(value('1.234', 'length', si)).toBe(1.234);
		expect(value('1,234', 'length', comma)).toBe(1.234);
	});

	it('refuses a figure that can be read two ways and says how to type it', () => {
		expect(sentence('1,200', 'length')).toBe('“1,200” can be read two ways. Type 1200 or 1.200.');
		expect(sentence('1.200', 'length', comma)).toContain('Type 1200 or 1,200.');
	});

	it.each(['', 'abc', '1 23', '1..2', '--1', '1/0', '1e999', '12 34 mm', '/'])(
		'refuses “%s” with a sentence',
		(text) => {
			expect(sentence(text, 'length')).toMatch(/^[“A-Z].*\.$/);
		}
	);
});

describe('typed units', () => {
	it.each<[string, Quantity, number]>([
		['12 in', 'length', 304.8],
		['12in.', 'length', 304.8],
		['12"', 'length', 304.8],
		['1\'-6 1/2"', 'length', 469.9],
		['1′ 6″', 'length', 457.2],
		['2 ft 3 in', 'length', 685.8],
		["4'", 'length', 1219.2],
		['3/8 in', 'length', 9.525],
		['1.2 m', 'length', 1200],
		['450 kNm', 'moment', 450],
		['450 kN·m', 'moment', 450],
		['450 kN m', 'moment', 450],
		['1e6 N mm', 'moment', 1],
		['286 cm²', 'area', 28600],
		['28600 mm^2', 'area', 28600],
		['210 GPa', 'stress', 210000],
		['355 MPa', 'stress', 355],
		['3.5 1/km', 'curvature', 0.0035],
		['35 1/km', 'curvature', 0.035],
		['21/m', 'curvature', 21],
		['0.2 %', 'strain', 0.002],
		['1.72', 'strain', 0.00172],
		['85 %', 'ratio', 0.85]
	])('reads %s as %s', (text, quantity, expected) => {
		expect(value(text, quantity)).toBeCloseTo(expected, 9);
	});

	/** NIST SP 811 (2008), appendix B.8: factors printed to seven figures. */
	it.each<[string, Quantity, number]>([
		['1 kip', 'force', 4.448222],
		['1 ksi', 'stress', 6.894757],
		['1 lb/ft', 'massPerLength', 1.488164],
		['1000 lb·ft', 'moment', 1.355818],
		['1 in2', 'area', 645.16],
		['1 in3', 'modulus', 16387.06],
		['1 in4', 'secondMoment', 416231.4]
	])('converts %s as NIST SP 811 prints it', (text, quantity, expected) => {
		expect(Math.abs(value(text, quantity) / expected - 1)).toBeLessThan(5e-7);
	});

	it('leaves no binary dust behind a conversion', () => {
		expect(value('12 in', 'length')).toBe(304.8);
		expect(value('0.1', 'length', us)).toBe(2.54);
	});

	it('means the shown unit when none is typed', () => {
		expect(value('36', 'length', us)).toBeCloseTo(914.4, 12);
		expect(value('10', 'modulus')).toBe(10000);
	});

	it('names the units that would be understood', () => {
		expect(sentence('12 kg', 'length')).toBe(
			'“kg” is not a unit of length. Use mm, in, cm, m or ft.'
		);
	});
});

describe('a figure shown and typed again', () => {
	const preferences = fc.record<Preferences>({
		system: fc.constantFrom('si', 'us'),
		decimal: fc.constantFrom('point', 'comma')
	});
	const figure = fc
		.tuple(
			fc.constantFrom(-1, 0, 1),
			fc.double({ min: 1, max: 10, noNaN: true }),
			fc.integer({ min: -12, max: 17 })
		)
		.map(([sign, mantissa, power]) => sign * mantissa * 10 ** power);
	const form = fc.record({
		digits: fc.integer({ min: 1, max: 12 }),
		unit: fc.boolean(),
		trim: fc.boolean(),
		grouping: fc.constantFrom('long' as const, 'always' as const, 'never' as const)
	});

	it('comes back to within half of its last digit', () => {
		fc.assert(
			fc.property(figure, fc.constantFrom(...quantities), preferences, form, (x, q, p, f) => {
				const back = value(formatQuantity(x, q, p, f), q, p);
				const shown = Math.abs(toShown(x, q, p.system));
				const step = 10 ** (Math.ceil(Math.log10(shown || 1)) - f.digits);
				expect(Math.abs(toShown(back, q, p.system) - toShown(x, q, p.system))).toBeLessThanOrEqual(
					0.5 * step + 1e-12 * shown
				);
			}),
			{ numRuns: 2000 }
		);
	});
});
