import { setImmediate as nextTurn } from 'node:timers/promises';
import Papa from 'papaparse';
import type { ProofQuery } from '../../api/proof';
import type { ProofCheck } from './check';
import { proof } from './proof';
import { checksAsked } from './proof-list';

const fields = [
	'family',
	'standard',
	'clause',
	'source',
	'fromMemory',
	'memoryConfidence',
	'case',
	'quantity',
	'unit',
	'printed',
	'published',
	'ours',
	'difference',
	'relativeDifference',
	'allowed',
	'why',
	'pass',
	'remark',
	'id'
] as const satisfies readonly (keyof ProofCheck)[];

/** Rows written before other requests have their turn. */
const atOnce = 300;

/** Lines of a CSV file; a text that a spreadsheet would take for a formula gets an apostrophe. */
export const csvLines = (checks: readonly ProofCheck[]): string =>
	Papa.unparse(
		checks.map((check) => fields.map((field) => check[field])),
		{ escapeFormulae: true, newline: '\r\n' }
	) + '\r\n';

/** All checks asked for as CSV, every page of them. */
export async function proofCsv(asked: ProofQuery): Promise<string> {
	const checks = checksAsked(await proof(), asked);
	let text = `${fields.join(',')}\r\n`;
	for (let from = 0; from < checks.length; from += atOnce) {
		text += csvLines(checks.slice(from, from + atOnce));
		await nextTurn();
	}
	return text;
}
