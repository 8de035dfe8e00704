import type { CaseName } from '../../explain/keys';
import type { Workings } from '../../explain/working';
import type { Mechanics } from '../../response/law-groups';
import type { PreparedSection } from '../../section/prepared';
import type { CodeChoice, SectionClass, Stiffeners } from '../result';
import type { AxisSense, SectionMoments } from '../section-moments';
import { classifySection, type ClassifiedCase, type Judging } from './classify';
import type { SectionElements } from './elements/element';
import type { Strengths } from './strengths';
import { elasticStress, compressedSide, uniformCompression, type Effects } from './stress-case';

/** A section with all that the rules of EN 1993-1-1 take from it, found once. */
export interface EnModel {
	readonly section: PreparedSection;
	readonly mechanics: Mechanics;
	readonly moments: SectionMoments;
	readonly strengths: Strengths;
	readonly elements: SectionElements;
	readonly code: CodeChoice;
	/** Transverse stiffeners of the web; null for none between supports. */
	readonly stiffeners: Stiffeners | null;
	/** Collects how the figures come about; null where nobody asks. */
	readonly workings: Workings | null;
}

export type PureCases = Readonly<Record<AxisSense | 'compression', ClassifiedCase>>;

const unit: Readonly<Record<AxisSense, Effects>> = {
	plusMy: { N: 0, My: 1, Mz: 0 },
	minusMy: { N: 0, My: -1, Mz: 0 },
	plusMz: { N: 0, My: 0, Mz: 1 },
	minusMz: { N: 0, My: 0, Mz: -1 }
};

/** Pure bending in four senses and pure compression. */
export function pureCases(model: EnModel): PureCases {
	const bent = (sense: AxisSense) => pureBending(model, sense);
	const squashed = { N: -1, My: 0, Mz: 0 };
	const judging = judgingOf(model, 'compression');
	return {
		plusMy: bent('plusMy'),
		minusMy: bent('minusMy'),
		plusMz: bent('plusMz'),
		minusMz: bent('minusMz'),
		compression: classifySection(model.elements, uniformCompression, squashed, judging)
	};
}

/** Under which code and name a model's case is judged. */
export const judgingOf = ({ code, strengths, workings }: EnModel, caseName: CaseName): Judging => ({
	standard: code.standard,
	modulus: strengths.modulus,
	caseName,
	workings
});

function pureBending(model: EnModel, sense: AxisSense): ClassifiedCase {
	const { elements, section, moments } = model;
	const { axisAngle, plastic } = moments[sense];
	const effects = unit[sense];
	const elastic = elasticStress(section.gross, 0, effects, 1);
	const block = compressedSide(section.gross, axisAngle, plastic) ?? elastic;
	return classifySection(elements, { plastic: block, elastic }, effects, judgingOf(model, sense));
}

export type PureClasses = Readonly<Record<AxisSense | 'compression', SectionClass>>;

export const pureClasses = (cases: PureCases): PureClasses => ({
	plusMy: cases.plusMy.overall,
	minusMy: cases.minusMy.overall,
	plusMz: cases.plusMz.overall,
	minusMz: cases.minusMz.overall,
	compression: cases.compression.overall
});
