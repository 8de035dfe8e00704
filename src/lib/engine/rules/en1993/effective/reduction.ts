import { leastRatio } from './buckling-factor';

/** λp up to which nothing is reduced, 4.4(2). */
export const internalLimit = (psi: number): number => 0.5 + Math.sqrt(0.085 - 0.055 * bounded(psi));
export const outstandLimit = 0.748;

const bounded = (psi: number): number => Math.min(1, Math.max(psi, leastRatio));

/** Plate slenderness λp = (b/t)/(28.4 ε √kσ), EN 1993-1-5 4.4(2), b the full width. */
export const plateSlenderness = (b: number, t: number, epsilon: number, kSigma: number): number =>
	b / t / (28.4 * epsilon * Math.sqrt(kSigma));

/** Reduction factor ρ of EN 1993-1-5 4.4(2), at most 1. */
export function reductionFactor(
	type: 'internal' | 'outstand',
	slenderness: number,
	psi: number
): number {
	if (slenderness <= (type === 'internal' ? internalLimit(psi) : outstandLimit)) return 1;
	const share = type === 'internal' ? 0.055 * (3 + bounded(psi)) : 0.188;
	return Math.min(1, (slenderness - share) / (slenderness * slenderness));
}

/** λp,red = λp √(σcom,Ed/(fy/γM0)), 4.4(4); never more than λp. */
export const reducedSlenderness = (slenderness: number, use: number): number =>
	slenderness * Math.sqrt(Math.min(1, Math.max(0, use)));

/**
 * ρ of 4.4(4) for a part whose greatest compressive stress is less than its yield strength, at most
 * 1 and never less than ρ of 4.4(2). Not for member buckling.
 */
export function reductionAtStress(
	type: 'internal' | 'outstand',
	slenderness: number,
	reduced: number,
	psi: number
): number {
	const full = reductionFactor(type, slenderness, psi);
	if (full === 1) return 1;
	const own = reductionFactor(type, reduced, psi);
	if (own === 1) return 1;
	return Math.max(full, Math.min(1, own + (0.18 * (slenderness - reduced)) / (slenderness - 0.6)));
}
