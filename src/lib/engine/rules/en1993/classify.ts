import type { ClassifiedElement, SectionClass } from '../result';
import { classifyPlate, classifyTube, type StressScale } from './classify-element';
import type { PlateElement, SectionElements } from './plate-elements';
import type { Effects, StressCase } from './stress-case';

/** A section classified under one stress case. */
export interface ClassifiedCase {
	readonly overall: SectionClass;
	readonly elements: ClassifiedElement[];
	readonly governing: string;
}

/**
 * Class of the section: that of its worst compressed part (5.5.2(6)). One row for each part and
 * kind of support, the worse of equal pairs. A class 3 section must hold its elastic stress: a
 * part that the plastic block alone had let through is then held to its class 3 limit.
 */
export function classifySection(
	elements: SectionElements,
	stress: StressCase,
	effects: Effects
): ClassifiedCase {
	const rows =
		elements.kind === 'tube'
			? [classifyTube(elements.tube, tubeStress(effects))]
			: classifyPlates(elements.plates, stress);
	const held = worstClass(rows) === 3 ? rows.map(heldElastically) : rows;
	const worst = worstRows(held);
	const first = worst.reduce((a, b) => (isWorse(b, a) ? b : a));
	return { overall: first.class, elements: worst, governing: first.part };
}

function classifyPlates(plates: readonly PlateElement[], stress: StressCase) {
	const scale: StressScale = {
		plastic: greatestSize(plates, stress.plastic),
		elastic: greatestSize(plates, stress.elastic)
	};
	return plates.map((plate) => classifyPlate(plate, stress, scale));
}

function greatestSize(plates: readonly PlateElement[], value: StressCase['plastic']): number {
	let greatest = 0;
	for (const { from, to } of plates)
		greatest = Math.max(greatest, Math.abs(value(from)), Math.abs(value(to)));
	return greatest;
}

function tubeStress({ N, My, Mz }: Effects) {
	const bent = My !== 0 || Mz !== 0;
	if (!bent) return N < 0 ? 'compression' : 'tension';
	return N === 0 ? 'bending' : 'combined';
}

const worstClass = (rows: readonly ClassifiedElement[]) =>
	Math.max(...rows.map((row) => row.class));

function heldElastically(row: ClassifiedElement): ClassifiedElement {
	const last = row.limits[2];
	return last !== undefined && row.slenderness > last ? { ...row, class: 4 } : row;
}

function worstRows(rows: readonly ClassifiedElement[]): ClassifiedElement[] {
	const kept: ClassifiedElement[] = [];
	for (const row of rows) {
		const at = kept.findIndex(({ part, type }) => part === row.part && type === row.type);
		if (at < 0) kept.push(row);
		else if (isWorse(row, kept[at]!)) kept[at] = row;
	}
	return kept;
}

function isWorse(a: ClassifiedElement, b: ClassifiedElement): boolean {
	return a.class === b.class ? use(a) > use(b) * (1 + 1e-12) : a.class > b.class;
}

/** Slenderness over the limit of its own class. */
function use({ slenderness, limits, class: own }: ClassifiedElement): number {
	const limit = limits[Math.min(own, 3) - 1];
	return limit === undefined ? 0 : slenderness / limit;
}
