import { describe, expect, it } from 'vitest';
import { analyseAnswerSchema } from '../../../api/analyse';
import { sectionKinds } from '../../../api/section';
import type { SectionDefinition } from '../../../engine/section/definition';
import { finiteJson } from '../answer';
import { analyseAnswer } from './analyse-answer';
import { exampleSections } from './example-sections';

const ipe300: SectionDefinition = {
	...{ kind: 'i', h: 300, b: 150, tw: 7.1, tf: 10.7, r: 15 },
	...{ fabrication: 'rolled', grade: 'S355' }
};
const findShape = (id: string) => Promise.resolve(id === 'en10365-ipe-300' ? ipe300 : null);
const asked = async (request: unknown) => {
	const answer = await analyseAnswer(request, findShape);
	if (!answer.ok) throw new Error(JSON.stringify(answer.error));
	return answer.value;
};
const refusal = async (request: unknown) => {
	const answer = await analyseAnswer(request, findShape);
	return answer.ok ? null : answer.error;
};

describe('analyseAnswer', () => {
	it.each(sectionKinds)('answers as the contract says for kind %s', async (kind) => {
		const value = await asked({ section: exampleSections[kind], demand: { My: 1, Vz: 1 } });
		expect(analyseAnswerSchema.parse(JSON.parse(finiteJson(value))).contract).toBe(1);
	});

	it('gives the published properties of a shape found by its id (EN 10365: IPE 300)', async () => {
		const { gross, notes } = await asked({ shapeId: 'en10365-ipe-300' });
		expect(gross.plasticModulusY / 1e3).toBeCloseTo(628.4, 1);
		expect(gross.secondMomentY / 1e4 / 8356).toBeCloseTo(1, 3);
		expect(notes.map(({ code }) => code)).toContain('assumed_grade');
	});

	it('takes the grade that is sent with a shape', async () => {
		const { moment, notes } = await asked({ shapeId: 'en10365-ipe-300', grade: 'S235' });
		expect(moment.plasticY).toBeCloseTo((628.4 * 235) / 1e3, 1);
		expect(notes.map(({ code }) => code)).not.toContain('assumed_grade');
	});

	it('answers 404 to a shape that is not there, 422 to a version that is not', async () => {
		expect(await refusal({ shapeId: 'x' })).toMatchObject({ status: 404, code: 'unknown_shape' });
		expect(await refusal({ shapeId: 'en10365-ipe-300', version: 7 })).toMatchObject({
			status: 422
		});
	});

	it('takes section or shapeId, not both and not neither', async () => {
		expect((await refusal({}))?.message).toContain('section, or shapeId');
		expect(await refusal({ section: ipe300, shapeId: 'a' })).toMatchObject({ status: 400 });
		expect(await refusal([])).toMatchObject({ status: 400, code: 'invalid_request' });
		expect(await refusal(null)).toMatchObject({ status: 400 });
	});

	it('names the place of a grade that is not known', async () => {
		const error = await refusal({ section: { ...ipe300, grade: 'S999' } });
		expect(error).toMatchObject({ status: 400, code: 'invalid_section' });
		expect(error?.issues?.[0]?.path).toBe('section.grade');
	});

	it('gives no code figure under a rounded law, but first yield and full plastic', async () => {
		const grade = { fy: 250, law: { type: 'ramberg-osgood', n: 8 } };
		const value = await asked({ section: { ...ipe300, grade } });
		expect(value).toMatchObject({ classification: null, resistance: null });
		expect(value.moment.plasticY).toBeCloseTo((250 * value.gross.plasticModulusY) / 1e6, 9);
		expect(value.gross.area).toBeGreaterThan(0);
		const codes = value.notes.map(({ code }) => code);
		expect(codes).toEqual(expect.arrayContaining(['law-not-covered', 'rounded-law']));
	});

	it('says which fields at the top nobody reads', async () => {
		const { notes } = await asked({ section: ipe300, demnd: { My: 10 } });
		expect(notes.map(({ message }) => message).join()).toContain('"demnd"');
	});

	it.each([
		['demand.vz', { demand: { My: 50, vz: 900 } }, 'did you mean "Vz"?'],
		['demands.1.NEd', { demands: [{ N: 1 }, { NEd: 900 }] }, '"NEd" is not known'],
		['code.gammaMO', { code: { gammaMO: 1.1 } }, 'did you mean "gammaM0"?'],
		[
			'stiffeners.spacng',
			{ stiffeners: { spacing: 900, endPost: 'rigid', spacng: 1 } },
			'did you mean "spacing"?'
		]
	])('refuses %s: a force left out unseen would be favourable', async (path, more, hint) => {
		const error = await refusal({ section: ipe300, ...more });
		expect(error).toMatchObject({ status: 400, code: 'invalid_request' });
		expect(error?.issues?.[0]?.path).toBe(path);
		expect(error?.message).toContain(hint);
	});

	it('takes parts and demands called like what every object inherits', async () => {
		const plate = { name: 'constructor', width: 100, thickness: 10, y: 0, z: 0, angle: 0 };
		const section = { kind: 'plates', plates: [plate], partGrades: {}, grade: 355 };
		const { squashLoad } = await asked({ section, demand: { name: 'toString', My: 1 } });
		expect(squashLoad).toBeCloseTo(355, 9);
	});

	it('takes demands of one name', async () => {
		const demands = [
			{ name: 'a', My: 1 },
			{ name: 'a', My: 2 }
		];
		expect((await asked({ section: ipe300, demands })).demands).toHaveLength(2);
	});

	it('says that a hole as large as its outer ring leaves no steel', async () => {
		const ring = [
			[0, 0],
			[100, 0],
			[100, 50],
			[0, 50]
		];
		const error = await refusal({
			section: { kind: 'outline', outer: ring, holes: [ring], grade: 'S355' }
		});
		expect(error?.message).toContain('leaves no steel');
		expect(error?.issues?.[0]?.path).toBe('section.holes.0');
	});
});
