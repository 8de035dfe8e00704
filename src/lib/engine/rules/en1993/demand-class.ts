import type { CaseName } from '../../explain/keys';
import { sectionSymmetry } from '../../section/symmetry';
import type { Classification, Demand } from '../result';
import { classifySection, type ClassifiedCase } from './classify';
import { judgingOf, type EnModel, type PureCases } from './model';
import { stressCase, uniformTension, type Effects } from './stress-case';

/** A demand's class and the case that it was found for. */
export interface DemandClass {
	readonly classified: ClassifiedCase;
	readonly basis: Classification['basis'];
	/** The pure case that it is, or the demand: under that name its limits are explained. */
	readonly caseName: CaseName;
}

export const effectsOf = ({ N = 0, My = 0, Mz = 0 }: Demand): Effects => ({ N, My, Mz });

/** Class under the demand's own N, My, Mz: a pure case where it is one, else the true block. */
export function classifyDemand(
	model: EnModel,
	cases: PureCases,
	effects: Effects,
	demand: CaseName
): DemandClass {
	const { N, My, Mz } = effects;
	const pure = (caseName: keyof PureCases, basis: Classification['basis']): DemandClass => ({
		classified: cases[caseName],
		basis,
		caseName
	});
	if (N === 0 && Mz === 0) return My < 0 ? pure('minusMy', '−My') : pure('plusMy', '+My');
	if (N < 0 && My === 0 && Mz === 0) return pure('compression', 'N');
	if (N === 0 && My === 0) return pure(Mz > 0 ? 'plusMz' : 'minusMz', 'demand');
	const stress = My === 0 && Mz === 0 ? uniformTension : stressCase(sourceOf(model), effects);
	const judging = judgingOf(model, demand);
	const classified = classifySection(model.elements, stress, effects, judging);
	return { classified, basis: 'demand', caseName: demand };
}

function sourceOf({ mechanics, section, strengths, code }: EnModel) {
	const { gammaM0, classAlpha } = code;
	const { hybrid } = strengths;
	const symmetry = sectionSymmetry(section);
	return { mechanics, gross: section.gross, gammaM0, classAlpha, hybrid, symmetry };
}
