import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from './definition';
import { prepareSection } from './prepare';

function messages(definition: SectionDefinition): string[] {
	const result = prepareSection(definition);
	return result.ok ? [] : result.error.map(({ path, message }) => `${path}: ${message}`);
}

const i = {
	kind: 'i',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	fabrication: 'rolled',
	grade: 'S355'
} as const;
const channel = { kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, grade: 'S235' } as const;
const tube = {
	kind: 'rectangular-hollow',
	h: 200,
	b: 100,
	t: 10,
	fabrication: 'hot-finished',
	grade: 'S355'
} as const;
const angle = { kind: 'angle', h: 100, b: 75, t: 10, grade: 'S235' } as const;
const box = {
	kind: 'box',
	h: 800,
	b: 500,
	tw: 12,
	tfTop: 20,
	tfBottom: 25,
	webGap: 400,
	grade: 'S355'
} as const;
const tee = {
	kind: 'tee',
	h: 150,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	fabrication: 'rolled',
	grade: 'S275'
} as const;

const wrong: [string, SectionDefinition, string][] = [
	['a web of no thickness', { ...i, tw: 0 }, 'tw: Web thickness must be greater than 0.'],
	['a negative depth', { ...i, h: -300 }, 'h: Depth must be greater than 0.'],
	['a size that is no number', { ...i, b: Number.NaN }, 'b: Flange width must be a number.'],
	['a size without end', { ...i, h: Infinity }, 'h: Depth must be a number.'],
	[
		'a size below 0.01 mm',
		{ ...i, tw: 0.001 },
		'tw: Web thickness must be at least 0.01 mm, not 0.001.'
	],
	['a size above 100 m', { ...i, h: 200_000 }, 'h: Depth must be at most 100000 mm, not 200000.'],
	[
		'flanges thicker than the depth',
		{ ...i, tf: 150 },
		'tf: Flange thicknesses 150 mm and 150 mm leave no web in a depth of 300 mm.'
	],
	[
		'a web wider than the flange',
		{ ...i, tw: 151 },
		'tw: Web thickness 151 mm must not be more than the flange width 150 mm.'
	],
	[
		'a root radius wider than the outstand',
		{ ...i, r: 72 },
		'r: Root radius 72 mm must not be more than the flange outstand, 71.45 mm.'
	],
	[
		'a root radius deeper than the web',
		{ ...i, h: 60, r: 20 },
		'r: Root radius 20 mm must not be more than half the clear web depth, 19.3 mm.'
	],
	['a negative radius', { ...i, r: -1 }, 'r: Root radius must be 0 or more, not -1.'],
	[
		'a weld that does not fit',
		{ ...i, h: 40, fabrication: 'welded', weldLeg: 10 },
		'weldLeg: Weld leg 10 mm must not be more than half the clear web depth, 9.3 mm.'
	],
	[
		'a leg and a throat that differ',
		{ ...i, fabrication: 'welded', weldLeg: 8, weldThroat: 8 },
		'weldThroat: Give the weld leg or the weld throat: the two do not agree (leg = throat × √2).'
	],
	[
		'a grade for a part it has not',
		{ ...i, partGrades: { leftWeb: 'S235' } },
		'partGrades.leftWeb: The section has no part “leftWeb”; its parts are topFlange, web, bottomFlange.'
	],
	[
		'bolt holes in a part it has not',
		{ ...i, boltHoles: [{ part: 'stem', diameter: 22, count: 2 }] },
		'boltHoles.0.part: The section has no part “stem”; its parts are topFlange, web, bottomFlange.'
	],
	[
		'half a bolt hole',
		{ ...i, boltHoles: [{ part: 'web', diameter: 22, count: 0.5 }] },
		'boltHoles.0.count: Number of bolt holes must be a whole number of 1 or more.'
	],
	[
		'a flange that tapers to nothing',
		{ ...channel, flangeSlopePercent: 40 },
		'flangeSlopePercent: Flange slope leaves no thickness at the toe (-3.5 mm).'
	],
	[
		'a toe radius larger than the toe',
		{ ...channel, rToe: 12 },
		'rToe: Toe radius 12 mm does not fit the flange thickness at the toe, 11.5 mm.'
	],
	[
		'channel radii that meet',
		{ ...channel, r: 60, rToe: 10 },
		'r: Root radius 60 mm and toe radius 10 mm do not fit the flange outstand, 66.5 mm.'
	],
	[
		'a tube wall as thick as half the side',
		{ ...tube, t: 50 },
		't: Wall thickness 50 mm must be less than half the smaller side, 50 mm.'
	],
	[
		'tube corners larger than the side',
		{ ...tube, ro: 51, ri: 0 },
		'ro: Outside corner radius 51 mm must not be more than half the smaller side, 50 mm.'
	],
	[
		'tube corners cut through',
		{ ...tube, ro: 40, ri: 0 },
		'ro: Outside corner radius 40 mm cuts through the inside corner of radius 0 mm at a wall of 10 mm.'
	],
	[
		'a tube wall thicker than its radius',
		{ kind: 'circular-hollow', d: 100, t: 50, grade: 'S355' },
		't: Wall thickness 50 mm must be less than half the diameter, 50 mm.'
	],
	[
		'an angle all thickness',
		{ ...angle, t: 75 },
		't: Thickness 75 mm must be less than the shorter leg, 75 mm.'
	],
	[
		'an angle toe radius above its thickness',
		{ ...angle, rToe: 11 },
		'rToe: Toe radius 11 mm must not be more than the thickness 10 mm.'
	],
	[
		'webs outside the flange',
		{ ...box, webGap: 480 },
		'webGap: Width over the webs, 504 mm, must not be more than the top flange width 500 mm.'
	],
	[
		'a tee that is all flange',
		{ ...tee, tf: 150 },
		'tf: Flange thickness 150 mm must be less than the depth 150 mm.'
	]
];

