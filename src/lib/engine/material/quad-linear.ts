import { fail, ok, type Result } from '../result';

/**
 * Quad-linear law of hot-rolled steel (Yun and Gardner 2017, taken up by EN 1993-1-14), from
 * E, fy, fu in N/mm²: elastic, plateau, steep hardening, gentle hardening to (εu, fu).
 */
export function quadLinearPoints(
	E: number,
	fy: number,
	fu: number
): Result<readonly (readonly [number, number])[], string> {
	if (!(fu > fy)) return fail(`The quad-linear law needs fu above fy (${fu} against ${fy}).`);
	const yieldStrain = fy / E;
	const hardening = Math.min(0.03, Math.max(0.015, 0.1 * (fy / fu) - 0.055));
	const ultimate = Math.max(0.06, 0.6 * (1 - fy / fu));
	const c1 = (hardening + 0.25 * (ultimate - hardening)) / ultimate;
	const c2 = (hardening + 0.4 * (ultimate - hardening)) / ultimate;
	const slope = (fu - fy) / (c2 * ultimate - hardening);
	const turn = c1 * ultimate;
	return ok([
		[yieldStrain, fy],
		[hardening, fy],
		[turn, fy + slope * (turn - hardening)],
		[ultimate, fu]
	]);
}
