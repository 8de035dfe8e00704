import { bendingForms } from './closed-forms/bending';
import { closedFormCheck, type ClosedForm } from './closed-forms/closed-form';
import { interactionForms } from './closed-forms/interaction';
import { lawForms } from './closed-forms/laws';
import { shapeFactors } from './closed-forms/shape-factors';
import { torsionForms } from './closed-forms/torsion';
import { unloadingForms } from './closed-forms/unloading';
import { proofCheck, type ProofCheck, type ProofSource, type ProofValue } from './check';
import { exampleChecks } from './examples/example-checks';
import { lateralTorsionalSource, lateralTorsionalValues } from './examples/lateral-torsional';
import { exampleWorks } from './examples/list';
import {
	classColumns,
	classValues,
	shearAreaColumn,
	shearAreaValues
} from './examples/producer-tables';
import { workedExamples } from './examples/worked-example';
import { publishedTables, type PublishedTable } from './tables/list';
import { rowChecks, tableRows } from './tables/table-checks';

export const closedForms: readonly ClosedForm[] = [
	...shapeFactors,
	...bendingForms,
	...interactionForms,
	...unloadingForms,
	...lawForms,
	...torsionForms
];

/** The checks of one table, a row at a time. */
export function* tableChecks(table: PublishedTable): Generator<ProofCheck[]> {
	for (const row of tableRows(table)) yield rowChecks(table, row);
}

/** Examples of the data file, then values printed elsewhere, one example at a time. */
export function* workedChecks(): Generator<ProofCheck[]> {
	for (const example of workedExamples()) {
		const work = exampleWorks[example.id];
		if (work) yield exampleChecks(example, work);
	}
	yield checksOf(classColumns, classValues());
	yield checksOf(shearAreaColumn, shearAreaValues());
	yield checksOf(lateralTorsionalSource, lateralTorsionalValues());
}

const checksOf = (source: ProofSource, values: readonly ProofValue[]) =>
	values.map((value) => proofCheck(source, value));

export function* closedFormChecks(): Generator<ProofCheck[]> {
	for (const form of closedForms) yield [closedFormCheck(form)];
}

/** Everything that the engine is held against, in the order of the page, a few values at a time. */
export function* allChecks(): Generator<ProofCheck[]> {
	for (const table of publishedTables) yield* tableChecks(table);
	yield* workedChecks();
	yield* closedFormChecks();
}
