import type { Classification, Demand } from '../result';
import { classifySection, type ClassifiedCase } from './classify';
import type { EnModel, PureCases } from './model';
import { stressCase, uniformTension, type Effects } from './stress-case';

/** A demand's class and the case that it was found for. */
export interface DemandClass {
	readonly classified: ClassifiedCase;
	readonly basis: Classification['basis'];
}

export const effectsOf = ({ N = 0, My = 0, Mz = 0 }: Demand): Effects => ({ N, My, Mz });

/** Class under the demand's own N, My, Mz: a pure case where it is one, else the true block. */
export function classifyDemand(model: EnModel, cases: PureCases, effects: Effects): DemandClass {
	const { N, My, Mz } = effects;
	if (N === 0 && Mz === 0)
		return My < 0
			? { classified: cases.minusMy, basis: '−My' }
			: { classified: cases.plusMy, basis: '+My' };
	if (My === 0 && Mz === 0) return axialClass(model, cases, N);
	if (N === 0 && My === 0)
		return { classified: Mz > 0 ? cases.plusMz : cases.minusMz, basis: 'demand' };
	const { mechanics, section, strengths, code } = model;
	const { gammaM0, classAlpha } = code;
	const { hybrid } = strengths;
	const source = { mechanics, gross: section.gross, gammaM0, classAlpha, hybrid };
	const stress = stressCase(source, effects);
	return { classified: classifySection(model.elements, stress, effects), basis: 'demand' };
}

function axialClass({ elements }: EnModel, cases: PureCases, N: number): DemandClass {
	if (N < 0) return { classified: cases.compression, basis: 'N' };
	const pulled = { N, My: 0, Mz: 0 };
	return { classified: classifySection(elements, uniformTension, pulled), basis: 'demand' };
}
