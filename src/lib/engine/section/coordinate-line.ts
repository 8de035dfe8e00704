/** Numbers as written: sign, digits with a point or comma, exponent. */
const plain = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)(e[+-]?\d+)?$/i;

/**
 * The two numbers of a line, or null when it is not exactly two. Spaces, tabs or a semicolon part
 * them and leave the comma to be decimal; a line with one comma and nothing else to part it is
 * parted there, and so is one whose commas are followed by numbers with a decimal point.
 */
export function pointIn(content: string): [number, number] | null {
	const fields = fieldsOf(content.replaceAll('\u2212', '-'));
	if (fields.length !== 2) return null;
	const [y, z] = fields.map(numberIn);
	return y === undefined || z === undefined || y === null || z === null ? null : [y, z];
}

function fieldsOf(line: string): string[] {
	if (line.includes(';')) return trimmed(line.split(';'));
	// "1,5 2,5" is two decimal commas; "1, 2" and "1 ,2" are parted by the comma
	const bySpace = line.split(/\s+/);
	if (bySpace.length > 1 && bySpace.every((field) => plain.test(field))) return bySpace;
	return trimmed(line.split(','));
}

/** Fields without the blanks round them; one empty field at the end, as spreadsheets leave it, is dropped. */
function trimmed(fields: readonly string[]): string[] {
	const list = fields.map((field) => field.trim());
	return list.length > 2 && list.at(-1) === '' ? list.slice(0, -1) : list;
}

function numberIn(field: string): number | null {
	if (!plain.test(field)) return null;
	const value = Number(field.replace(',', '.'));
	return Number.isFinite(value) ? value : null;
}
