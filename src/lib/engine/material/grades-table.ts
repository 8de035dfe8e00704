/** Strengths up to and including a thickness; `upTo` null means at any thickness. mm, N/mm². */
export interface GradeBand {
	readonly upTo: number | null;
	readonly fy: number;
	readonly fu: number;
}

/** One table of nominal strengths by thickness and where it stands. */
export interface GradeTable {
	readonly source: string;
	readonly bands: readonly GradeBand[];
}

/** A named grade: its strengths under each basis (absent where that basis does not list it). */
export interface NamedGrade {
	readonly name: string;
	/** N/mm² */
	readonly E: number;
	readonly codeTable: GradeTable | null;
	readonly productStandard: GradeTable | null;
}

/** Bands from three rows of equal length: thickness limits, fy and fu. */
export function gradeTable(
	source: string,
	upTo: readonly (number | null)[],
	fy: readonly number[],
	fu: readonly number[]
): GradeTable {
	const bands = fy.map((strength, i) => ({
		upTo: upTo[i] ?? null,
		fy: strength,
		fu: fu[i] ?? Number.NaN
	}));
	return { source, bands };
}
