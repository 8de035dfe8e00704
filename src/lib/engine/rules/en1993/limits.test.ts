import { describe, expect, it } from 'vitest';
import { classWithin } from './classify-element';
import { internalLimits, outstandBuckling, outstandLimits, tubularLimits } from './limits';

const first = 'EN1993-1-1:2005';

/** One step of the last digit of a double up and down. */
const above = (value: number) => value * (1 + Number.EPSILON);
const below = (value: number) => value * (1 - Number.EPSILON);

// Expected figures: EN 1993-1-1:2005 Table 5.2 and EN 1993-1-5 Table 4.2 (from memory).
describe('limits of internal parts', () => {
	it('are 72, 83, 124 ε in bending', () => {
		expect(internalLimits(first, 1, 0.5, -1)).toEqual([72, 83, 124]);
	});

	it('are 33, 38, 42 ε in compression', () => {
		const [one, two, three] = internalLimits(first, 1, 1, 1);
		expect(one).toBeCloseTo(33, 12);
		expect(two).toBeCloseTo(38, 12);
		expect(three).toBeCloseTo(42, 12);
	});

	it('follow 396/(13α − 1), 456/(13α − 1) above half and 36/α, 41.5/α below', () => {
		expect(internalLimits(first, 1, 0.75, 0)[0]).toBeCloseTo(396 / 8.75, 12);
		expect(internalLimits(first, 1, 0.75, 0)[1]).toBeCloseTo(456 / 8.75, 12);
		expect(internalLimits(first, 1, 0.25, -2)[0]).toBe(144);
		expect(internalLimits(first, 1, 0.25, -2)[1]).toBe(166);
	});

	it('follow 42/(0.67 + 0.33ψ) above ψ −1 and 62(1 − ψ)√−ψ below', () => {
		expect(internalLimits(first, 1, 0.8, 0)[2]).toBeCloseTo(42 / 0.67, 12);
		expect(internalLimits(first, 1, 0.4, -2)[2]).toBeCloseTo(62 * 3 * Math.SQRT2, 10);
	});

	it('stay finite where hardly anything is compressed', () => {
		expect(internalLimits(first, 1, 0.1, Number.NEGATIVE_INFINITY).every(Number.isFinite)).toBe(
			true
		);
	});

	it('grow with ε', () => {
		expect(internalLimits(first, 0.5, 0.5, -1)).toEqual([36, 41.5, 62]);
	});
});

describe('limits of outstands', () => {
	const even = { alpha: 1, plasticEnd: 'tip', psi: 1, elasticEnd: 'tip' } as const;

	it('are 9, 10, 14 ε in uniform compression', () => {
		expect(outstandLimits(1, even)).toEqual([9, 10, 14]);
	});

	it('rise by 1/α with the tip compressed and 1/(α√α) with the root compressed', () => {
		const tip = outstandLimits(1, { ...even, alpha: 0.5, psi: 0 });
		expect(tip[0]).toBe(18);
		const root = outstandLimits(1, { ...even, alpha: 0.25, plasticEnd: 'root', psi: 0 });
		expect(root[0]).toBe(72);
		expect(root[1]).toBe(80);
	});

	it('take 21 √kσ for class 3 with a gradient', () => {
		const tip = outstandLimits(1, { ...even, psi: 0 });
		expect(tip[2]).toBeCloseTo(21 * Math.sqrt(0.57), 12);
		const root = outstandLimits(1, { ...even, psi: 0, elasticEnd: 'root' });
		expect(root[2]).toBeCloseTo(21 * Math.sqrt(1.7), 12);
	});

	it('take kσ from the table: 0.43, 0.57, 0.85 at the tip; 0.43, 1.70, 23.8 at the root', () => {
		expect(outstandBuckling(1, 'tip')).toBeCloseTo(0.43, 12);
		expect(outstandBuckling(0, 'tip')).toBeCloseTo(0.57, 12);
		expect(outstandBuckling(-1, 'tip')).toBeCloseTo(0.85, 12);
		expect(outstandBuckling(1, 'root')).toBeCloseTo(0.43, 2);
		expect(outstandBuckling(0, 'root')).toBeCloseTo(1.7, 12);
		expect(outstandBuckling(-1, 'root')).toBeCloseTo(23.8, 12);
	});
});

describe('a part on its limit', () => {
	it('is within it, and one step beyond is in the next class', () => {
		const limits = outstandLimits(Math.sqrt(235 / 355), {
			alpha: 1,
			plasticEnd: 'tip',
			psi: 1,
			elasticEnd: 'tip'
		});
		limits.forEach((limit, i) => {
			expect(classWithin(limit, limits)).toBe(i + 1);
			expect(classWithin(below(limit), limits)).toBe(i + 1);
			expect(classWithin(above(limit), limits)).toBe(i + 2);
		});
	});

	it('is judged unrounded for internal parts too', () => {
		const limits = internalLimits(first, Math.sqrt(235 / 275), 0.63, -0.8);
		limits.forEach((limit, i) => {
			expect(classWithin(limit, limits)).toBe(i + 1);
			expect(classWithin(above(limit), limits)).toBe(i + 2);
		});
	});
});

describe('limits of round tubes', () => {
	it('are 50, 70, 90 ε²', () => {
		expect(tubularLimits(first, 1, 1)).toEqual([50, 70, 90]);
		expect(tubularLimits(first, Math.sqrt(235 / 355), 1)[2]).toBeCloseTo((90 * 235) / 355, 12);
	});
});
