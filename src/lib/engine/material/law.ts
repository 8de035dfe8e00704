/**
 * Piecewise-linear stress–strain law, tension positive.
 * Between kinks (ascending strains) stress = offset + slope × strain; there is one more
 * segment than there are kinks. Continuous unless a curve ends with `beyond: "zero"`.
 */
export interface StressStrainLaw {
	readonly kinks: readonly number[];
	/** N/mm², one per segment. */
	readonly offsets: readonly number[];
	/** N/mm², one per segment. */
	readonly slopes: readonly number[];
	/** Strain at which the law leaves its first line in tension (> 0) and in compression (> 0). */
	readonly yieldTension: number;
	readonly yieldCompression: number;
}
