/** So many are looked at one by one: what helps may hurt again a few steps on. */
const near = 12;

/**
 * The first index at or after `from` that reaches: the nearest one by one, then in doubling steps that
 * are halved again, taking it that far on what follows a reaching one reaches too. Null where none of
 * `count` is found to.
 */
export function firstReached(
	count: number,
	from: number,
	reaches: (at: number) => boolean
): number | null {
	let [missed, step] = [from - 1, 1];
	for (;;) {
		const at = Math.min(missed + step, count - 1);
		if (at <= missed) return null;
		if (reaches(at)) return halved(missed, at, reaches);
		missed = at;
		if (at - from + 1 >= near) step *= 2;
	}
}

function halved(missed: number, reached: number, reaches: (at: number) => boolean): number {
	let [low, high] = [missed, reached];
	while (high - low > 1) {
		const middle = Math.floor((low + high) / 2);
		if (reaches(middle)) high = middle;
		else low = middle;
	}
	return high;
}
