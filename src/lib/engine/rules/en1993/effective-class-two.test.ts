import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import type { SectionDefinition } from '../../section/definition';
import type { AxisSense } from '../section-moments';
import { effectiveClassTwo, effectiveClassTwoWorking } from './effective-class-two';
import { pureCases } from './model';
import { testModel } from './test-model';

/** A level rectangle: width b between heights low and high, mm, at strength f. */
interface Band {
	b: number;
	low: number;
	high: number;
	f: number;
}

/** What 6.2.2.4 is worked out from: bands, and the clear web that loses its middle. */
interface Shape {
	bands: Band[];
	web: { b: number; low: number; high: number; f: number; t: number };
	epsilon: number;
}

/**
 * Independent of the product: for an axis tried, take away the gap, sum compression less tension,
 * and close in by halving; then the moment about that axis (equal forces, any axis will do).
 */
function halvedMoment({ bands, web, epsilon }: Shape, up: boolean): number {
	const turn = ({ low, high, ...rest }: Band): Band => ({ ...rest, low: -high, high: -low });
	const all = up ? bands : bands.map(turn);
	const [low, high] = up ? [web.low, web.high] : [-web.high, -web.low];
	const strip = 20 * epsilon * web.t;
	const effective = (axis: number) =>
		axis + strip < high - strip
			? [...all, { b: -web.b, low: axis + strip, high: high - strip, f: web.f }]
			: all;
	const force = (axis: number) =>
		effective(axis).reduce((sum, { b, low: z1, high: z2, f }) => {
			const cut = Math.min(Math.max(axis, z1), z2);
			return sum + b * f * (z2 - cut - (cut - z1));
		}, 0);
	let [from, to] = [low, high];
	for (let i = 0; i < 200; i++) {
		const middle = (from + to) / 2;
		if (force(middle) > 0) from = middle;
		else to = middle;
	}
	const axis = (from + to) / 2;
	const moment = effective(axis).reduce((sum, { b, low: z1, high: z2, f }) => {
		const cut = Math.min(Math.max(axis, z1), z2);
		return (
			sum +
			(b * f * ((z2 - axis) ** 2 - (cut - axis) ** 2 + (axis - z1) ** 2 - (axis - cut) ** 2)) / 2
		);
	}, 0);
	return moment * 1e-6;
}

const plain: SectionDefinition = {
	kind: 'i',
	fabrication: 'welded',
	h: 640,
	b: 200,
	tf: 20,
	tw: 6,
	weldLeg: 0,
	grade: 275
};

function found(definition: SectionDefinition, sense: AxisSense = 'plusMy') {
	const model = testModel(definition);
	return effectiveClassTwo(model, sense, pureCases(model)[sense]);
}

const bandsI = (h: number, flanges: [number, number, number][], tw: number, fw: number): Band[] => {
	const [[bt, tt, ft], [bb, tb, fb]] = flanges as [
		[number, number, number],
		[number, number, number]
	];
	return [
		{ b: bt, low: h - tt, high: h, f: ft },
		{ b: tw, low: tb, high: h - tt, f: fw },
		{ b: bb, low: 0, high: tb, f: fb }
	];
};

const epsilonOf = (fy: number) => Math.sqrt(235 / fy);

const mono: SectionDefinition = { ...plain, tf: 22, bBottom: 260, tfBottom: 18, weldLeg: 5 };
const hybrid: SectionDefinition = {
	...mono,
	tw: 6.5,
	partGrades: { topFlange: 355, bottomFlange: 355, web: 275 }
};
const box: SectionDefinition = {
	kind: 'box',
	h: 640,
	b: 260,
	tfTop: 20,
	tfBottom: 20,
	tw: 7,
	webGap: 220,
	grade: 275
};
const tube: SectionDefinition = {
	kind: 'rectangular-hollow',
	fabrication: 'cold-formed',
	h: 450,
	b: 120,
	t: 5,
	ro: 5,
	ri: 0,
	grade: 355
};
const channel: SectionDefinition = { kind: 'channel', h: 400, b: 60, tw: 4.5, tf: 8, grade: 355 };

const monoBands = (ff: number, tw: number): Shape => ({
	bands: bandsI(
		640,
		[
			[200, 22, ff],
			[260, 18, ff]
		],
		tw,
		275
	),
	web: { b: tw, low: 23, high: 613, f: 275, t: tw },
	epsilon: epsilonOf(ff)
});

