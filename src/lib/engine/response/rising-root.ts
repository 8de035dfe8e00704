/** What a rising function and its slope are at one place. */
export interface Sample {
	value: number;
	slope: number;
}

export interface Root {
	x: number;
	value: number;
}

/**
 * Root of a function that never falls: Newton steps, kept inside a bracket that closes from both
 * sides; where the slope gives no usable step, the bracket is widened (from `reach` on) or halved.
 * Ends when |value| ≤ `tolerance` or x cannot move any more; the caller judges the value left.
 */
export function risingRoot(
	at: (x: number) => Sample,
	guess: number,
	reach: number,
	tolerance: number
): Root {
	let [low, high] = [-Infinity, Infinity];
	let [x, widen] = [guess, reach];
	let best: Root = { x, value: Infinity };
	for (let i = 0; i < 120; i++) {
		const { value, slope } = at(x);
		if (Math.abs(value) < Math.abs(best.value)) best = { x, value };
		if (Math.abs(value) <= tolerance) return best;
		if (value < 0) low = x;
		else high = x;
		let next = slope > 0 ? x - value / slope : NaN;
		if (!(next > low && next < high)) next = NaN;
		if (high - low < Infinity) {
			// a Newton step that hardly shrinks the bracket is replaced by halving it now and then
			if (Number.isNaN(next) || i % 8 === 7) next = (low + high) / 2;
		} else {
			const furthest = value < 0 ? x + widen : x - widen;
			if (Number.isNaN(next) || Math.abs(next - x) > widen) next = furthest;
			widen *= 2;
		}
		if (next === x || next <= low || next >= high) return best;
		x = next;
	}
	return best;
}
