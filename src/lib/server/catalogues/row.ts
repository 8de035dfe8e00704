/** One line of a shipped catalogue file, as text, by column name. */
export type SourceRow = Readonly<Record<string, string>>;

/** Number in a column as it stands; a catalogue file without it is a bug of the release. */
export function numberIn(row: SourceRow, column: string): number {
	const text = row[column];
	const value = text === undefined || text.trim() === '' ? Number.NaN : Number(text);
	if (Number.isFinite(value)) return value;
	throw new Error(`Catalogue row ${row.designation ?? '?'}: no number in column ${column}.`);
}

/**
 * Inches in a column as mm. An inch is 25.4 mm exactly; the rounding (at a millionth of a mm) only
 * takes binary noise off.
 */
export const inchesIn = (row: SourceRow, column: string): number =>
	Math.round(numberIn(row, column) * 25.4e6) / 1e6;
