/** Every step of an analysis, and all catalogue shapes analysed once. */
import { analyse } from '../../src/lib/engine/rules/analyse';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import { catalogueShapes } from '../../src/lib/server/catalogues/shapes';
import { ms, printTable, timed } from './table';

const girder: SectionDefinition = {
	kind: 'i',
	h: 940,
	b: 400,
	tw: 14,
	tf: 20,
	weldLeg: 8,
	fabrication: 'welded',
	grade: 'S355'
};
const rolled: SectionDefinition = {
	kind: 'i',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	fabrication: 'rolled',
	grade: 'S355'
};

function prepared(definition: SectionDefinition) {
	const result = prepareSection(definition);
	if (!result.ok) throw new Error(result.error.map(({ message }) => message).join(' '));
	return result.value;
}

const rows = Object.entries({ 'welded girder': girder, 'IPE 300': rolled }).map(
	([name, definition]) => {
		const section = prepared(definition);
		const demands = [{ name: 'A', My: 100, N: -50, Vz: 40 }];
		return [
			name,
			ms(timed(() => prepared(definition), { batch: 50 }).median),
			ms(timed(() => analyse(section), { batch: 50 }).median),
			ms(timed(() => analyse(section, { demands }), { batch: 50 }).median)
		];
	}
);
printTable('Analyse (median)', ['section', 'prepare', 'analyse', 'analyse under N, M, V'], rows);

const definitions = catalogueShapes().flatMap(({ shapes }) =>
	shapes.map((shape) => shape.definition)
);
const start = performance.now();
for (const definition of definitions) analyse(prepared(definition));
const spent = performance.now() - start;
printTable(
	'All catalogue shapes, prepared and analysed once',
	['shapes', 'time', 'each'],
	[[String(definitions.length), ms(spent), ms(spent / definitions.length)]]
);
