import { Workings } from '../../explain/working';
import { mechanicsOf } from '../../response/law-groups';
import type { SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { codeChoice } from '../code-choice';
import type { CodeChoice } from '../result';
import { resistingMoments, sectionMoments } from '../section-moments';
import { classifyDemand } from './demand-class';
import { elementsOf } from './elements/elements-of';
import { pureCases, type EnModel } from './model';
import { strengthsOf } from './strengths';
import type { Effects } from './stress-case';

/** For tests: the model of a section that has a class, with workings collected. */
export function testModel(
	definition: SectionDefinition,
	code: Partial<CodeChoice> = {}
): EnModel & { readonly workings: Workings } {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const mechanics = mechanicsOf(section.value);
	const strengths = strengthsOf(section.value);
	const { elements } = elementsOf(section.value, strengths);
	if (elements === null) throw new Error('The section has no class.');
	const limits = sectionMoments(mechanics, strengths.even);
	return {
		section: section.value,
		mechanics,
		moments: resistingMoments(mechanics, section.value, limits),
		strengths,
		elements,
		code: codeChoice(code),
		stiffeners: null,
		workings: new Workings()
	};
}

/** For tests: the class of a section under some effects; what is not given is nil. */
export function classUnder(
	definition: SectionDefinition,
	effects: Partial<Effects>,
	code: Partial<CodeChoice> = {}
) {
	const model = testModel(definition, code);
	const { N = 0, My = 0, Mz = 0 } = effects;
	return classifyDemand(model, pureCases(model), { N, My, Mz }, 'tested').classified;
}
