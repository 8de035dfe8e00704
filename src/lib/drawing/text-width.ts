/** Measures a text in px; the browser's own measure is passed in where there is one. */
export type TextMeasure = (text: string, size: number) => number;

const narrow = new Set(".,:;|!ilI1 '()[]/·");
const wide = new Set('mwMW%‰—');

/** Width by letter kind, on the generous side; used on the server and in tests. */
export const roughTextWidth: TextMeasure = (text, size) =>
	[...text].reduce((sum, letter) => sum + letterShare(letter), 0) * size;

function letterShare(letter: string): number {
	if (narrow.has(letter)) return 0.34;
	return wide.has(letter) ? 0.9 : 0.6;
}
