import { describe, expect, it } from 'vitest';
import { classWithin } from './classify-element';
import {
	internalLimits,
	outstandBuckling,
	outstandLimits,
	tubularLimits,
	type OutstandStress
} from './limits';

const first = 'EN1993-1-1:2005';
const later = 'EN1993-1-1:2022';
const editions = [first, later] as const;

/** One step of the last digit of a double up and down. */
const above = (value: number) => value * (1 + Number.EPSILON);
const below = (value: number) => value * (1 - Number.EPSILON);

// Expected figures: EN 1993-1-1:2005 Table 5.2, EN 1993-1-5 Table 4.2 and EN 1993-1-1:2022
// Table 7.3, all from memory.
describe('limits of internal parts, 2005', () => {
	it('are 72, 83, 124 ε in bending and 33, 38, 42 ε in compression', () => {
		expect(internalLimits(first, 1, 0.5, -1)).toEqual([72, 83, 124]);
		expect(internalLimits(first, 1, 1, 1)).toEqual([33, 38, 42]);
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

	it('grow with ε', () => {
		expect(internalLimits(first, 0.5, 0.5, -1)).toEqual([36, 41.5, 62]);
	});
});

describe('limits of internal parts, 2022', () => {
	it('are 72, 83, 121 ε in bending and 28, 34, 38 ε in compression', () => {
		expect(internalLimits(later, 1, 0.5, -1)).toEqual([72, 83, 121]);
		const [one, two, three] = internalLimits(later, 1, 1, 1);
		expect([one, two]).toEqual([28, 34]);
		expect(three).toBeCloseTo(38, 12);
	});

	it('follow 126/(5.5α − 1), 188/(6.53α − 1) above half and 36/α, 41.5/α below', () => {
		expect(internalLimits(later, 1, 0.75, 0)[0]).toBeCloseTo(126 / 3.125, 12);
		expect(internalLimits(later, 1, 0.75, 0)[1]).toBeCloseTo(188 / 3.8975, 12);
		expect(internalLimits(later, 1, 0.25, -2)[0]).toBe(144);
		expect(internalLimits(later, 1, 0.25, -2)[1]).toBe(166);
	});

	it('follow 38/(0.608 + 0.343ψ + 0.049ψ²) above ψ −1 and 60.5(1 − ψ) below', () => {
		expect(internalLimits(later, 1, 0.8, 0.5)[2]).toBeCloseTo(38 / 0.79175, 12);
		expect(internalLimits(later, 1, 0.4, -2)[2]).toBeCloseTo(181.5, 12);
	});

	it('are never those of 2005 for compression: 33/38/42 against 28/34/38', () => {
		const pairs = editions.map((edition) => internalLimits(edition, 0.81, 1, 1));
		pairs[0]!.forEach((limit, i) => expect(limit).toBeGreaterThan(pairs[1]![i]!));
	});
});

describe('limits of outstands', () => {
	const even: OutstandStress = { alpha: 1, plasticEnd: 'tip', psi: 1, elasticEnd: 'tip' };

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

describe('limits of round tubes', () => {
	it('are 50, 70, 90 ε² whatever the stress in 2005', () => {
		expect(tubularLimits(first, 1, -1)).toEqual([50, 70, 90]);
		expect(tubularLimits(first, 1, 1)).toEqual([50, 70, 90]);
		expect(tubularLimits(first, Math.sqrt(235 / 355), 1)[2]).toBeCloseTo((90 * 235) / 355, 12);
	});

	it('are 50, 70 ε² and 2520ε²/(5ψ + 23) in 2022: 90 in compression, 140 in bending', () => {
		expect(tubularLimits(later, 1, 1)).toEqual([50, 70, 90]);
		expect(tubularLimits(later, 1, -1)).toEqual([50, 70, 140]);
		expect(tubularLimits(later, 1, 0)[2]).toBeCloseTo(2520 / 23, 12);
		expect(tubularLimits(later, 1, -4)[2]).toBe(140);
	});
});

describe('a part on its limit', () => {
	const epsilon = Math.sqrt(235 / 355);
	const even: OutstandStress = { alpha: 1, plasticEnd: 'tip', psi: 1, elasticEnd: 'tip' };
	const rows: [string, [number, number, number]][] = [
		...editions.flatMap((edition): [string, [number, number, number]][] => [
			[`${edition} bending`, internalLimits(edition, epsilon, 0.5, -1)],
			[`${edition} compression`, internalLimits(edition, epsilon, 1, 1)],
			[`${edition} combined, α 0.63`, internalLimits(edition, epsilon, 0.63, -0.8)],
			[`${edition} combined, α 0.31`, internalLimits(edition, epsilon, 0.31, -1.7)],
			[`${edition} tube bent`, tubularLimits(edition, epsilon, -1)],
			[`${edition} tube compressed`, tubularLimits(edition, epsilon, 1)]
		]),
		['outstand compressed', outstandLimits(epsilon, even)],
		['outstand, tip compressed', outstandLimits(epsilon, { ...even, alpha: 0.7, psi: -0.4 })],
		[
			'outstand, root compressed',
			outstandLimits(epsilon, { alpha: 0.7, plasticEnd: 'root', psi: -0.4, elasticEnd: 'root' })
		]
	];
	it.each(rows)('is within it, and one step beyond is in the next class: %s', (_name, limits) => {
		limits.forEach((limit, i) => {
			expect(classWithin(limit, limits)).toBe(i + 1);
			expect(classWithin(below(limit), limits)).toBe(i + 1);
			expect(classWithin(above(limit), limits)).toBe(i + 2);
		});
	});
});

describe('limits along α and ψ', () => {
	/** Beyond the tables' own tolerance of rows: 1e-9. */
	const near = 1e-7;
	const jump = (at: (offset: number) => number) => [at(-near), at(0), at(near)];
	const along = (edition: (typeof editions)[number], nr: number) => ({
		alpha: (alpha: number) => jump((d) => internalLimits(edition, 1, alpha + d, 0)[nr]!),
		psi: (psi: number) => jump((d) => internalLimits(edition, 1, 0.7, psi + d)[2])
	});

	it('jump only where the tables themselves do', () => {
		const found: Record<string, number[]> = {
			'2005 class 2, α 0.5': along(first, 1).alpha(0.5),
			'2005 class 3, ψ −1': along(first, 2).psi(-1),
			'2022 class 2, α 0.5': along(later, 1).alpha(0.5),
			'2022 class 2, α 1': along(later, 1).alpha(1),
			'2022 class 3, ψ −1': along(later, 2).psi(-1)
		};
		const listed: Record<string, number[]> = {
			'2005 class 2, α 0.5': [83, 83, 456 / 5.5],
			'2005 class 3, ψ −1': [124, 124, 42 / 0.34],
			'2022 class 2, α 0.5': [83, 83, 188 / 2.265],
			'2022 class 2, α 1': [188 / 5.53, 34, 34],
			'2022 class 3, ψ −1': [121, 121, 38 / 0.314]
		};
		for (const [name, values] of Object.entries(listed))
			values.forEach((value, i) => expect(found[name]![i], name).toBeCloseTo(value, 3));
	});

	it('jump for outstands between uniform compression and a gradient alone: 14 against 21√0.43', () => {
		const third = (psi: number, end: 'tip' | 'root') =>
			outstandLimits(1, { alpha: 1, plasticEnd: end, psi, elasticEnd: end })[2];
		expect(third(1, 'tip')).toBe(14);
		expect(third(1 - near, 'tip')).toBeCloseTo(21 * Math.sqrt(0.43), 5);
		expect(third(1 - near, 'root')).toBeCloseTo(21 * Math.sqrt(0.578 / 1.34), 5);
		for (const psi of [0.5, 0, -0.5, -1, -2.9])
			for (const end of ['tip', 'root'] as const)
				expect(third(psi - near, end) / third(psi + near, end)).toBeCloseTo(1, 5);
	});

	it.each(editions)('are continuous everywhere else and fall with α and ψ: %s', (edition) => {
		const kinks = [0.5, 1];
		for (let i = 2; i <= 1000; i++) {
			const [before, after] = [(i - 1) / 1000, i / 1000];
			const [one, other] = [before, after].map((alpha) => internalLimits(edition, 1, alpha, 0));
			expect(one![0]).toBeGreaterThan(other![0]);
			if (!kinks.includes(before) && !kinks.includes(after))
				expect(one![1]).toBeGreaterThan(other![1]);
		}
		for (let psi = -2.999; psi < 1; psi += 0.01)
			expect(internalLimits(edition, 1, 0.7, psi)[2]).toBeGreaterThan(
				internalLimits(edition, 1, 0.7, Math.min(psi + 0.01, 1))[2]
			);
	});

	it('stay finite where hardly anything is compressed', () => {
		for (const edition of editions) {
			const limits = internalLimits(edition, 1, 0.1, Number.NEGATIVE_INFINITY);
			expect(limits.every(Number.isFinite)).toBe(true);
		}
	});
});
