import { lawOf } from '../../../engine/material/laws';
import type { LawDefinition } from '../../../engine/material/material';
import { fail, ok, type Issue, type Result } from '../../../engine/result';
import type { PreparedSection } from '../../../engine/section/prepared';

/** The section with one law in place of every part's own; strengths stay those of the grades. */
export const withLaw = (
	section: PreparedSection,
	definition: LawDefinition
): Result<PreparedSection, Issue[]> => {
	const parts = [];
	for (const part of section.parts) {
		const law = lawOf(definition, part.material);
		if (!law.ok) return fail([{ path: 'law', message: law.error }]);
		parts.push({ ...part, material: { ...part.material, law: law.value } });
	}
	return ok({ ...section, parts });
};
