import { describe, expect, it } from 'vitest';
import { responseAnswerSchema } from '$lib/api/response';
import { sectionKinds } from '$lib/api/section';
import { exampleSections } from '$lib/server/http/compute/example-sections';
import { call, post } from './call';

const rectangle = { kind: 'flat', b: 100, h: 200, grade: 250 };
/** fy·b·h²/6 in kNm. */
const yieldMoment = 500 / 3;

const asked = async (request: object) => {
	const { status, body } = await post('/api/v1/response', request);
	expect({ status, body }).toMatchObject({ status: 200 });
	return responseAnswerSchema.parse(body);
};

describe('POST /api/v1/response', () => {
	it.each(sectionKinds)('bends kind %s with every field of the contract', async (kind) => {
		const answer = await asked({
			section: exampleSections[kind],
			at: { curvatureRatio: [0, 0.5, 1, 2] }
		});
		expect(answer.states.every(({ converged }) => converged)).toBe(true);
		expect(answer.states[1]?.yieldedShare).toBe(0);
	});

	it('follows the closed form of a rectangle: M/My = 1.5 − 0.5 (κy/κ)²', async () => {
		const ratios = [1, 1.5, 2, 5];
		const { states } = await asked({ section: rectangle, at: { curvatureRatio: ratios } });
		states.forEach(({ moment }, i) =>
			expect(moment).toBeCloseTo(yieldMoment * (1.5 - 0.5 / (ratios[i] ?? 1) ** 2), 8)
		);
	});

	it('follows the closed form of a rectangle under axial force: Mpl · (1 − n²)', async () => {
		const { plasticMoment } = await asked({ section: rectangle, N: 2500, at: { curvature: [0] } });
		expect(plasticMoment).toBeCloseTo(250 * (1 - 0.5 ** 2), 8);
	});

	it('finds the state of a moment, and none above the plastic one', async () => {
		const { states } = await asked({ section: rectangle, at: { moment: [200, 251] } });
		expect(states[0]).toMatchObject({ converged: true, moment: expect.closeTo(200, 8) });
		expect(states[1]).toMatchObject({ converged: false, moment: null, e0: null, extremes: null });
	});

	it('keeps the signs: positive My puts the bottom in tension, positive Mz the right', async () => {
		const planes = [
			{ e0: 0, ky: 0.001, kz: 0 },
			{ e0: 0, ky: 0, kz: 0.001 }
		];
		const { states } = await asked({ section: rectangle, at: { strainPlanes: planes } });
		expect(states[0]?.My).toBeGreaterThan(0);
		expect(states[0]?.tension?.z).toBeLessThan(100);
		expect(states[1]?.Mz).toBeGreaterThan(0);
		expect(states[1]?.tension?.y).toBeGreaterThan(50);
	});

	it('turns with the axis: M = My cosθ + Mz sinθ', async () => {
		const { states } = await asked({
			section: rectangle,
			axisAngle: 30,
			transverse: 'curvature-zero',
			at: { curvatureRatio: [1.7] }
		});
		const { My = 0, Mz = 0, moment = 0 } = states[0] ?? {};
		const turned = (My ?? 0) * Math.cos(Math.PI / 6) + (Mz ?? 0) * Math.sin(Math.PI / 6);
		expect(moment).toBeCloseTo(turned, 8);
	});

	it('bends a shape of the catalogues to its published plastic moment (IPE 300, Wpl 628.4 cm³)', async () => {
		const { plasticMoment } = await asked({
			shapeId: 'en10365-ipe-300',
			version: 1,
			grade: 355,
			at: { curvature: [0.01] }
		});
		expect(plasticMoment).toBeCloseTo((628.4 * 355) / 1e3, 1);
	});

	it('says where no published residual stress covers a section, and gives no state', async () => {
		const { states, notes } = await asked({
			section: rectangle,
			residual: 'rolled',
			at: { curvature: [0.01] }
		});
		expect(states[0]).toMatchObject({ converged: false, moment: null });
		expect(notes[0]?.code).toBe('residual-not-covered');
	});

	it('lets others have their answer while it computes', async () => {
		const outer = Array.from({ length: 1000 }, (_, i) => {
			const [turn, radius] = [(i * Math.PI) / 500, 500 + 50 * (i % 2)];
			return [radius * Math.cos(turn), radius * Math.sin(turn)];
		});
		const curvature = Array.from({ length: 800 }, (_, i) => Math.sin(i * 17) / 10);
		let done = false;
		const long = asked({
			section: { kind: 'outline', outer, grade: 355 },
			axisAngle: 10,
			at: { curvature }
		}).then(() => (done = true));
		const started = performance.now();
		const health = await call('/api/v1/health');
		expect(health.status).toBe(200);
		expect(done).toBe(false);
		expect(performance.now() - started).toBeLessThan(1500);
		await long;
	});

	it('takes as many states as it says', async () => {
		const curvature = Array.from({ length: 2000 }, (_, i) => i * 1e-5);
		const { states } = await asked({ section: exampleSections.i, at: { curvature } });
		expect(states).toHaveLength(2000);
	});
});
