import { readFileSync } from 'node:fs';
import Papa from 'papaparse';
import { prepareSection } from '../../../engine/section/prepare';
import type { PreparedSection } from '../../../engine/section/prepared';
import type { SourceRow } from '../../catalogues/row';
import { proofCheck, type ProofCheck, type ProofSource } from '../check';
import { publishedFile } from '../root';
import type { Column } from './columns';
import type { PublishedTable } from './list';

/** Rows of a published table. Throws when a file of the release is damaged. */
export function tableRows({ file }: PublishedTable): SourceRow[] {
	const text = readFileSync(publishedFile(`tables/${file}`), 'utf8');
	const { data, errors } = Papa.parse<SourceRow>(text, { header: true, skipEmptyLines: true });
	const [first] = errors;
	if (first) throw new Error(`${file}: ${first.message}`);
	return data;
}

/** Half a unit of the last digit printed. */
export function halfLastDigit(printed: string): number {
	const decimals = printed.split('.')[1]?.length ?? 0;
	return 0.5 * 10 ** -decimals;
}

/** Every printed value of one row against that of the section drawn from its dimensions. */
export function rowChecks(table: PublishedTable, row: SourceRow): ProofCheck[] {
	const section = sectionOf(table, row);
	const source = rowSource(table, row);
	return Object.entries(table.columns).flatMap(([name, column]) => {
		const printed = row[name]?.trim() ?? '';
		return printed === ''
			? []
			: [valueCheck({ table, source, section, row }, name, column, printed)];
	});
}

interface Row {
	readonly table: PublishedTable;
	readonly source: ProofSource;
	readonly section: PreparedSection;
	readonly row: SourceRow;
}

function valueCheck(
	{ table, source, section, row }: Row,
	quantity: string,
	column: Column,
	printed: string
): ProofCheck {
	const halfDigit = column.lastDigit === undefined ? halfLastDigit(printed) : column.lastDigit / 2;
	const { tolerance: value, why } = table;
	const { remark } = column;
	return proofCheck(source, {
		id: `${table.file.replace(/^check_|\.csv$/g, '')}/${row.designation}/${quantity}`,
		case: row.designation ?? '',
		quantity,
		unit: column.unit,
		published: Number(printed),
		printed,
		ours: column.ours(section),
		tolerance: { kind: 'relative-or-half-digit', value, halfDigit, why },
		...(remark === undefined ? {} : { remark })
	});
}

function sectionOf(table: PublishedTable, row: SourceRow): PreparedSection {
	const result = prepareSection(table.definition(row));
	if (result.ok) return result.value;
	throw new Error(`${row.designation}: ${result.error.map(({ message }) => message).join(' ')}`);
}

/** The row's own source; it says itself what was from memory, and what agreed with it. */
function rowSource({ title, standard }: PublishedTable, row: SourceRow): ProofSource {
	const source = row.prop_sources ?? '';
	const fromMemory = /from memory/i.test(source);
	return {
		family: 'catalogue',
		source: `${title}. ${source}`,
		standard,
		clause: null,
		fromMemory,
		memoryConfidence: null
	};
}
