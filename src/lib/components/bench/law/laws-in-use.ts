import type { GradeDefinition } from '$lib/engine/material/material';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { lawShort } from './law-draft';

const titleOf = (grade: GradeDefinition): string =>
	lawShort[(typeof grade === 'object' && grade.law?.type) || 'elastic-plastic'];

/** The laws of a section in a few words, each once. */
export function lawsInUse({ grade, partGrades = {} }: SectionDefinition): string {
	const titles = [grade, ...Object.values(partGrades)].map(titleOf);
	return [...new Set(titles)].join(', ');
}
