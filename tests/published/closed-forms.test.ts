import { describe, expect, it } from 'vitest';
import { bending } from '../../src/lib/engine/response/respond';
import { firstYieldMoment } from '../../src/lib/engine/response/first-yield';
import { fullPlastic, plasticMoment } from '../../src/lib/engine/response/plastic';
import {
	circle,
	part,
	polygon,
	rectangle,
	sectionOf,
	steel
} from '../../src/lib/engine/response/test-sections';
import type { PreparedSection } from '../../src/lib/engine/section/prepared';

const fy = 250;
const relative = (value: number, expected: number) => Math.abs(value / expected - 1);
const shapeFactor = (section: PreparedSection) =>
	fullPlastic(section).plasticY / firstYieldMoment(section, 0);

const bar = sectionOf(part('bar', rectangle(30, -70, 40, 120), steel(fy)));
const round = sectionOf(part('bar', { loops: [circle({ y: 5, z: 9 }, 40)] }, steel(fy)));

describe('shape factors in closed form (any text on plastic bending)', () => {
	it('rectangle: 3/2', () => expect(relative(shapeFactor(bar), 1.5)).toBeLessThan(1e-12));

	it('solid circle: 16/3π', () =>
		expect(relative(shapeFactor(round), 16 / (3 * Math.PI))).toBeLessThan(1e-12));

	it('thin tube: 4/π in the limit', () => {
		const centre = { y: 0, z: 0 };
		const tube = sectionOf(
			part('wall', { loops: [circle(centre, 100), circle(centre, 99.999, true)] }, steel(fy))
		);
		expect(relative(shapeFactor(tube), 4 / Math.PI)).toBeLessThan(2e-5);
	});

	it('thick tube: (16/3π)·(1 − k³)/(1 − k⁴)', () => {
		const k = 0.6;
		const centre = { y: 0, z: 0 };
		const tube = sectionOf(
			part('wall', { loops: [circle(centre, 100), circle(centre, 100 * k, true)] }, steel(fy))
		);
		const expected = ((16 / (3 * Math.PI)) * (1 - k ** 3)) / (1 - k ** 4);
		expect(relative(shapeFactor(tube), expected)).toBeLessThan(1e-12);
	});

	it('diamond: 2', () => {
		const diamond = polygon([0, -50], [50, 0], [0, 50], [-50, 0]);
		const section = sectionOf(part('bar', { loops: [diamond] }, steel(fy)));
		expect(relative(shapeFactor(section), 2)).toBeLessThan(1e-12);
	});

	it('triangle: 2.343 (8 − 4√2 exactly)', () => {
		const triangle = polygon([0, 0], [60, 0], [30, 90]);
		const section = sectionOf(part('bar', { loops: [triangle] }, steel(fy)));
		expect(shapeFactor(section)).toBeCloseTo(2.343, 3);
		expect(relative(shapeFactor(section), 8 - 4 * Math.SQRT2)).toBeLessThan(1e-12);
	});
});

describe('rectangle bent beyond first yield', () => {
	const bent = bending(bar, { axisAngle: 0, transverse: 'moment-zero', N: 0 });
	const yieldMoment = (fy * 40 * 120 ** 2) / 6e6;

	it('first yields at b·h²/6·fy', () =>
		expect(relative(bent.firstYield.moment!, yieldMoment)).toBeLessThan(1e-13));

	it.each([1.0001, 1.2, 2, 3.7, 10, 1000])('follows 1.5 − 0.5(κy/κ)² at κ/κy = %f', (ratio) => {
		const state = bent.atCurvature(ratio * bent.firstYield.curvature!);
		expect(relative(state.moment! / yieldMoment, 1.5 - 0.5 / ratio ** 2)).toBeLessThan(1e-13);
		expect(state.yieldedShare).toBeCloseTo(1 - 1 / ratio, 12);
	});

	it.each([0.3, 1, 1.3, 1.49, 1.49999])('is found again from M/My = %f', (share) => {
		const state = bent.atMoment(share * yieldMoment);
		const ratio = share <= 1 ? share : 1 / Math.sqrt(3 - 2 * share);
		expect(state.converged).toBe(true);
		expect(relative(state.curvatureRatio!, ratio)).toBeLessThan(1e-9);
	});

	it('has no state above the full plastic moment', () => {
		const state = bent.atMoment(1.5001 * yieldMoment);
		expect(state.converged).toBe(false);
		expect(state.curvature).toBeNull();
	});

	it.each([-0.9, -0.5, 0, 0.3, 0.99])('has the plastic N–M curve 1 − n² at n = %f', (n) => {
		const N = (n * fy * 40 * 120) / 1e3;
		const { moment } = plasticMoment(bar, { axisAngle: 0, transverse: 'moment-zero', N });
		expect(relative(moment!, 1.5 * yieldMoment * (1 - n * n))).toBeLessThan(1e-12);
	});

	it('solves a 2 κy state under N against the closed form', () => {
		// n below 1 − 1/ratio: both faces yielded; M/Mp = 1 − n² − (1/3)(κy/κ)²
		const n = 0.25;
		const ratio = 4;
		const free = bending(bar, {
			axisAngle: 0,
			transverse: 'moment-zero',
			N: (n * fy * 4800) / 1e3
		});
		const state = free.atCurvature(ratio * bent.firstYield.curvature!);
		const expected = 1.5 * yieldMoment * (1 - n * n - 1 / (3 * ratio * ratio));
		expect(relative(state.moment!, expected)).toBeLessThan(1e-12);
	});
});

describe('round bar', () => {
	it('bends alike about any axis', () => {
		const about = (axisAngle: number) =>
			bending(round, { axisAngle, transverse: 'moment-zero', N: 40 }).atCurvature(0.2).moment!;
		for (const angle of [13, 45, 90, 171.3]) {
			expect(relative(about(angle), about(0))).toBeLessThan(1e-11);
		}
	});
});

describe('hybrid rectangle pair', () => {
	it('first yields in the weaker core when the stronger skin is only a little stronger', () => {
		const soft = part('core', rectangle(-20, -50, 40, 100), steel(200));
		const hard = [
			part('top', rectangle(-20, 50, 40, 10), steel(460)),
			part('bottom', rectangle(-20, -60, 40, 10), steel(460))
		];
		const section = sectionOf(soft, ...hard);
		// core edge at z = 50 reaches 200 first: skin strain at 60 is 240/E < 460/E
		const inertia = (40 * 120 ** 3) / 12;
		expect(relative(firstYieldMoment(section, 0), (200 * inertia) / 50 / 1e6)).toBeLessThan(1e-12);
		const plastic = (200 * 40 * 100 ** 2) / 4 + 2 * 460 * 400 * 55;
		expect(relative(fullPlastic(section).plasticY, plastic / 1e6)).toBeLessThan(1e-13);
	});
});
