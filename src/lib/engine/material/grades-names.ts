import { astmGrades } from './grades-astm';
import { enGrades } from './grades-en';
import type { NamedGrade } from './grades-table';

const grades: readonly NamedGrade[] = [...enGrades, ...astmGrades];

/** Names of all known grades, EN first. */
export const gradeNames: readonly string[] = grades.map((grade) => grade.name);

const spelling = (name: string) =>
	name
		.toUpperCase()
		.replace(/^ASTM/, '')
		.replace(/GRADE|GR\.?/g, 'GR')
		.replace(/[\s.\-_/+]/g, '');

/** Toughness and quality letters do not change the strength: S355J2 is S355, S460ML is S460M. */
const qualities: readonly (readonly [written: RegExp, grade: string])[] = [
	[/^(S\d{3})(?:JR|J0|J2|K2)(H?)$/, '$1$2'],
	[/^(S\d{3})([NM])\2?L$/, '$1$2'],
	[/^(S\d{3})([NM])(?:H\2)?LH$/, '$1$2H'],
	[/^(S\d{3})QL1?$/, '$1Q']
];

const withoutQuality = (name: string) =>
	qualities.reduce((left, [written, grade]) => left.replace(written, grade), name);

const byName = new Map(grades.map((grade) => [spelling(grade.name), grade]));

/** The grade of that name; spaces, dots and quality letters (`S355 J2`, `S460 NL`) are understood. */
export function namedGrade(name: string): NamedGrade | undefined {
	const written = spelling(name);
	return byName.get(written) ?? byName.get(withoutQuality(written));
}

/** Number of single-letter edits between two short words (Levenshtein 1966). */
function edits(a: string, b: string): number {
	let row = Array.from({ length: b.length + 1 }, (_, j) => j);
	for (let i = 1; i <= a.length; i++) {
		const next = [i];
		for (let j = 1; j <= b.length; j++) {
			const swap = (row[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1);
			next.push(Math.min(swap, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1));
		}
		row = next;
	}
	return row[b.length] ?? 0;
}

/** Up to four known names closest in spelling; names that go on where this one ends come first. */
export function nearGradeNames(name: string): readonly string[] {
	const written = spelling(name).slice(0, 40);
	const distance = (known: string) => {
		const other = spelling(known);
		return written.length > 1 && other.startsWith(written) ? 0 : edits(written, other);
	};
	return [...gradeNames].sort((a, b) => distance(a) - distance(b)).slice(0, 4);
}
