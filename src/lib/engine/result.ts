/** An expected failure or a value; bugs throw, bad input does not. */
export type Result<T, E> = { ok: true; value: T } | { ok: false; error: E };

export const ok = <T>(value: T): Result<T, never> => ({ ok: true, value });
export const fail = <E>(error: E): Result<never, E> => ({ ok: false, error });

/** One thing wrong with an input; `path` is dotted from the section (`tw`, `plates.2.width`). */
export interface Issue {
	path: string;
	message: string;
	/** A change that has been tried and solves it. */
	mend?: Mend;
	/** Where it is, mm from the definition's origin. */
	at?: { y: number; z: number };
}

/** A mend of plates: each plate named goes to a new centre, mm from the definition's origin. */
export interface Mend {
	words: string;
	/** Path of the plate that moves, or the first of those that move together. */
	path: string;
	changes: readonly { plate: string; y: number; z: number }[];
}

/** Why a figure is absent or must be read with care. */
export interface Note {
	code: string;
	message: string;
	clause?: string;
}
