import type { GradeDefinition } from '$lib/engine/material/material';
import { lawShort } from './law/law-draft';
import type { SectionDefinition } from '$lib/engine/section/definition';

/** Grade of a part: its own, or the section's. */
export const gradeOf = (section: SectionDefinition, part: string): GradeDefinition =>
	section.partGrades?.[part] ?? section.grade;

/** The section with another grade in the parts named; what equals the section's grade is left out. */
export function withPartGrade(
	section: SectionDefinition,
	parts: readonly string[],
	grade: GradeDefinition
): SectionDefinition {
	const { partGrades, ...rest } = section;
	const changed = { ...partGrades, ...Object.fromEntries(parts.map((part) => [part, grade])) };
	const own = Object.fromEntries(
		Object.entries(changed).filter(([, each]) => each !== section.grade)
	);
	return Object.keys(own).length > 0 ? { ...rest, partGrades: own } : rest;
}

/** The section all in one grade. */
export function withGrade(section: SectionDefinition, grade: GradeDefinition): SectionDefinition {
	const { partGrades: _dropped, ...rest } = section;
	return { ...rest, grade };
}

/** A grade in a few letters: its name, or its yield strength and law. */
export function gradeTitle(grade: GradeDefinition): string {
	if (typeof grade === 'string') return grade;
	if (typeof grade === 'number') return `fy ${grade}`;
	return `fy ${grade.fy}${grade.law ? `, ${lawShort[grade.law.type]}` : ''}`;
}
