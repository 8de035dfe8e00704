import { describe, expect, it } from 'vitest';
import type { ISection, SectionDefinition } from '../../../section/definition';
import { testModel } from '../test-model';
import { flangesMoment, flangesWithWebMoment } from './flange-moments';

const girder: ISection = {
	kind: 'i',
	fabrication: 'welded',
	h: 1540,
	b: 400,
	tf: 20,
	tw: 10,
	weldLeg: 6,
	grade: 345
};

describe('flangesMoment', () => {
	// Af fyf (h − tf) by hand; EN 1993-1-5 5.4(2)
	it('is the flange force over the distance between the flanges: 8000 · 345 · 1520', () => {
		const found = flangesMoment(testModel(girder), 'plusMy')!;
		expect(found.value).toBeCloseTo(8000 * 345 * 1520 * 1e-6, 6);
		expect(flangesMoment(testModel(girder, { gammaM0: 1.1 }), 'plusMy')!.value).toBeCloseTo(
			(8000 * 345 * 1520 * 1e-6) / 1.1,
			6
		);
	});

	it('falls with N of either sign as 1 − N/ΣAf fyf, to nothing', () => {
		const model = testModel(girder);
		const free = flangesMoment(model, 'plusMy')!.value;
		const N = 0.25 * 2 * 8000 * 345 * 1e-3;
		expect(flangesMoment(model, 'plusMy', N)!.value).toBeCloseTo(0.75 * free, 6);
		expect(flangesMoment(model, 'plusMy', -N)!.value).toBeCloseTo(0.75 * free, 6);
		expect(flangesMoment(model, 'plusMy', -5 * N)!.value).toBe(0);
	});

	it('takes the weaker flange, each with its own strength', () => {
		const uneven = { ...girder, bBottom: 300, tfBottom: 16, partGrades: { bottomFlange: 460 } };
		const found = flangesMoment(testModel(uneven), 'plusMy')!;
		const force = Math.min(8000 * 345, 4800 * 460);
		expect(found.value).toBeCloseTo(force * (1540 - 18) * 1e-6, 6);
	});

	it('takes a slender compressed flange by its effective width, a pulled one whole', () => {
		const wide = { ...girder, b: 700, tf: 14, bBottom: 400, tfBottom: 30 };
		const model = testModel(wide);
		const outstand = 345 - 6;
		const slenderness = outstand / 14 / (28.4 * Math.sqrt((235 / 345) * 0.43));
		const rho = (slenderness - 0.188) / slenderness ** 2;
		const effective = (700 - 2 * (1 - rho) * outstand) * 14;
		expect(flangesMoment(model, 'plusMy')!.compression).toBeCloseTo(effective * 345, 3);
		expect(flangesMoment(model, 'minusMy')!.tension).toBeCloseTo(9800 * 345, 6);
		expect(flangesMoment(model, 'minusMy', -1)!.tension).toBeCloseTo(effective * 345, 3);
	});
});

describe('flangesWithWebMoment', () => {
	// EN 1993-1-5 7.1(1): the web whole although it is class 4
	it('adds the whole web: Mf + tw hw² fy/4', () => {
		const expected = (8000 * 345 * 1520 + (10 * 1500 ** 2 * 345) / 4) * 1e-6;
		expect(flangesWithWebMoment(testModel(girder), 'plusMy')!).toBeCloseTo(expected, 6);
		expect(flangesWithWebMoment(testModel(girder), 'minusMy')!).toBeCloseTo(expected, 6);
	});

	// N in the web's middle, depth n = N/(tw fy): Mpl − tw fy n²/4
	it('falls with N by the moment of the web that carries it', () => {
		const free = flangesWithWebMoment(testModel(girder), 'plusMy')!;
		const N = 1000;
		const depth = (N * 1e3) / (10 * 345);
		const expected = free - ((10 * 345 * depth ** 2) / 4) * 1e-6;
		expect(flangesWithWebMoment(testModel(girder), 'plusMy', -N)!).toBeCloseTo(expected, 6);
		expect(flangesWithWebMoment(testModel(girder), 'plusMy', N)!).toBeCloseTo(expected, 6);
	});

	it('takes a slender compressed flange by its effective width', () => {
		const wide = { ...girder, b: 700, tf: 14 };
		const model = testModel(wide);
		const { compression, tension } = flangesMoment(model, 'plusMy')!;
		const shift = (tension - compression) / (2 * 10 * 345);
		const hw = 1512;
		// axis lowered by `shift` from the middle of the web
		const web = 10 * 345 * (hw ** 2 / 4 - shift ** 2);
		const expected = ((compression + tension) * 763 + web) * 1e-6;
		expect(flangesWithWebMoment(model, 'plusMy')!).toBeCloseTo(expected, 4);
	});

	it('is no rule for other kinds', () => {
		const tee: SectionDefinition = {
			kind: 'tee',
			fabrication: 'welded',
			h: 300,
			b: 200,
			tw: 8,
			tf: 12,
			grade: 'S355'
		};
		expect(flangesMoment(testModel(tee), 'plusMy')).toBeNull();
		expect(flangesWithWebMoment(testModel(tee), 'plusMy')).toBeNull();
	});
});
