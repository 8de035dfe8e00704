import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import Papa from 'papaparse';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import type { PreparedSection } from '$lib/engine/section/prepared';

export type PublishedRow = Readonly<Record<string, string>>;

/** Our value of a published column, in the table's own units. */
export type Column = (section: PreparedSection, row: PublishedRow) => number | null;

export interface PublishedTable {
	/** File below `tables/`; its `prop_sources` column names the source of every row. */
	readonly file: string;
	readonly definition: (row: PublishedRow) => SectionDefinition;
	readonly columns: Readonly<Record<string, Column>>;
	/** Relative tolerance; half the last printed digit is always allowed. */
	readonly tolerance: number;
	/** Value of the last printed digit of columns that were printed in another unit than the file's. */
	readonly lastDigit?: Readonly<Record<string, number>>;
}

export const rowsOf = (file: string): PublishedRow[] =>
	Papa.parse<PublishedRow>(readFileSync(resolve('tests/published/tables', file), 'utf8'), {
		header: true,
		skipEmptyLines: true
	}).data;

/** Half a unit of the last digit printed. */
export function halfLastDigit(printed: string): number {
	const decimals = printed.split('.')[1]?.length ?? 0;
	return 0.5 * 10 ** -decimals;
}

/** Sections of a table's rows, each prepared once. */
export function sectionOf(table: PublishedTable, row: PublishedRow): PreparedSection {
	const result = prepareSection(table.definition(row));
	if (result.ok) return result.value;
	throw new Error(`${row.designation}: ${result.error.map(({ message }) => message).join(' ')}`);
}

/** How many printed values a table has, and those that ours do not meet. */
export function comparison(table: PublishedTable) {
	const faults: string[] = [];
	let compared = 0;
	for (const row of rowsOf(table.file)) {
		const section = sectionOf(table, row);
		for (const [name, column] of Object.entries(table.columns)) {
			const printed = row[name]?.trim() ?? '';
			const ours = printed === '' ? null : column(section, row);
			if (ours === null) continue;
			compared += 1;
			if (Math.abs(ours - Number(printed)) > allowance(table, name, printed))
				faults.push(`${row.designation} ${name}: printed ${printed}, ours ${ours.toPrecision(5)}`);
		}
	}
	return { compared, faults };
}

function allowance(table: PublishedTable, column: string, printed: string): number {
	const lastDigit = table.lastDigit?.[column];
	const half = lastDigit === undefined ? halfLastDigit(printed) : lastDigit / 2;
	return Math.max(table.tolerance * Math.abs(Number(printed)), half);
}
