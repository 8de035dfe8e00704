import {
	roundedFlexibility,
	roundedStrain,
	stressOfFlexibility,
	type RoundedCurve
} from './ramberg-osgood';

/** Greatest distance of the straight lines from the curve, in stress at the same strain, as a share of f0.2. */
export const roundedError = 1e-4;

/** A point on the lines: above the curve by `lift`. */
interface Knot {
	readonly stress: number;
	readonly lift: number;
}

/**
 * A rounded curve as straight lines that begin with E and stay within `roundedError` of it, as few as
 * that allows: each corner lies above the curve by the whole error, and each line dips below it by as
 * much. One corner lies at the strain f0.2/E, the yield strain of the elastic check.
 */
export function roundedPoints(curve: RoundedCurve): (readonly [number, number])[] {
	const error = roundedError * curve.proof;
	const strainOf = (stress: number) => roundedStrain(curve, stress);
	const yieldKnot: Knot = { stress: stressAtStrain(curve, curve.proof / curve.E), lift: error };
	const end: Knot = { stress: curve.end, lift: error };
	const first = curve.proof * Math.pow(error / (curve.E * 0.002), 1 / curve.n);
	const knots: Knot[] = [{ stress: Math.min(first, yieldKnot.stress), lift: error }];
	let size = curve.proof / 10;
	for (const goal of [yieldKnot, end]) {
		while (knots.at(-1)!.stress < goal.stress) {
			const from = knots.at(-1)!;
			const next = furthestKnot(curve, from, goal, error, size);
			size = next.stress - from.stress;
			knots.push(next);
		}
	}
	return knots.map(({ stress, lift }) => [strainOf(stress), stress + lift] as const);
}

/** The corner furthest on to which the line stays within the error, or the goal itself. */
function furthestKnot(
	curve: RoundedCurve,
	from: Knot,
	goal: Knot,
	error: number,
	size: number
): Knot {
	if (dip(curve, from, goal) >= -error) return goal;
	let [low, high] = [from.stress, goal.stress];
	let next = Math.min(from.stress + size, (low + high) / 2);
	for (let i = 0; i < 60; i++) {
		const least = dip(curve, from, { stress: next, lift: error });
		if (least >= -error && least < -0.98 * error) break;
		if (least < -error) high = next;
		else low = next;
		// the dip grows with the square of the step
		const step =
			(next - from.stress) * Math.sqrt((2 * error) / Math.max(error - least, error / 50));
		const guess = from.stress + 0.998 * step;
		next = guess > low && guess < high ? guess : (low + high) / 2;
	}
	return {
		stress: dip(curve, from, { stress: next, lift: error }) >= -error ? next : low,
		lift: error
	};
}

/** Least height of a line above the curve, N/mm²: where both have one slope, or at an end. */
function dip(curve: RoundedCurve, from: Knot, to: Knot): number {
	const [start, end] = [roundedStrain(curve, from.stress), roundedStrain(curve, to.stress)];
	const slope = (to.stress + to.lift - from.stress - from.lift) / (end - start);
	const above = (stress: number) =>
		from.stress + from.lift + slope * (roundedStrain(curve, stress) - start) - stress;
	const level = stressOfFlexibility(curve, 1 / slope, from.stress, to.stress);
	return Math.min(from.lift, to.lift, above(level));
}

/** Newton on the strain, which is convex in the stress. */
function stressAtStrain(curve: RoundedCurve, strain: number): number {
	let stress = Math.min(curve.E * strain, curve.end);
	for (let i = 0; i < 100; i++) {
		const next =
			stress - (roundedStrain(curve, stress) - strain) / roundedFlexibility(curve, stress);
		if (!(next < stress)) return stress;
		stress = next;
	}
	return stress;
}
