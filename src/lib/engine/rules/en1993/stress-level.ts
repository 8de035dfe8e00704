import type { Point } from '../../geometry/boundary';
import type { Note } from '../../result';
import type { ClassifiedElement } from '../result';
import type { ClassifiedCase } from './classify';
import { classifyAngle, classifyPlate, classifyTube, type JudgedElement } from './classify-element';
import { clauseOf } from './edition';
import type { PlateElement } from './elements/element';
import type { EnModel } from './model';
import { elasticStress, type Effects, type StressCase } from './stress-case';

/**
 * A class 4 section as class 3 under one demand, EN 1993-1-1:2005 5.5.2(9): every part must meet
 * class 3 with ε times √((fy/γM0)/σcom,Ed). Null where the choice is off, the section is not class 4
 * or a part does not meet it. σcom,Ed is the greatest compression of the part, its faces included,
 * on the gross section; that is consistent, since where the rule holds nothing is taken away. ψ is
 * that of the same stress. Not for member buckling (5.5.2(10)): keep class 4 there.
 */
export function stressLevelClass(
	model: EnModel,
	classified: ClassifiedCase,
	effects: Effects
): ClassifiedCase | null {
	if (!model.code.useStressLevel || classified.overall !== 4) return null;
	const stress = elasticStress(model.section.gross, effects.N, effects, 1);
	const rows = worstRows(raisedRows(model, stress, effects));
	if (rows === null) return null;
	const first = rows.reduce((a, b) => (isWorse(b, a) ? b : a));
	const elements = rows.map((row) => (row === first ? { ...row, class: 3 as const } : row));
	return { overall: 3, elements, governing: first.part };
}

/** That class 4 was taken as class 3 for its low stress. */
export const stressLevelNote = ({ code }: EnModel): Note => ({
	code: 'stress-level-used',
	message:
		'The class 4 section is taken as class 3 for a demand whose compression stays low enough: ε is raised by √((fy/γM0)/σcom,Ed). That holds for the section, not for member buckling.',
	clause: clauseOf(code.standard, 'stressLevel')
});

/** Every compressed part with its raised class 3 limit. */
function raisedRows(
	{ elements, code }: EnModel,
	elastic: StressCase['elastic'],
	{ N }: Effects
): ClassifiedElement[] {
	const { standard, gammaM0 } = code;
	const raised = ({ row, fy }: JudgedElement, most: number) => raise(row, fy / gammaM0, most);
	const stress: StressCase = { plastic: elastic, elastic };
	switch (elements.kind) {
		case 'solid':
			return [];
		case 'tube': {
			const { centre, c } = elements.tube;
			const judged = classifyTube(standard, elements.tube, 'combined', elastic);
			return [raised(judged, greatestAround(centre, c / 2, elastic))];
		}
		case 'plates': {
			const scale = greatestSize(elements.plates, elastic);
			const rows = elements.plates.map((plate) =>
				raised(
					classifyPlate(standard, plate, stress, { plastic: scale, elastic: scale }),
					greatestCompression(plate, elastic)
				)
			);
			const most = Math.max(...elements.plates.map((each) => greatestCompression(each, elastic)));
			if (elements.angle && N < 0) rows.push(raised(classifyAngle(standard, elements.angle), most));
			return rows;
		}
	}
}

/**
 * Class 3 where the raised limit is met (1 or 2 where its own ε gives that), else 4; tubes go by ε
 * squared. A part in tension has no limits.
 */
function raise(row: ClassifiedElement, fyd: number, most: number): ClassifiedElement {
	const last = row.limits[2];
	if (last === undefined || most <= 0) return { ...row, limits: [], class: 1 };
	const factor = Math.sqrt(fyd / most);
	const onLimits = row.type === 'tubular' ? fyd / most : factor;
	const limits = [...row.limits.slice(0, 2), last * onLimits];
	const within = row.slenderness <= last * onLimits;
	const own = row.class <= 2 ? row.class : 3;
	return { ...row, epsilon: row.epsilon * factor, limits, class: within ? own : 4 };
}

/** One row for each part and kind of support, or null where any part is beyond class 3. */
function worstRows(rows: readonly ClassifiedElement[]): ClassifiedElement[] | null {
	if (rows.length === 0 || rows.some((row) => row.class === 4)) return null;
	const kept: ClassifiedElement[] = [];
	for (const row of rows) {
		const at = kept.findIndex(({ part, type }) => part === row.part && type === row.type);
		if (at < 0) kept.push(row);
		else if (isWorse(row, kept[at]!)) kept[at] = row;
	}
	return kept;
}

const isWorse = (a: ClassifiedElement, b: ClassifiedElement): boolean =>
	a.class === b.class ? use(a) > use(b) : a.class > b.class;

const use = ({ slenderness, limits }: ClassifiedElement) =>
	limits[2] === undefined ? 0 : slenderness / limits[2];

function greatestSize(plates: readonly PlateElement[], value: StressCase['elastic']): number {
	return Math.max(...plates.flatMap(({ from, to }) => [from, to].map((at) => Math.abs(value(at)))));
}

/** Greatest compression on the faces of a part, half its thickness off its ends. */
function greatestCompression({ from, to, t, c }: PlateElement, value: StressCase['elastic']) {
	const [dy, dz] = c === 0 ? [0, 0] : [(to.y - from.y) / c, (to.z - from.z) / c];
	const faces = ({ y, z }: Point, side: number): number =>
		value({ y: y - (side * dz * t) / 2, z: z + (side * dy * t) / 2 });
	return Math.max(faces(from, 1), faces(from, -1), faces(to, 1), faces(to, -1));
}

function greatestAround(centre: Point, r: number, value: StressCase['elastic']): number {
	const middle = value(centre);
	const { y, z } = centre;
	return middle + Math.hypot(value({ y: y + r, z }) - middle, value({ y, z: z + r }) - middle);
}
