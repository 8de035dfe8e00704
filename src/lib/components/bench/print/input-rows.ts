import type { SectionDefinition } from '$lib/engine/section/definition';
import { formatQuantity, type Preferences } from '$lib/units';
import { gradeOf, gradeTitle } from '../part-grades';
import { partRows } from '../part-rows';

export interface InputRow {
	readonly name: string;
	readonly figure: string;
}

/** Sizes and grades as they were put in. */
export function inputRows(section: SectionDefinition, preferences: Preferences): InputRow[] {
	const length = (mm: number, unit = true) =>
		formatQuantity(mm, 'length', preferences, { digits: 6, trim: true, unit });
	const rows = partRows(section).map(({ title, parts, width, thick }) => {
		const size =
			width && thick
				? `${length(width.value, false)} × ${length(thick.value)}`
				: length((thick ?? width)?.value ?? 0);
		const grade = parts[0] ? `, ${gradeTitle(gradeOf(section, parts[0]))}` : '';
		return { name: title, figure: size + grade };
	});
	const graded = partRows(section).some(({ parts }) => parts.length > 0);
	return graded ? rows : [...rows, { name: 'Grade', figure: gradeTitle(section.grade) }];
}
