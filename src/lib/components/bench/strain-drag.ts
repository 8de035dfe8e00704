import type { Bending } from '$lib/engine/response/respond';
import type { ResponseState } from '$lib/engine/response/state';

/** A level of the section: `depth` mm from the centroid, square to an axis at `angle` degrees. */
export interface Level {
	readonly angle: number;
	readonly depth: number;
}

const rounds = 5;

/** Strain of a state at a level; null when the state does not exist. */
export function strainAtLevel(
	{ e0, ky, kz }: ResponseState,
	{ angle, depth }: Level
): number | null {
	if (e0 === null || ky === null || kz === null) return null;
	const radians = (angle * Math.PI) / 180;
	return e0 - (ky * Math.cos(radians) + kz * Math.sin(radians)) * depth * 1e-3;
}

/**
 * Curvature (1/m) at which the strain at a level comes near `wanted`, by secants from the curvature
 * that holds now; `unit` is the curvature at first yield, which sets the first step.
 */
export function curvatureForStrain(
	bender: Bending,
	now: number,
	unit: number,
	level: Level,
	wanted: number
): number {
	const missing = (curvature: number) => {
		const strain = strainAtLevel(bender.atCurvature(curvature), level);
		return strain === null ? null : strain - wanted;
	};
	let [before, at] = [now, now + unit * 0.05];
	let [missBefore, miss] = [missing(before), missing(at)];
	for (let round = 0; round < rounds; round += 1) {
		if (missBefore === null || miss === null || miss === missBefore) return before;
		const next = at - (miss * (at - before)) / (miss - missBefore);
		[before, missBefore] = [at, miss];
		[at, miss] = [next, missing(next)];
		if (miss !== null && Math.abs(miss) < 1e-7) return at;
	}
	return miss === null ? before : at;
}