describe('class 3 web as effective class 2, against a halving of its own', () => {
	it.each<[string, SectionDefinition, AxisSense, Shape]>([
		['unequal flanges, +My', mono, 'plusMy', monoBands(275, 6)],
		['unequal flanges, −My', mono, 'minusMy', monoBands(275, 6)],
		['hybrid, +My', hybrid, 'plusMy', monoBands(355, 6.5)],
		['hybrid, −My', hybrid, 'minusMy', monoBands(355, 6.5)],
		[
			'box',
			box,
			'plusMy',
			{
				bands: bandsI(
					640,
					[
						[260, 20, 275],
						[260, 20, 275]
					],
					14,
					275
				),
				web: { b: 14, low: 20, high: 620, f: 275, t: 7 },
				epsilon: epsilonOf(275)
			}
		],
		[
			'channel',
			channel,
			'plusMy',
			{
				bands: bandsI(
					400,
					[
						[60, 8, 355],
						[60, 8, 355]
					],
					4.5,
					355
				),
				web: { b: 4.5, low: 8, high: 392, f: 355, t: 4.5 },
				epsilon: epsilonOf(355)
			}
		]
	])('%s', (_name, definition, sense, shape) => {
		const taken = found(definition, sense);
		expect(taken.kind).toBe('taken');
		const expected = halvedMoment(shape, sense === 'plusMy');
		if (taken.kind === 'taken') expect(taken.moment / expected).toBeCloseTo(1, 10);
	});

	it('of a rectangular tube takes both walls along the depth, about either axis', () => {
		const lying: SectionDefinition = { ...tube, h: 120, b: 450 };
		const upright = found(tube, 'plusMy');
		const across = found(lying, 'plusMz');
		const corner = (1 - Math.PI / 4) * 25;
		const lever = 225 - (5 * (10 - 3 * Math.PI)) / (12 - 3 * Math.PI);
		const shape: Shape = {
			bands: bandsI(
				450,
				[
					[120, 5, 355],
					[120, 5, 355]
				],
				10,
				355
			),
			web: { b: 10, low: 5, high: 445, f: 355, t: 5 },
			epsilon: epsilonOf(355)
		};
		// The rounded corners are taken off by hand: four spandrels at their own levers.
		const expected = halvedMoment(shape, true) - 4 * corner * 355 * (lever - 0) * 1e-6;
		expect(upright.kind).toBe('taken');
		if (upright.kind !== 'taken' || across.kind !== 'taken') throw new Error('not taken');
		expect(upright.moment / expected).toBeCloseTo(1, 10);
		expect(across.moment).toBeCloseTo(upright.moment, 9);
	});
});

describe('its plastic neutral axis', () => {
	it('is that of the effective section: 40ε tw of web in tension between equal flanges', () => {
		const taken = found(plain);
		if (taken.kind !== 'taken') throw new Error('not taken');
		const kept = 40 * epsilonOf(275) * 6;
		expect(taken.kept).toBeCloseTo(kept, 10);
		expect(taken.compressed).toBeCloseTo(600 - kept, 8);
	});

	it('leaves nothing out where no more than 40ε tw is compressed', () => {
		// All but the last 41.5ε of class 2: a web with its compressed depth just over that of class 2.
		const taken = found({ ...plain, h: 40 + 6 * 83 * epsilonOf(275) + 0.01 });
		if (taken.kind !== 'taken') throw new Error('not taken');
		expect(taken.removed).toBeCloseTo(2 * (41.5 - 40) * epsilonOf(275) * 6, 1);
	});
});

describe('where the rule does not reach', () => {
	it('is a class 2 or class 4 web, a class 3 flange, and bending that no web follows', () => {
		expect(found({ ...plain, tw: 10 }).kind).toBe('not-applicable');
		expect(found({ ...plain, tw: 4 }).kind).toBe('not-applicable');
		expect(found({ ...plain, tf: 8 }).kind).toBe('not-applicable');
		expect(found(plain, 'plusMz').kind).toBe('not-applicable');
	});

	it('refuses a channel whose flanges differ, since a moment across its web would be left', () => {
		const uneven: SectionDefinition = { ...channel, partGrades: { topFlange: 300 } };
		const model = testModel(uneven);
		const rows = pureCases(testModel(channel)).plusMy;
		expect(effectiveClassTwo(model, 'plusMy', rows).kind).toBe('refused');
	});
});

describe('its working', () => {
	it.each([plain, mono, hybrid, box, tube, channel])(
		'gives the moment over γM0: %#',
		(definition) => {
			const taken = found(definition);
			if (taken.kind !== 'taken') throw new Error('not taken');
			const { formula, inputs, result, clause } = effectiveClassTwoWorking(
				taken,
				1.1,
				'EN 1993-1-1:2005'
			);
			const value = formulaValue(formula, inputs);
			expect(value.ok && value.value / result.value).toBeCloseTo(1, 12);
			expect(result.value).toBeCloseTo(taken.moment / 1.1, 10);
			expect(clause).toBe('EN 1993-1-1:2005 6.2.2.4');
		}
	);
});
