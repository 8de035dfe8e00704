const steps = [1.25, 2.5, 5, 12, 25, 50, 120, 250, 500];

/** Smallest stock span, in multiples of the yield strain, that holds `ratio` with a little room. */
export const strainSpan = (ratio: number): number =>
	steps.find((step) => Math.abs(ratio) <= step * 0.98) ?? Math.abs(ratio) * 1.1;
