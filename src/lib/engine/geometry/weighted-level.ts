import { momentsBelow, widthAt, type Profile } from './profile';
import { momentCount } from './flank-moments';

/**
 * The level below which the weighted areas of several bodies add up to `target` (weights > 0).
 * Where a gap between bodies leaves a choice, the middle of the gap. Exact to the last digits:
 * bisection over the levels at which the shape changes, then safeguarded Newton inside one slab.
 */
export function weightedLevel(
	profiles: readonly Profile[],
	weights: readonly number[],
	target: number
): number {
	const levels = allLevels(profiles);
	const areaBelow = areaFunction(profiles, weights);
	const total = areaBelow(levels[levels.length - 1]!);
	const slack = 1e-14 * total;
	const first = lastLevel(levels, (level) => areaBelow(level) < target - slack);
	const last = lastLevel(levels, (level) => areaBelow(level) <= target + slack);
	if (last > first + 1) return (levels[first + 1]! + levels[last]!) / 2;
	if (last >= 0 && Math.abs(areaBelow(levels[last]!) - target) <= slack) return levels[last]!;
	const slope = (level: number) =>
		profiles.reduce((sum, p, i) => sum + weights[i]! * widthAt(p, level), 0);
	return rootBetween(
		levels[Math.max(first, 0)]!,
		levels[Math.min(Math.max(first, 0) + 1, levels.length - 1)]!,
		(level) => areaBelow(level) - target,
		slope
	);
}

function areaFunction(profiles: readonly Profile[], weights: readonly number[]) {
	const out = new Float64Array(momentCount);
	return (level: number): number => {
		let sum = 0;
		for (let i = 0; i < profiles.length; i++) {
			momentsBelow(profiles[i]!, level, out);
			sum += weights[i]! * out[0]!;
		}
		return sum;
	};
}

function allLevels(profiles: readonly Profile[]): Float64Array {
	if (profiles.length === 1) return profiles[0]!.levels;
	const all = new Float64Array(profiles.reduce((sum, { levels }) => sum + levels.length, 0));
	let at = 0;
	for (const { levels } of profiles) {
		all.set(levels, at);
		at += levels.length;
	}
	return all.sort();
}

/** Index of the last level that holds; −1 when none does. The property holds up to some level. */
function lastLevel(levels: Float64Array, holds: (level: number) => boolean): number {
	let low = -1;
	let high = levels.length;
	while (high - low > 1) {
		const middle = (low + high) >> 1;
		if (holds(levels[middle]!)) low = middle;
		else high = middle;
	}
	return low;
}

/** Root of a rising function in [low, high], by Newton steps kept inside a shrinking bracket. */
export function rootBetween(
	low: number,
	high: number,
	value: (x: number) => number,
	slope: (x: number) => number
): number {
	let x = (low + high) / 2;
	for (let i = 0; i < 80; i++) {
		const residual = value(x);
		if (residual === 0) return x;
		if (residual < 0) low = x;
		else high = x;
		const newton = x - residual / slope(x);
		const next = newton > low && newton < high ? newton : (low + high) / 2;
		if (Math.abs(next - x) <= 1e-16 * Math.max(Math.abs(low), Math.abs(high))) return next;
		x = next;
	}
	return x;
}
