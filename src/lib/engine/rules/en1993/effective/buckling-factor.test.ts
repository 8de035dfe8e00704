import { describe, expect, it } from 'vitest';
import { bucklingFactor, internalBuckling } from './buckling-factor';

describe('internalBuckling', () => {
	it.each([
		[1, 4, 0.005],
		[0.5, 8.2 / 1.55, 1e-12],
		[0, 7.81, 0.005],
		[-0.5, 7.81 + 3.145 + 2.445, 1e-12],
		[-1, 23.9, 0.03],
		[-2, 5.98 * 9, 1e-12],
		[-3, 5.98 * 16, 1e-12]
	])('has the value of Table 4.1 of EN 1993-1-5 at ψ = %d', (psi, expected, tolerance) => {
		expect(Math.abs(internalBuckling(psi) - expected)).toBeLessThanOrEqual(tolerance);
	});

	it('stays at its value of ψ = −3 below that', () => {
		expect(internalBuckling(-7)).toBe(internalBuckling(-3));
	});

	// the printed coefficients are rounded: 8.2/1.05 against 7.81, 23.88 against 23.92
	it.each([
		[0, 0.0005],
		[-1, 0.05]
	])('steps by no more than its printed rounding at ψ = %d', (psi, step) => {
		expect(Math.abs(internalBuckling(psi + 1e-9) - internalBuckling(psi - 1e-9))).toBeLessThan(
			step
		);
	});
});

describe('bucklingFactor of outstands', () => {
	it.each([
		[1, 0.43],
		[0, 0.57],
		[-1, 0.85]
	])('has the value of Table 4.2 with the free edge more compressed at ψ = %d', (psi, expected) => {
		expect(Math.abs(bucklingFactor('outstand', psi, 'tip') - expected)).toBeLessThan(0.005);
	});

	it.each([
		[1, 0.43],
		[0, 1.7],
		[-1, 23.8]
	])('has the value of Table 4.2 with the support more compressed at ψ = %d', (psi, expected) => {
		expect(Math.abs(bucklingFactor('outstand', psi, 'root') - expected)).toBeLessThan(0.005);
	});
});
