import { momentCount, type Moments } from '../geometry/flank-moments';
import { momentsBelow, type Profile } from '../geometry/profile';
import type { LawGroup } from './law-groups';

/**
 * Forces of a strain plane ε = e0 − κ·across in the frame of its own neutral axis, N and N·mm:
 * N = ∫σ, M = −∫σ·across, T = +∫σ·along; and their derivatives with respect to e0, the
 * curvature about the axis (κ) and the one across it (τ, whose strain is +τ·along).
 */
export interface PlaneForces {
	N: number;
	M: number;
	T: number;
	/** ∂N/∂e0 */
	NN: number;
	/** ∂N/∂κ = ∂M/∂e0 */
	NM: number;
	/** ∂N/∂τ = ∂T/∂e0 */
	NT: number;
	/** ∂M/∂κ */
	MM: number;
	/** ∂M/∂τ = ∂T/∂κ */
	MT: number;
	/** ∂T/∂τ */
	TT: number;
}

/**
 * Exact stress resultants: each body is cut along the lines where its law kinks, and between two
 * cuts the stress is linear, so that moments of area up to the second are all that is needed.
 */
export function planeForces(
	groups: readonly LawGroup[],
	profiles: readonly Profile[],
	e0: number,
	curvature: number
): PlaneForces {
	const out: PlaneForces = { N: 0, M: 0, T: 0, NN: 0, NM: 0, NT: 0, MM: 0, MT: 0, TT: 0 };
	for (let g = 0; g < groups.length; g++) {
		const { kinks, offsets, slopes } = groups[g]!.law;
		const add = (band: Moments, segment: number) =>
			addBand(out, band, offsets[segment]!, slopes[segment]!, e0, curvature);
		eachBand(profiles[g]!, kinks, e0, curvature, add);
	}
	return out;
}

function addBand(
	out: PlaneForces,
	m: Moments,
	offset: number,
	slope: number,
	e0: number,
	curvature: number
): void {
	const [area, across, along, across2, product, along2] = m as unknown as SixNumbers;
	const constant = offset + slope * e0;
	const rate = slope * curvature;
	out.N += constant * area - rate * across;
	out.M -= constant * across - rate * across2;
	out.T += constant * along - rate * product;
	if (slope === 0) return;
	out.NN += slope * area;
	out.NM -= slope * across;
	out.NT += slope * along;
	out.MM += slope * across2;
	out.MT -= slope * product;
	out.TT += slope * along2;
}

export type SixNumbers = [number, number, number, number, number, number];

/**
 * Calls `visit` with the moments of each band between the levels at which the strain passes the
 * given strains (ascending), and the band's index among the strains' intervals.
 */
export function eachBand(
	profile: Profile,
	strains: readonly number[],
	e0: number,
	curvature: number,
	visit: (band: Moments, interval: number) => void
): void {
	if (curvature === 0) {
		visit(profile.total, intervalOf(strains, e0));
		return;
	}
	const from = new Float64Array(momentCount);
	const to = new Float64Array(momentCount);
	const band = new Float64Array(momentCount);
	const rising = curvature > 0;
	// upwards through the section the strain falls when the curvature is positive
	for (let i = 0; i <= strains.length; i++) {
		const interval = rising ? strains.length - i : i;
		const limit = rising ? strains[interval - 1] : strains[interval];
		const level = limit === undefined ? Infinity : (e0 - limit) / curvature;
		if (level < profile.low) continue;
		const last = level >= profile.high;
		if (last) to.set(profile.total);
		else momentsBelow(profile, level, to);
		for (let k = 0; k < momentCount; k++) band[k] = to[k]! - from[k]!;
		visit(band, interval);
		if (last) return;
		from.set(to);
	}
}

function intervalOf(strains: readonly number[], strain: number): number {
	let at = 0;
	while (at < strains.length && strain >= strains[at]!) at++;
	return at;
}
