import { outstandBuckling, sameRatio, type CompressedEnd } from '../limits';

/** ψ below this is taken as this: Tables 4.1 and 4.2 of EN 1993-1-5 go no further. */
export const leastRatio = -3;

/**
 * Buckling factor kσ of an internal part, EN 1993-1-5 Table 4.1, for the stress ratio ψ of its edges
 * (compression positive, over the more compressed one). The branches of the table meet at ψ = 0
 * and ψ = −1 within its rounding (7.8095 and 7.81, 23.88 and 23.92).
 */
export function internalBuckling(psi: number): number {
	if (psi >= 0) return 8.2 / (1.05 + Math.min(psi, 1));
	if (isFirstBranch(psi)) return 7.81 - 6.29 * psi + 9.78 * psi * psi;
	const gap = 1 - Math.max(psi, leastRatio);
	return 5.98 * gap * gap;
}

/** Whether the branch above ψ = −1 holds; −1 itself, which rounding may miss, belongs to it. */
export const isFirstBranch = (psi: number): boolean => psi >= -1 - sameRatio;

export const bucklingFactor = (
	type: 'internal' | 'outstand',
	psi: number,
	end: CompressedEnd
): number => (type === 'internal' ? internalBuckling(psi) : outstandBuckling(psi, end));
