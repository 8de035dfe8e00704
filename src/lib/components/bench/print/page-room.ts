import type { Analysis } from '$lib/engine/rules/analysis';

type Counted = Pick<Analysis, 'notes' | 'classification' | 'resistance'>;

/** Room of a Letter page (the lower of the two in use) for drawing, tables and notes, px as laid out. */
const page = 685;
const row = 15;
const least = 260;
const most = 470;

/** Height of the drawing that fills a page with what stands under it, px; never too small to read. */
export function drawingHeight(
	{ notes, classification, resistance }: Counted,
	demands: number
): number {
	const values = 23 + 2;
	const resistances = resistance ? 8 : 0;
	const left = 6 + (classification?.elements.length ?? 0) + demands + 8 + resistances;
	const checks = resistance?.checks.length ?? 0;
	const tables = Math.max(values, (values + left + checks + 2) / 2) * row;
	const text = notes.reduce((sum, { message }) => sum + 13 * Math.ceil(message.length / 80), 0) / 2;
	return Math.round(Math.max(least, Math.min(most, page - tables - text)));
}
