import type { SectionKind } from '../../section/definition';

/** Exponents of (My/MN,y)^α + (Mz/MN,z)^β ≤ 1, 6.2.9.1(6). */
export interface BiaxialExponents {
	readonly alpha: number;
	readonly beta: number;
	/** Formula of β, and of α where it is the same; null for plain numbers. */
	readonly formula: string | null;
}

/** The code's exponents end here for hollow sections. */
const mostExponent = 6;

/**
 * Exponents for n = |N|/Npl,Rd; null for kinds that the code gives none for. Hollow sections:
 * 1.66/(1 − 1.13 n²) up to 6; beyond n = 0.941 the bracket is no longer positive and 6 stands.
 */
export function biaxialExponents(kind: SectionKind, n: number): BiaxialExponents | null {
	switch (kind) {
		case 'i':
			return { alpha: 2, beta: Math.max(1, 5 * n), formula: 'max(5·n, 1)' };
		case 'circular-hollow':
			return { alpha: 2, beta: 2, formula: null };
		case 'rectangular-hollow':
		case 'box':
			return hollowExponents(n);
		default:
			return null;
	}
}

function hollowExponents(n: number): BiaxialExponents {
	const bracket = 1 - 1.13 * n ** 2;
	const capped = bracket <= 1.66 / mostExponent;
	const value = capped ? mostExponent : 1.66 / bracket;
	return { alpha: value, beta: value, formula: capped ? '6' : '1.66/(1 − 1.13·n²)' };
}
