import { describe, expect, it } from 'vitest';
import type { LawDefinition } from '../../material/material';
import { bending } from '../respond';
import type { BendingPath } from '../state';
import { circle, part, rectangle, sectionOf, steel } from '../test-sections';
import { historyOf, type History } from './history';
import { bendingFrom } from './history-bending';
import { historyPicture } from './history-picture';

const [b, h, fy, E] = [60, 140, 250, 200_000];
const [My, yieldCurvature] = [(fy * b * h * h) / 6e6, ((2 * fy) / E / h) * 1e3];
const straight: BendingPath = { axisAngle: 0, transverse: 'moment-zero', N: 0 };

const bar = (law?: LawDefinition) =>
	sectionOf(part('bar', rectangle(10, -20, b, h), steel(fy, { E, ...(law ? { law } : {}) })));

const fresh = (law?: LawDefinition): History => {
	const history = historyOf(bar(law));
	if (!history.ok) throw new Error(history.error.code);
	return history.value;
};

const bentTo = (history: History, curvature: number): History => {
	const after = bendingFrom(history, straight).after({ curvature });
	if (!after) throw new Error('lost');
	return after;
};

const releasedFrom = (history: History): History => {
	const after = bendingFrom(history, straight).after({ moment: 0 });
	if (!after) throw new Error('lost');
	return after;
};

/** M/My of a rectangle at a multiple of the yield curvature (closed form, any textbook). */
const rise = (r: number) => (r <= 1 ? r : 1.5 - 0.5 / (r * r));

describe('a rectangle bent past yield and released', () => {
	it('keeps half of fy at its surfaces, of the other sign, and fy on either side of its middle', () => {
		const picture = historyPicture(releasedFrom(bentTo(fresh(), 1e4 * yieldCurvature)));
		const points = picture.lines[0]!.points;
		// 1.5 − 0.5/r² less 1, at r = 10⁴
		expect(points.at(-1)!.stress / fy).toBeCloseTo(0.5 - 0.5e-8, 10);
		expect(points[0]!.stress / fy).toBeCloseTo(-0.5 + 0.5e-8, 10);
		const stresses = points.map(({ stress }) => stress / fy);
		// 1 less (1.5 − 0.5/r²)/r beside the middle
		expect(Math.max(...stresses)).toBeCloseTo(1 - 1.5e-4, 10);
		expect(Math.min(...stresses)).toBeCloseTo(-1 + 1.5e-4, 10);
	});

	it('keeps what plastic less elastic stress leaves, and the curvature that goes with it', () => {
		for (const r of [1.2, 2, 5]) {
			const history = bentTo(fresh(), r * yieldCurvature);
			const state = bendingFrom(history, straight).atMoment(0);
			expect(state.curvature! / yieldCurvature).toBeCloseTo(r - rise(r), 10);
			const { points } = historyPicture(releasedFrom(history)).lines[0]!;
			// the bottom yielded in tension; the edge of the core lies h/2r from the middle
			expect(points[0]!.stress / fy).toBeCloseTo(1 - rise(r), 10);
			const edge = points.find(({ distance }) => Math.abs(distance + h / 2 / r) < 1e-6);
			expect(edge!.stress / fy).toBeCloseTo(1 - rise(r) / r, 10);
			const most = Math.max(1 - rise(r) / r, rise(r) - 1);
			expect(state.extremes!.stressMax / fy).toBeCloseTo(most, 10);
			expect(Math.abs(state.N!)).toBeLessThan((1e-9 * b * h * fy) / 1e3);
			expect(state.yieldedShare).toBe(0);
		}
	});

	it('has nothing left when it stayed elastic', () => {
		const state = bendingFrom(bentTo(fresh(), 0.9 * yieldCurvature), straight).atMoment(0);
		expect(Math.abs(state.curvature!)).toBeLessThan(1e-12 * yieldCurvature);
		expect(Math.abs(state.extremes!.stressMax)).toBeLessThan(1e-9 * fy);
		expect(state.compression).toBeNull();
		expect(state.leverArm).toBeNull();
	});

	it('follows twice its own curve when bent the other way (Masing), and comes back to its old state', () => {
		const [r, back] = [3, -1.5];
		const turned = bentTo(fresh(), r * yieldCurvature);
		const at = bendingFrom(turned, straight).atCurvature(back * yieldCurvature);
		const expected = rise(r) - 2 * rise((r - back) / 2);
		expect(at.moment! / My).toBeCloseTo(expected, 10);
		const again = bendingFrom(bentTo(turned, back * yieldCurvature), straight);
		expect(again.atCurvature(r * yieldCurvature).moment! / My).toBeCloseTo(rise(r), 10);
		expect(again.atCurvature(4 * yieldCurvature).moment! / My).toBeCloseTo(rise(4), 10);
	});

	it('hardens kinematically: a bilinear law unloads over twice fy, then along the hardening line', () => {
		const [alpha, r] = [0.05, 4];
		const law: LawDefinition = { type: 'bilinear', Eh: alpha * E };
		const hard = (x: number) => (1 - alpha) * rise(x) + alpha * x;
		const turned = bentTo(fresh(law), r * yieldCurvature);
		const bent = bendingFrom(turned, straight);
		for (const back of [2, -1, -3.5]) {
			const state = bent.atCurvature(back * yieldCurvature);
			expect(state.moment! / My).toBeCloseTo(hard(r) - 2 * hard((r - back) / 2), 10);
		}
		// past the far end of the first loading its own curve goes on
		expect(bent.atCurvature(-6 * yieldCurvature).moment! / My).toBeCloseTo(-hard(6), 10);
		// fully elastic release: residual curvature by superposition
		expect(bent.atMoment(0).curvature! / yieldCurvature).toBeCloseTo(r - hard(r), 10);
	});

	it('keeps 16/3π − 1 of fy at the surface of a round bar and of a tube what its moduli say', () => {
		const hollow = (inner: number) =>
			sectionOf(
				part(
					'tube',
					{
						loops: [
							circle({ y: 3, z: 5 }, 50),
							...(inner ? [circle({ y: 3, z: 5 }, inner, true)] : [])
						]
					},
					steel(fy, { E })
				)
			);
		for (const inner of [0, 40]) {
			const history = historyOf(hollow(inner));
			if (!history.ok) throw new Error(history.error.code);
			const after = bentTo(history.value, 1e4 * yieldCurvature);
			// Wpl = 4 (R³ − r³)/3, Wel = π (R⁴ − r⁴)/4R
			const [plastic, elastic] = [
				(4 * (50 ** 3 - inner ** 3)) / 3,
				(Math.PI * (50 ** 4 - inner ** 4)) / 200
			];
			const kept = releasedFrom(after);
			const top = kept.cells.find(({ box }) => Math.abs(box.top - 50) < 1e-6)!;
			const own = top.plastic[0]!;
			const stress = E * (kept.strain.c - own.c + (kept.strain.z - own.z) * 50);
			expect(stress / fy).toBeCloseTo(plastic / elastic - 1, 6);
			const areas = kept.cells.reduce((sum, { moments }) => sum + moments[0]!, 0);
			expect(areas / kept.mechanics.area).toBeCloseTo(1, 12);
		}
	});

	it('is not followed where the law softens', () => {
		const law: LawDefinition = {
			...{ type: 'curve', beyond: 'zero' },
			tension: [
				[0.00125, 250],
				[0.01, 250]
			]
		};
		const history = historyOf(bar(law));
		expect(history.ok ? null : history.error.code).toBe('law-not-unloaded');
	});
});

