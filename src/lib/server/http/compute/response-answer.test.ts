import { describe, expect, it } from 'vitest';
import { responseAnswerSchema } from '../../../api/response';
import { responseAnswer } from './response-answer';

const flat = { kind: 'flat', b: 100, h: 200, grade: 250 };
const noShape = () => Promise.resolve(null);
const asked = async (request: object) => {
	const answer = await responseAnswer(
		{ section: flat, at: { curvatureRatio: [1, 2] }, ...request },
		noShape
	);
	if (!answer.ok) throw new Error(JSON.stringify(answer.error));
	return responseAnswerSchema.parse(answer.value);
};
const refusal = async (request: object) => {
	const answer = await responseAnswer(request, noShape);
	return answer.ok ? null : answer.error;
};

describe('responseAnswer', () => {
	it('bends a rectangle as the closed form has it: M/My = 1.5 − 0.5 (κy/κ)²', async () => {
		const { states, firstYield, plasticMoment } = await asked({});
		// My = fy b h² / 6 = 250 · 100 · 200² / 6 N·mm
		expect(firstYield.moment).toBeCloseTo(500 / 3, 9);
		expect(plasticMoment).toBeCloseTo(250, 9);
		expect(states.map(({ moment }) => moment)).toEqual([
			expect.closeTo(500 / 3, 9),
			expect.closeTo((500 / 3) * (1.5 - 0.5 / 4), 9)
		]);
	});

	it('lets the law of the request take the place of the section’s own', async () => {
		const law = { type: 'bilinear', Eh: 0 };
		const grade = { fy: 250, law: { type: 'bilinear', Eh: 21_000 } };
		const stiff = await asked({ section: { ...flat, grade } });
		const level = await asked({ section: { ...flat, grade }, law });
		expect(stiff.states[1]?.moment).toBeGreaterThan((500 / 3) * 1.375 + 1);
		expect(level.states[1]?.moment).toBeCloseTo((500 / 3) * 1.375, 9);
	});

	it.each([
		['law_not_built', { law: { type: 'ramberg-osgood', n: 8 } }],
		[
			'law_not_built',
			{ section: { ...flat, grade: { fy: 250, law: { type: 'ramberg-osgood', n: 8 } } } }
		],
		['unloading_not_built', { unloadFrom: { curvatureRatio: [2] } }],
		['residual_not_built', { residual: 'rolled' }]
	])('gives no state and says why: %s', async (code, request) => {
		const { states, plasticMoment, notes } = await asked(request);
		expect(states).toHaveLength(2);
		expect(states.every(({ converged, moment }) => !converged && moment === null)).toBe(true);
		expect(plasticMoment).toBeNull();
		expect(notes.map((note) => note.code)).toContain(code);
	});

	it('refuses a request that asks for two kinds of states, or for none', async () => {
		expect(
			(await refusal({ section: flat, at: { curvature: [1], moment: [1] } }))?.message
		).toContain('exactly one');
		expect((await refusal({ section: flat }))?.issues?.[0]?.path).toBe('at');
	});

	it('states the limit when too many states are asked for', async () => {
		const curvature = Array.from({ length: 2001 }, (_, i) => i);
		const error = await refusal({ section: flat, at: { curvature } });
		expect(error?.message).toContain('at most 2000');
		expect(error?.code).toBe('invalid_request');
	});

	it('takes fewer moments at a time where a section has very many edges, and says how many', async () => {
		const plates = Array.from({ length: 40 }, (_, i) => ({
			...{ name: `p${i}`, width: 100 + i, thickness: 6, y: i, z: 12 * i, angle: 0 }
		}));
		const section = { kind: 'plates', plates, tied: true, grade: 355 };
		const moment = Array.from({ length: 2000 }, (_, i) => i * 0.01);
		const error = await refusal({ section, at: { moment } });
		expect(error).toMatchObject({ status: 400, issues: [{ path: 'at.moment' }] });
		expect(error?.message).toContain('at most 1250 entries for a section of 160 edges, not 2000');
	});

	it('lets others have their turn, and stops when nobody waits any more', async () => {
		const curvature = Array.from({ length: 2000 }, (_, i) => Math.sin(i * 17) / 10);
		const section = {
			...{ kind: 'i', h: 300, b: 150, tw: 7.1, tf: 10.7, r: 15, fabrication: 'rolled' },
			grade: 'S355'
		};
		const caller = new AbortController();
		const work = responseAnswer(
			{ section, axisAngle: 20, at: { curvature } },
			noShape,
			caller.signal
		);
		setImmediate(() => caller.abort());
		const answer = await work;
		expect(answer.ok ? null : answer.error.code).toBe('client_gone');
	});

	it('names the field of a section that does not fit', async () => {
		const error = await refusal({ section: { ...flat, b: 0 }, at: { curvature: [1] } });
		expect(error).toMatchObject({ status: 400, code: 'invalid_section' });
		expect(error?.issues?.[0]?.path).toBe('section.b');
	});

	it('names the law that cannot be', async () => {
		const law = { type: 'bilinear', Eh: 500_000 };
		const error = await refusal({ section: flat, at: { curvature: [1] }, law });
		expect(error?.issues?.[0]?.path).toBe('law');
	});
});
