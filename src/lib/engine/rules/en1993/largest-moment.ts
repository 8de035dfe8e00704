/** A use this close to 1 is 1, and a bracket this narrow is a number. */
const close = 1e-13;
const tries = 200;

/**
 * Largest moment (kNm) whose use is at most 1, between 0 and where the use first exceeds 1 when it
 * is doubled from `start`. The use may jump; below the moment found it is taken to stay within 1.
 * 0 where nothing may act.
 */
export function largestMoment(use: (moment: number) => number, start: number): number {
	if (!(use(0) <= 1)) return 0;
	let [low, high] = [0, start];
	for (let i = 0; i < tries && use(high) <= 1; i++) [low, high] = [high, 2 * high];
	let [atLow, atHigh] = [use(low) - 1, use(high) - 1];
	for (let i = 0; i < tries && high - low > close * high; i++) {
		const secant = low - (atLow * (high - low)) / (atHigh - atLow);
		const middle = i % 3 < 2 && secant > low && secant < high ? secant : (low + high) / 2;
		const value = use(middle) - 1;
		if (Math.abs(value) <= close) return middle;
		if (value <= 0) [low, atLow] = [middle, value];
		else [high, atHigh] = [middle, value];
	}
	return low;
}