describe('a section with a history and nothing in it', () => {
	it('bends as it does without one, whatever its law, axis and axial force', () => {
		const laws: (LawDefinition | undefined)[] = [
			undefined,
			{ type: 'bilinear', Eh: 2000, fu: 320 },
			{ type: 'quad-linear' },
			{
				type: 'curve',
				tension: [
					[0.001, 200],
					[0.004, 240],
					[0.02, 300]
				],
				compression: [
					[0.001, 200],
					[0.003, 260]
				],
				beyond: 'flat'
			}
		];
		for (const law of laws) {
			const tee = sectionOf(
				part('flange', rectangle(-70, 0, 200, 12), steel(fy, { E, ...(law ? { law } : {}) })),
				part('web', rectangle(-5, 12, 9, 170), steel(320, { E, fyc: 280 }))
			);
			const history = historyOf(tee);
			if (!history.ok) throw new Error(history.error.code);
			for (const path of [
				straight,
				{ axisAngle: 35, transverse: 'moment-zero', N: -120 },
				{ axisAngle: 110, transverse: 'curvature-zero', N: 200 }
			] as const) {
				const [plain, own] = [bending(tee, path), bending(tee, path, history.value)];
				expect(own.firstYield.curvature! / plain.firstYield.curvature!).toBeCloseTo(1, 10);
				for (const ratio of [0.5, 1.4, -3, 12]) {
					const curvature = ratio * plain.firstYield.curvature!;
					const [a, c] = [plain.atCurvature(curvature), own.atCurvature(curvature)];
					expect(c.moment! / a.moment!).toBeCloseTo(1, 9);
					expect(c.yieldedShare).toBeCloseTo(a.yieldedShare!, 9);
					expect(c.leverArm! / a.leverArm!).toBeCloseTo(1, 9);
					expect(c.extremes!.stressMax / a.extremes!.stressMax).toBeCloseTo(1, 9);
					expect(c.neutralAxis!.distance).toBeCloseTo(a.neutralAxis!.distance, 7);
				}
			}
		}
	});
});
