import { describe, expect, it } from 'vitest';
import { bending } from '../../src/lib/engine/response/respond';
import { stressPicture } from '../../src/lib/engine/response/yield-fronts';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import examples from './worked-examples.json';

const pt01 = examples.find(({ id }) => id === 'PT01');

describe('Beer & Johnston, Mechanics of Materials, Concept Application 4.5 (from memory)', () => {
	const section = prepareSection({ kind: 'flat', b: 50, h: 120, grade: { fy: 240, E: 200_000 } });
	if (!section.ok) throw new Error('the bar of the example is refused');
	const bent = bending(section.value, { axisAngle: 0, transverse: 'moment-zero', N: 0 });
	const state = bent.atMoment(36.8);

	it('is the example kept beside this test', () => {
		expect(pt01?.inputs).toMatchObject({ b: 50, h: 120, fy: 240, E: 200_000, M_kNm: 36.8 });
		expect(pt01?.expected).toMatchObject({ My_kNm: 28.8, core_mm: 80, radius_m: 33.3 });
	});

	it('first yields at 28.8 kNm', () => expect(bent.firstYield.moment).toBeCloseTo(28.8, 2));

	it('has an elastic core of 80 mm at 36.8 kNm', () => {
		const { e0, ky, kz } = state;
		const { fronts } = stressPicture(section.value, { e0: e0!, ky: ky!, kz: kz! });
		const [a, b] = fronts.map(({ distance }) => distance) as [number, number];
		expect(Math.abs(Math.abs(a - b) - 80)).toBeLessThan(0.1);
	});

	it('has a radius of curvature of 33.3 m there', () =>
		expect(Math.abs(1 / state.curvature! - 33.3)).toBeLessThan(0.05));
});
