import { describe, expect, it } from 'vitest';
import { interactionAnswerSchema } from '../../../api/interaction';
import { exampleSections } from './example-sections';
import { interactionAnswer } from './interaction-answer';

const bar = { kind: 'flat', b: 40, h: 120, grade: 250 };
const noShape = () => Promise.resolve(null);
const ask = (request: object) =>
	interactionAnswer({ section: bar, limit: 'plastic', plane: 'N-My', ...request }, noShape);
const asked = async (request: object) => {
	const answer = await ask(request);
	if (!answer.ok) throw new Error(JSON.stringify(answer.error));
	return interactionAnswerSchema.parse(answer.value);
};
const refusal = async (request: object) => {
	const answer = await ask(request);
	return answer.ok ? null : answer.error;
};

describe('interactionAnswer', () => {
	it('gives the closed form of a rectangle, m = 1 − n², 72 points unless told', async () => {
		const { points } = await asked({});
		expect(points).toHaveLength(72);
		for (const { N, My } of points) expect(Math.abs(My) / 36).toBeCloseTo(1 - (N / 1200) ** 2, 11);
	});

	it.each(Object.entries(exampleSections))('traces every curve of kind %s', async (_, section) => {
		for (const limit of ['first-yield', 'plastic'])
			for (const plane of ['N-My', 'N-Mz', 'My-Mz'])
				expect((await asked({ section, limit, plane, points: 12 })).points).toHaveLength(12);
	});

	it('says that N goes unread where the curve runs over every N', async () => {
		const { notes } = await asked({ N: 100 });
		expect(notes.map(({ code }) => code)).toContain('ignored_field');
	});

	it('says where N acts when parts differ in strength', async () => {
		const section = { ...exampleSections.i, partGrades: { topFlange: 460 } };
		expect((await asked({ section })).notes.map(({ code }) => code)).toContain(
			'force_at_gross_centroid'
		);
	});

	it('refuses what cannot be, naming the field', async () => {
		expect(await refusal({ plane: 'My-Mz', N: 1300 })).toMatchObject({
			...{ status: 422, issues: [{ path: 'N' }] }
		});
		expect(await refusal({ points: 11 })).toMatchObject({ issues: [{ path: 'points' }] });
		expect(await refusal({ points: 721 })).toMatchObject({ issues: [{ path: 'points' }] });
		expect(await refusal({ plane: 'N-T' })).toMatchObject({ issues: [{ path: 'plane' }] });
		expect(await refusal({ limit: 'ultimate' })).toMatchObject({ issues: [{ path: 'limit' }] });
	});

	it('has no full plastic curve where the law loses its strength', async () => {
		const law = {
			type: 'curve',
			tension: [
				[0.0015, 300],
				[0.05, 100]
			],
			beyond: 'zero'
		};
		const section = { ...bar, grade: { fy: 300, E: 200_000, law } };
		expect(await refusal({ section })).toMatchObject({
			...{ status: 422, code: 'no_curve', issues: [{ path: 'limit' }] }
		});
	});
});
