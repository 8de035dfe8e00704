import { describe, expect, it } from 'vitest';
import {
	internalLimit,
	outstandLimit,
	plateSlenderness,
	reducedSlenderness,
	reductionAtStress,
	reductionFactor
} from './reduction';

const ratios = [1, 0.5, 0, -0.5, -1, -2, -3, -5];

describe('reductionFactor', () => {
	it('begins at λp 0.673 for uniform compression of an internal part', () => {
		expect(Math.abs(internalLimit(1) - 0.673)).toBeLessThan(0.0005);
	});

	it.each(ratios)('is 1 on the limit and runs on from there without a step, ψ = %d', (psi) => {
		const limit = internalLimit(psi);
		expect(reductionFactor('internal', limit, psi)).toBe(1);
		const beyond = reductionFactor('internal', limit * (1 + 1e-9), psi);
		expect(beyond).toBeGreaterThan(1 - 1e-8);
		expect(reductionFactor('internal', limit * 1.01, psi)).toBeLessThan(1);
	});

	it('is 1 on the limit of outstands, and there is no step beyond', () => {
		expect(reductionFactor('outstand', outstandLimit, 1)).toBe(1);
		expect(reductionFactor('outstand', outstandLimit * (1 + 1e-9), 1)).toBeGreaterThan(0.9999);
		expect(reductionFactor('outstand', 0.76, 1)).toBeLessThan(1);
	});

	it.each(ratios)('falls with the slenderness, ψ = %d', (psi) => {
		for (const type of ['internal', 'outstand'] as const)
			for (let slenderness = 0.5; slenderness < 4; slenderness += 0.05)
				expect(reductionFactor(type, slenderness + 0.05, psi)).toBeLessThanOrEqual(
					reductionFactor(type, slenderness, psi)
				);
	});

	// 4.4(2): (λp − 0.055(3 + ψ))/λp² and (λp − 0.188)/λp² by hand
	it('has the values of 4.4(2)', () => {
		expect(reductionFactor('internal', 2, 1)).toBeCloseTo((2 - 0.22) / 4, 12);
		expect(reductionFactor('internal', 2, -1)).toBeCloseTo((2 - 0.11) / 4, 12);
		expect(reductionFactor('outstand', 1.5, 1)).toBeCloseTo(1.312 / 2.25, 12);
	});
});

describe('plateSlenderness', () => {
	it('takes the whole width: 1000 × 10 of S235 in compression is 100/56.8', () => {
		expect(plateSlenderness(1000, 10, 1, 4)).toBeCloseTo(100 / 56.8, 12);
	});
});

describe('reductionAtStress', () => {
	it.each(['internal', 'outstand'] as const)('is that of 4.4(2) at full stress, %s', (type) => {
		const slenderness = 1.4;
		const reduced = reducedSlenderness(slenderness, 1);
		expect(reductionAtStress(type, slenderness, reduced, 1)).toBeCloseTo(
			reductionFactor(type, slenderness, 1),
			12
		);
	});

	// 4.4(4) by hand: λp 1.5, σ/fy 0.49, λred 1.05: (1 − 0.22/1.05)/1.05 + 0.18 · 0.45/0.9
	it('has the value of 4.4(4)', () => {
		const reduced = reducedSlenderness(1.5, 0.49);
		expect(reduced).toBeCloseTo(1.05, 12);
		const expected = (1 - 0.22 / 1.05) / 1.05 + (0.18 * 0.45) / 0.9;
		expect(reductionAtStress('internal', 1.5, reduced, 1)).toBeCloseTo(expected, 12);
	});

	it('grows as the stress falls, and never beyond 1', () => {
		let before = 0;
		for (let use = 1; use > 0; use -= 0.02) {
			const rho = reductionAtStress('internal', 1.5, reducedSlenderness(1.5, use), 1);
			expect(rho).toBeGreaterThanOrEqual(before - 1e-12);
			expect(rho).toBeLessThanOrEqual(1);
			before = rho;
		}
	});
});
