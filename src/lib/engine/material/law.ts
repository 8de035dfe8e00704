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
	/**
	 * Strain at which the law leaves its first line in tension (> 0) and in compression (> 0); of a
	 * rounded law f0.2/E, where the elastic check has yield.
	 */
	readonly yieldTension: number;
	readonly yieldCompression: number;
	/** Where the law ends, if it does: no state is given with a fibre beyond. */
	readonly limit?: StrainLimit;
}

/** Greatest strains that a law is followed to, positive in both senses, and why. */
export interface StrainLimit {
	readonly tension: number;
	readonly compression: number;
	readonly reason: string;
}
