import type { Workings } from '../../explain/working';
import type { CaseName } from '../../explain/keys';
import type { ClassifiedElement, SectionClass, Standard } from '../result';
import {
	classifyAngle,
	classifyPlate,
	classifyTube,
	type JudgedElement,
	type StressScale
} from './classify-element';
import { addLimitWorkings } from './limit-workings';
import type { PlateElement, SectionElements } from './elements/element';
import type { Effects, StressCase } from './stress-case';

/** A section classified under one stress case. */
export interface ClassifiedCase {
	readonly overall: SectionClass;
	/** Empty for a solid bar. */
	readonly elements: ClassifiedElement[];
	readonly governing: string;
	/** Nothing beyond first yield counts, whatever the class was: it then stands as 3. */
	readonly firstYieldOnly?: boolean;
}

/** Whose limits, and under which name their workings are kept. */
export interface Judging {
	readonly standard: Standard;
	/** Least modulus of the parts, N/mm². */
	readonly modulus: number;
	readonly caseName: CaseName;
	readonly workings: Workings | null;
}

/**
 * Class of the section: that of its worst compressed part (5.5.2(6)). One row for each part and
 * kind of support, the worse of equal pairs. A class 3 section must hold its elastic stress: a
 * part that the plastic block alone had let through is then held to its class 3 limit.
 */
export function classifySection(
	elements: SectionElements,
	stress: StressCase,
	effects: Effects,
	judging: Judging
): ClassifiedCase {
	if (elements.kind === 'solid') return { overall: 1, elements: [], governing: elements.part };
	const judged =
		elements.kind === 'tube'
			? [classifyTube(judging.standard, elements.tube, tubeStress(effects), stress.elastic)]
			: judgedPlates(elements, stress, effects, judging.standard);
	const held = worstClass(judged) === 3 ? judged.map(heldElastically) : judged;
	const worst = worstRows(held);
	if (judging.workings) addLimitWorkings(judging, judging.workings, worst);
	const rows = worst.map(({ row }) => row);
	const first = rows.reduce((a, b) => (isWorse(b, a) ? b : a));
	return { overall: first.class, elements: rows, governing: first.part };
}

function judgedPlates(
	{ plates, angle }: Extract<SectionElements, { kind: 'plates' }>,
	stress: StressCase,
	{ N }: Effects,
	standard: Standard
): JudgedElement[] {
	const scale: StressScale = {
		plastic: greatestSize(plates, stress.plastic),
		elastic: greatestSize(plates, stress.elastic)
	};
	const judged = plates.map((plate) => classifyPlate(standard, plate, stress, scale));
	if (angle !== null && N < 0) judged.push(classifyAngle(standard, angle));
	return judged;
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

const worstClass = (judged: readonly JudgedElement[]) =>
	Math.max(...judged.map(({ row }) => row.class));

function heldElastically(judged: JudgedElement): JudgedElement {
	if (judged.held) judged = { ...judged, row: judged.held() };
	const { row } = judged;
	const last = row.limits[2];
	if (last === undefined || row.slenderness <= last) return judged;
	return { ...judged, row: { ...row, class: 4 } };
}

function worstRows(judged: readonly JudgedElement[]): JudgedElement[] {
	const kept: JudgedElement[] = [];
	for (const each of judged) {
		const { part, type } = each.row;
		const at = kept.findIndex(({ row }) => row.part === part && row.type === type);
		if (at < 0) kept.push(each);
		else if (isWorse(each.row, kept[at]!.row)) kept[at] = each;
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
