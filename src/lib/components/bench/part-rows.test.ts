import { describe, expect, it } from 'vitest';
import { prepareSection } from '$lib/engine/section/prepare';
import { buildKindOf, buildKinds } from './opening-sections';
import { gradeOf, withGrade, withPartGrade } from './part-grades';
import { partRows } from './part-rows';

describe('the sections that the form offers', () => {
	it.each(buildKinds.map(({ key, opening }) => [key, opening] as const))(
		'%s can be built as it opens, and has its sizes or a form of its own',
		(key, opening) => {
			expect(prepareSection(opening).ok).toBe(true);
			expect(buildKindOf(opening)).toBe(key);
			const drawn = opening.kind === 'plates' || opening.kind === 'outline';
			expect(partRows(opening).length > 0).toBe(!drawn);
		}
	);

	it.each(buildKinds.map(({ key, opening }) => [key, opening] as const))(
		'%s stays the same when every size is set to what it is',
		(_, opening) => {
			const before = prepareSection(opening);
			for (const { width, thick } of partRows(opening)) {
				for (const field of [width, thick]) {
					if (!field) continue;
					const after = prepareSection(field.with(field.value));
					if (!before.ok || !after.ok) throw new Error(`${field.label} cannot be set`);
					expect(after.value.gross.area).toBeCloseTo(before.value.gross.area, 9);
				}
			}
		}
	);
});

describe('a welded girder in the form', () => {
	const girder = buildKinds[0]!.opening;
	const row = (title: string) => partRows(girder).find((one) => one.title === title);

	it('shows the clear depth of its web and keeps it when a flange grows', () => {
		expect(row('Web')?.width?.value).toBe(900);
		const grown = row('Top flange')?.thick?.with(30);
		expect(grown).toMatchObject({ h: 950, tf: 30, tfBottom: 20 });
	});

	it('changes one flange without the other', () => {
		expect(row('Top flange')?.width?.with(300)).toMatchObject({ b: 300, bBottom: 400 });
	});

	it('takes a grade for each plate and forgets it when it is the common one', () => {
		const hybrid = withPartGrade(girder, ['topFlange'], 'S460M');
		expect(gradeOf(hybrid, 'topFlange')).toBe('S460M');
		expect(withPartGrade(hybrid, ['topFlange'], 'S355')).not.toHaveProperty('partGrades');
		expect(withGrade(hybrid, 'S275')).toMatchObject({ grade: 'S275' });
	});
});
