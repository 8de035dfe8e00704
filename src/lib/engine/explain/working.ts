/** A number put into a formula. */
export interface WorkingInput {
	/** As it stands in the formula: `A`, `γM0`, `hw`. */
	readonly symbol: string;
	readonly value: number;
	/** `mm`, `mm²`, `N/mm²`, `kN`, `kNm`, `` for a plain number … */
	readonly unit: string;
	/** Where the number comes from, in words or as the key of another working. */
	readonly from?: string;
}

/** How one figure came about, as plain data: the same for screen, print and PDF. */
export interface Working {
	readonly title: string;
	readonly clause: string;
	readonly edition: string;
	/** Readable mathematics on one line, in the grammar of `formula.ts`. */
	readonly formula: string;
	readonly inputs: readonly WorkingInput[];
	readonly result: { readonly value: number; readonly unit: string };
	/** Codes of notes that the figure must be read with (a rule from memory, a limit passed). */
	readonly notes?: readonly string[];
}

/** Workings by figure; the keys are made in `keys.ts`. */
export type Explanation = Readonly<Record<string, Working>>;

/**
 * Collects workings while the rules compute. Rules that are not asked to explain have none of it:
 * `workings?.add(key, () => working)` then costs nothing.
 */
export class Workings {
	readonly #kept: Record<string, Working> = {};

	/** Keeps the working of a figure; the last one under a key stands. */
	add(key: string, make: () => Working): void {
		this.#kept[key] = make();
	}

	get(key: string): Working | undefined {
		return this.#kept[key];
	}

	explanation(): Explanation {
		return this.#kept;
	}
}
