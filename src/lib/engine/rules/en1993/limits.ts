/** Slenderness limits of classes 1, 2 and 3. */
export type ClassLimits = [number, number, number];

/** Ratios closer than this are the same: α 0.5, α 1, ψ 1 and ψ −1 have rows of their own. */
export const sameRatio = 1e-9;

/** ψ below this is taken as this: the class 3 limits only grow further, without end. */
const leastPsi = -3;

/**
 * c/t limits of an internal part, EN 1993-1-1:2005 Table 5.2 sheet 1. `alpha`: compressed share of
 * c in the plastic block, above 0; `psi`: stress ratio of the edges at first yield, compression
 * positive, over the more compressed one.
 */
export function internalLimits(epsilon: number, alpha: number, psi: number): ClassLimits {
	return [
		epsilon * plasticLimit(alpha, 72, 36, 396),
		epsilon * plasticLimit(alpha, 83, 41.5, 456),
		epsilon * elasticInternalLimit(psi)
	];
}

function plasticLimit(alpha: number, bending: number, low: number, high: number): number {
	if (Math.abs(alpha - 0.5) <= sameRatio) return bending;
	return alpha > 0.5 ? high / (13 * Math.min(alpha, 1) - 1) : low / alpha;
}

function elasticInternalLimit(psi: number): number {
	if (Math.abs(psi + 1) <= sameRatio) return 124;
	if (psi > -1) return 42 / (0.67 + 0.33 * Math.min(psi, 1));
	const clamped = Math.max(psi, leastPsi);
	return 62 * (1 - clamped) * Math.sqrt(-clamped);
}

/** Which end of an outstand is the more compressed: the free tip or the supported root. */
export type CompressedEnd = 'tip' | 'root';

/** Stress of an outstand in the plastic block and at first yield. */
export interface OutstandStress {
	alpha: number;
	plasticEnd: CompressedEnd;
	psi: number;
	elasticEnd: CompressedEnd;
}

/** c/t limits of an outstand flange, EN 1993-1-1:2005 Table 5.2 sheet 2. */
export function outstandLimits(epsilon: number, stress: OutstandStress): ClassLimits {
	const { alpha, plasticEnd, psi, elasticEnd } = stress;
	const share = plasticEnd === 'tip' ? alpha : alpha * Math.sqrt(alpha);
	const uniform = psi >= 1 - sameRatio;
	const elastic = uniform ? 14 : 21 * Math.sqrt(outstandBuckling(psi, elasticEnd));
	return [(9 * epsilon) / share, (10 * epsilon) / share, epsilon * elastic];
}

/** Buckling factor kσ of an outstand, EN 1993-1-5 Table 4.2; ψ beyond the table is taken at its end. */
export function outstandBuckling(psi: number, end: CompressedEnd): number {
	if (end === 'tip') {
		const ratio = Math.max(psi, leastPsi);
		return 0.57 - 0.21 * ratio + 0.07 * ratio ** 2;
	}
	const ratio = Math.max(psi, -1);
	return ratio > 0 ? 0.578 / (ratio + 0.34) : 1.7 - 5 * ratio + 17.1 * ratio ** 2;
}

/** d/t limits of a round tube in bending, compression or both, Table 5.2 sheet 3: ε squared. */
export function tubularLimits(epsilon: number): ClassLimits {
	return [50 * epsilon ** 2, 70 * epsilon ** 2, 90 * epsilon ** 2];
}
