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
		['residual-not-covered', { residual: 'rolled' }],
		[
			'law-not-unloaded',
			{
				unloadFrom: { curvatureRatio: [2] },
				law: {
					type: 'curve',
					tension: [
						[0.001, 200],
						[0.01, 150]
					],
					beyond: 'flat'
				}
			}
		]
	])('gives no state and says why: %s', async (code, request) => {
		const { states, plasticMoment, notes } = await asked(request);
		expect(states).toHaveLength(2);
		expect(states.every(({ converged, moment }) => !converged && moment === null)).toBe(true);
		expect(plasticMoment).toBeNull();
		expect(notes.map((note) => note.code)).toContain(code);
	});

	it('releases a bar from a state and gives what is left: M − M = 0, κ = κr − M/EI', async () => {
		const { states, notes } = await asked({
			unloadFrom: { curvatureRatio: [2] },
			at: { moment: [0] }
		});
		expect(states[0]!.moment).toBeCloseTo(0, 9);
		// M/My = 1.5 − 0.5/2² = 1.375, so that 2 − 1.375 of the yield curvature stay
		expect(states[0]!.curvatureRatio).toBeCloseTo(0.625, 9);
		// at the surfaces fy − 1.375 fy, at the edge of the core fy − 1.375 fy/2
		expect(states[0]!.extremes!.stressMax).toBeCloseTo(250 * 0.375, 9);
		expect(notes.map(({ code }) => code)).toContain('strained-one-way');
	});

	it('loads under one axial force and releases to another', async () => {
		const { states } = await asked({
			...{ unloadFrom: { curvatureRatio: [3], N: 1000 }, N: 0, at: { moment: [0] } }
		});
		expect(states[0]!.N).toBeCloseTo(0, 6);
		expect(states[0]!.e0).toBeGreaterThan(1e-5);
	});

	it('follows a cycle leg by leg and ends each at its reversal', async () => {
		const { legs, states } = await asked({
			at: undefined,
			cycle: { curvatures: [0.03, -0.03, 0.03], pointsPerLeg: 4 }
		});
		expect(states).toEqual([]);
		expect(legs?.map((leg) => leg.states.length)).toEqual([4, 4, 4]);
		const ends = legs!.map((leg) => leg.states.at(-1)!);
		expect(ends[1]!.moment).toBeCloseTo(-ends[0]!.moment!, 8);
		expect(ends[2]!.moment).toBeCloseTo(ends[0]!.moment!, 8);
		expect(ends[1]!.curvature).toBeCloseTo(-0.03, 12);
	});

	it('gives no figure from a reversal on that cannot be reached', async () => {
		const { legs, states, notes } = await asked({
			...{ at: { moment: [0] }, cycle: { moments: [200, -300, 0], pointsPerLeg: 1 } }
		});
		expect(legs!.map((leg) => leg.states[0]!.converged)).toEqual([true, false, false]);
		expect(states[0]!.converged).toBe(false);
		expect(notes.map(({ code }) => code)).toContain('history-not-reached');
	});

	it('bounds a cycle by all its states', async () => {
		const curvatures = Array.from({ length: 101 }, (_, i) => (-1) ** i * 0.01);
		const error = await refusal({ section: flat, cycle: { curvatures } });
		expect(error?.issues?.[0]).toMatchObject({ path: 'cycle' });
		expect(error?.message).toContain('at most 2000 states in all');
	});

	it('says that a welded section has yielded before any load', async () => {
		const welded = { kind: 'i', h: 400, b: 200, tw: 8, tf: 15, fabrication: 'welded', grade: 355 };
		const { states, firstYield, plasticMoment, notes } = await asked({
			...{ section: welded, residual: 'welded', at: { curvature: [0.01] } }
		});
		expect(firstYield).toEqual({ curvature: 0, moment: 0 });
		expect(states[0]!.converged).toBe(true);
		expect(plasticMoment).toBeGreaterThan(states[0]!.moment!);
		expect(notes.map(({ code }) => code)).toContain('residual-welded');
	});

	it('ends with the law: states beyond are not given, and where it ended is', async () => {
		const law = { type: 'elastic-plastic', strainLimit: 0.01 };
		// curvature at the limit: 0.01 at 100 mm from the axis
		const { states, ended } = await asked({ law, at: { curvature: [0.0999, 0.1001] } });
		expect(states.map(({ converged }) => converged)).toEqual([true, false]);
		expect(ended?.curvature).toBeCloseTo(0.1, 9);
		const share = 250 / 210_000 / 0.01;
		expect(ended?.moment).toBeCloseTo((500 / 3) * (1.5 - 0.5 * share ** 2), 8);
	});

	it('bends under a rounded law, and says what first yield means there', async () => {
		const { states, notes } = await asked({ law: { type: 'ramberg-osgood', n: 8 } });
		expect(states.every(({ converged }) => converged)).toBe(true);
		expect(states[0]?.moment).toBeLessThan(500 / 3);
		expect(notes.map(({ code }) => code)).toContain('rounded-law');
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

	it('refuses to unload from an empty list', async () => {
		const unloadFrom = { curvature: [] };
		expect(await refusal({ section: flat, at: { moment: [0] }, unloadFrom })).toMatchObject({
			...{ status: 400, issues: [{ path: 'unloadFrom' }] }
		});
	});
});