describe('a definition that cannot be built', () => {
	it.each(wrong)('is refused by field and limit: %s', (_, definition, message) => {
		expect(messages(definition)).toContain(message);
	});

	it('names every field that is wrong at once', () => {
		expect(messages({ ...i, tw: 0, tf: -1, h: Number.NaN })).toHaveLength(3);
	});

	it('is refused when its kind is not known', () => {
		const strange = { ...i, kind: 'star' } as unknown as SectionDefinition;
		expect(messages(strange)).toEqual(['kind: Section kind star is not known.']);
	});

	it('is refused when a size is missing', () => {
		const { h: _, ...rest } = i;
		expect(messages(rest as SectionDefinition)).toEqual(['h: Depth is missing.']);
	});
});

describe('a definition at the limits', () => {
	it.each([
		['0.01 mm', 1e-2 / 10.7],
		['tens of metres', 1e5 / 300]
	])('is built and scales exactly (%s)', (_, scale) => {
		const scaled = {
			...i,
			h: 300 * scale,
			b: 150 * scale,
			tw: 10.7 * scale,
			tf: 10.7 * scale,
			r: 15 * scale,
			grade: 355
		};
		const small = prepareSection(scaled);
		const whole = prepareSection({ ...i, tw: 10.7, grade: 355 });
		if (!small.ok || !whole.ok) throw new Error('not built');
		for (const [key, power] of [
			['area', 2],
			['secondMomentY', 4],
			['plasticModulusZ', 3],
			['torsionConstant', 4],
			['warpingConstant', 6]
		] as const)
			expect(
				Number(small.value.gross[key]) / Number(whole.value.gross[key]) / scale ** power
			).toBeCloseTo(1, 12);
	});

	it('may be round all the way: an obround tube, toe arcs as deep as the toe', () => {
		expect(messages({ ...tube, ro: 50, ri: 40 })).toEqual([]);
		expect(messages({ ...channel, rToe: 11.5 })).toEqual([]);
		expect(messages({ ...angle, rToe: 10 })).toEqual([]);
	});
});
