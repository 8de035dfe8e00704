/** One shape as the browser holds it: id, designation, family, standard, mass kg/m, h mm, b mm. */
export type ShapeIndexRow = readonly [
	id: string,
	designation: string,
	family: string,
	standard: string,
	mass: number,
	h: number,
	b: number
];

/** A row with its name, aliases and words made ready for searching. */
export interface SearchableShape {
	readonly row: ShapeIndexRow;
	/** Folded designation and aliases. */
	readonly names: readonly string[];
	/** Words and numbers of designation and family. */
	readonly words: readonly string[];
	/** Numbers of the designation in turn, for natural order. */
	readonly numbers: readonly number[];
	/** Letters of the designation, so that families stay together. */
	readonly letters: string;
}
