import type { Workings } from '../../src/lib/engine/explain/working';
import { mechanicsOf } from '../../src/lib/engine/response/law-groups';
import { codeChoice } from '../../src/lib/engine/rules/code-choice';
import { elementsOf } from '../../src/lib/engine/rules/en1993/elements/elements-of';
import type { EnModel } from '../../src/lib/engine/rules/en1993/model';
import { strengthsOf } from '../../src/lib/engine/rules/en1993/strengths';
import type { CodeChoice } from '../../src/lib/engine/rules/result';
import { sectionMoments } from '../../src/lib/engine/rules/section-moments';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import { prepareSection } from '../../src/lib/engine/section/prepare';

/** A definition as the rules of EN 1993 take it; with `workings` it keeps how figures come about. */
export function enModel(
	definition: SectionDefinition,
	code: Partial<CodeChoice> = {},
	workings: Workings | null = null
): EnModel {
	const prepared = prepareSection(definition);
	if (!prepared.ok) throw new Error(prepared.error.map(({ message }) => message).join(' '));
	const section = prepared.value;
	const [mechanics, strengths] = [mechanicsOf(section), strengthsOf(section)];
	const { elements } = elementsOf(section, strengths);
	if (elements === null) throw new Error('The section has no elements.');
	const moments = sectionMoments(mechanics, strengths.even);
	return {
		section,
		mechanics,
		strengths,
		elements,
		moments,
		code: codeChoice(code),
		stiffeners: null,
		workings
	};
}
