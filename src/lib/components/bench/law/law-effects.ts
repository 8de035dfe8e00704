import type { Material } from '$lib/engine/material/material';
import { lawIssues, lawNotes } from '$lib/engine/rules/en1993/law-cover';
import type { Standard } from '$lib/engine/rules/result';
import { historyOf } from '$lib/engine/response/history/history';
import { materialNotes } from '$lib/engine/section/transformed';
import type { PreparedSection } from '$lib/engine/section/prepared';
import { partTitle } from '../part-titles';

/** What a material in a part (in all of them when empty) means for the code's figures and for bending, in sentences. */
export function lawEffects(
	section: PreparedSection,
	part: string,
	material: Material,
	standard: Standard = 'EN1993-1-1:2005'
): string[] {
	const parts = section.parts.map((own) => ({
		...own,
		...(part === '' || own.name === part ? { material } : {})
	}));
	const changed: PreparedSection = { ...section, parts };
	const issues = lawIssues(parts, standard);
	const code = issues.length > 0 ? issues : lawNotes(parts, standard);
	const past = historyOf(changed);
	const said = [
		...code.map(({ message }) => message),
		...(code.length === 0
			? ['Class and resistances are of fy; this law changes nothing of them.']
			: []),
		...materialNotes(parts).map(({ message }) => message),
		...(past.ok ? [] : [past.error.message])
	];
	return said.map((sentence) => titled(sentence, section));
}

/** Part names in a sentence as people say them. */
const titled = (sentence: string, { parts }: PreparedSection): string =>
	parts.reduce(
		(text, { name }) =>
			text.replace(new RegExp(`\\b${name}\\b`, 'g'), partTitle(name).toLowerCase()),
		sentence
	);
