import { gradeNames } from '$lib/engine/material/grades';
import type { GradeDefinition } from '$lib/engine/material/material';
import { gradeTitle } from './part-grades';

interface GradeChoice {
	value: string;
	label: string;
	group?: string;
}

const isEuropean = (name: string) => /^S\d{3}/.test(name);

/** Key of a grade in a list of choices: its name, or its definition as text. */
export const gradeKey = (grade: GradeDefinition): string =>
	typeof grade === 'string' ? grade : JSON.stringify(grade);

/** The grade behind a key. */
export function gradeFrom(key: string): GradeDefinition {
	if (gradeNames.includes(key)) return key;
	const read: unknown = /^[{\d]/.test(key) ? JSON.parse(key) : key;
	return read as GradeDefinition;
}

const named: readonly GradeChoice[] = gradeNames.map((name) => ({
	value: name,
	label: name,
	group: isEuropean(name) ? 'EN' : 'ASTM'
}));

/** All known grades, and first the one in use where it is none of them. */
export function gradeChoices(inUse: GradeDefinition): GradeChoice[] {
	const known = typeof inUse === 'string' && gradeNames.includes(inUse);
	const own = known
		? []
		: [{ value: gradeKey(inUse), label: gradeTitle(inUse), group: 'As given' }];
	return [...own, ...named];
}
