import type { SearchableShape, ShapeIndexRow } from './shape-index';
import { foldedName, shapeAliases } from './shape-names';

const piece = /[a-z]+|\d+(?:\.\d+)?/g;
const piecesOf = (folded: string) => folded.match(piece) ?? [];
const wordsOf = (text: string) => text.trim().split(/\s+/).map(foldedName).flatMap(piecesOf);

/** Makes one row ready for searching; do it once, not at every keystroke. */
export const searchableShape = (row: ShapeIndexRow): SearchableShape => {
	const [, designation, family, standard] = row;
	const pieces = piecesOf(foldedName(designation));
	return {
		row,
		names: [designation, ...shapeAliases(designation)].map(foldedName),
		words: [...new Set([designation, family, standard].flatMap(wordsOf))],
		numbers: pieces.map(Number).filter((number) => !Number.isNaN(number)),
		letters: pieces.filter((one) => Number.isNaN(Number(one))).join('')
	};
};

const inNumber = (text: string, at: number) => /[\d.]/.test(text[at] ?? '');

/** 0 the name itself, 1 begins with it up to the end of a number, 2 begins with it; null otherwise. */
const prefixRank = (name: string, query: string): number | null => {
	if (name === query) return 0;
	if (!name.startsWith(query)) return null;
	return inNumber(query, query.length - 1) && inNumber(name, query.length) ? 2 : 1;
};

/** 3 when the query stands inside the name at the beginning of a word or number. */
const insideRank = (name: string, query: string): number | null => {
	const at = name.indexOf(query);
	if (at <= 0) return null;
	const before = name[at - 1] ?? '';
	const sameKind = /\d/.test(query[0] ?? '') ? /[\d.]/.test(before) : /[a-wyz]/.test(before);
	return sameKind ? null : 3;
};

/** 4 when every word of the query begins a word of the shape's own. */
const wordRank = (words: readonly string[], asked: readonly string[]): number | null =>
	asked.length > 0 && asked.every((one) => words.some((word) => word.startsWith(one))) ? 4 : null;

/**
 * How well a shape answers a query, 0 best, null not at all.
 * `query` folded, `asked` its words.
 */
const matchRank = (shape: SearchableShape, query: string, asked: readonly string[]) => {
	const ranks = shape.names
		.flatMap((name) => [prefixRank(name, query), insideRank(name, query)])
		.filter((rank) => rank !== null);
	return ranks.length > 0 ? Math.min(...ranks) : wordRank(shape.words, asked);
};

/** Order of people who read section tables: by letters, then number by number. */
export const naturalOrder = (a: SearchableShape, b: SearchableShape): number => {
	if (a.letters !== b.letters) return a.letters < b.letters ? -1 : 1;
	for (let i = 0; i < Math.max(a.numbers.length, b.numbers.length); i++) {
		const difference = (a.numbers[i] ?? -1) - (b.numbers[i] ?? -1);
		if (difference !== 0) return difference;
	}
	return a.row[1] < b.row[1] ? -1 : 1;
};

/**
 * Shapes that answer what was typed so far, best first: "ipe 3", "w14x", "ub 457", "hea300",
 * "457x191x67". Nothing typed answers with nothing.
 */
export const searchShapes = (
	shapes: readonly SearchableShape[],
	query: string,
	most = 20
): ShapeIndexRow[] => {
	const folded = foldedName(query);
	if (!folded) return [];
	const asked = wordsOf(query);
	return shapes
		.map((shape) => ({ shape, rank: matchRank(shape, folded, asked) }))
		.filter((found): found is { shape: SearchableShape; rank: number } => found.rank !== null)
		.sort((a, b) => a.rank - b.rank || naturalOrder(a.shape, b.shape))
		.slice(0, most)
		.map(({ shape }) => shape.row);
};
