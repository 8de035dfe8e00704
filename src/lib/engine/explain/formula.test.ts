import { describe, expect, it } from 'vitest';
import { formulaTokens, formulaValue } from './formula';

const given = (values: Record<string, number>) =>
	Object.entries(values).map(([symbol, value]) => ({ symbol, value, unit: '' }));

describe('formulaValue', () => {
	it.each([
		['N_c,Rd = A·fy/γM0·10^-3', { A: 5381, fy: 355, γM0: 1 }, 1910.255],
		['ε = √(235/fy)', { fy: 235 }, 1],
		['x = a − b − c', { a: 10, b: 3, c: 2 }, 5],
		['x = −a² + 2·b³', { a: 3, b: 2 }, 7],
		['x = min(a, b/2)·max(1, c)', { a: 4, b: 6, c: 5 }, 15],
		['ψ = σ2/σ1 = -1·(σ2 - 1)/σ1', { σ1: 4, σ2: -3 }, 1]
	])('puts the numbers into %s', (formula, values, expected) => {
		const found = formulaValue(formula, given(values));
		expect(found.ok && found.value).toBeCloseTo(expected, 12);
	});

	it.each(['x = a·', 'x = (a', 'x = a b', 'x = q', 'x = √a', 'x = a § b'])(
		'tells that %s cannot be worked out',
		(formula) => {
			expect(formulaValue(formula, given({ a: 1, b: 2 })).ok).toBe(false);
		}
	);
});

describe('formulaTokens', () => {
	it('keeps symbols with commas, primes and subscripts whole', () => {
		const tokens = formulaTokens("M_y,Rd = k_σ·tw'");
		expect(
			tokens.ok && tokens.value.filter(({ kind }) => kind === 'symbol').map(({ text }) => text)
		).toEqual(['M_y,Rd', 'k_σ', "tw'"]);
	});

	it('loses no character', () => {
		const formula = 'V = η·fyw·hw·t / (√(3)·γM1)';
		const tokens = formulaTokens(formula);
		expect(tokens.ok && tokens.value.map(({ text }) => text).join('')).toBe(formula);
	});
});
