import type { ArcFlank, LineFlank } from './flank';

/**
 * Moments of area in a frame, in this order: area, ∫across, ∫along, ∫across², ∫along·across,
 * ∫along². By Green's theorem each is ∮ along^(p+1)/(p+1) · across^q d(across), so that cuts
 * along the axis add nothing and a slice needs only its flanks.
 */
export type Moments = Float64Array;

export const momentCount = 6;

/** Adds `factor` times the moments swept by a straight flank between two levels (exact: 2-point Gauss). */
export function addLineMoments(
	out: Moments,
	{ start, slope, low }: LineFlank,
	from: number,
	to: number,
	factor: number
): void {
	const half = (to - from) / 2;
	const middle = (from + to) / 2;
	const weight = half * factor;
	for (let i = -1; i <= 1; i += 2) {
		const across = middle + i * half * gaussPoint;
		const along = start + slope * (across - low);
		const square = (along * along) / 2;
		out[0]! += weight * along;
		out[1]! += weight * along * across;
		out[2]! += weight * square;
		out[3]! += weight * along * across * across;
		out[4]! += weight * square * across;
		out[5]! += (weight * along * along * along) / 3;
	}
}

export const gaussPoint = 1 / Math.sqrt(3);

/**
 * Adds `factor` times the antiderivative of the moments of a circular flank at a level, in closed
 * form (integrals of √(R² − u²) and its powers; any table of integrals).
 */
export function addArcAntiderivative(
	out: Moments,
	arc: ArcFlank,
	level: number,
	factor: number
): void {
	const { along: a, across: c, radius: R, side } = arc;
	const u = Math.min(R, Math.max(-R, level - c));
	const R2 = R * R;
	const u2 = u * u;
	const h2 = (R - u) * (R + u);
	const h = Math.sqrt(h2);
	// the angle is taken from h itself, so that rounding of h near a pole cancels
	const angle = Math.atan2(u, h);
	const H0 = side * 0.5 * (u * h + R2 * angle);
	const H1 = (-side * h2 * h) / 3;
	const H2 = (side * (R2 * R2 * angle - u * h * (R2 - 2 * u2))) / 8;
	const H3 = (side * u * h2 * h) / 4 + 0.75 * R2 * H0;
	const square0 = R2 * u - (u2 * u) / 3;
	const square1 = (R2 * u2) / 2 - (u2 * u2) / 4;
	const first = a * u + H0;
	const firstU = (a * u2) / 2 + H1;
	const second = 0.5 * (a * a * u + 2 * a * H0 + square0);
	out[0]! += factor * first;
	out[1]! += factor * (c * first + firstU);
	out[2]! += factor * second;
	out[3]! += factor * (c * c * first + 2 * c * firstU + (a * u2 * u) / 3 + H2);
	out[4]! += factor * (c * second + 0.5 * ((a * a * u2) / 2 + 2 * a * H1 + square1));
	out[5]! += (factor * (a * a * a * u + 3 * a * a * H0 + 3 * a * square0 + H3)) / 3;
}
