import { describe, expect, it } from 'vitest';
import type { ISection, SectionDefinition } from '../section/definition';
import { prepareSection } from '../section/prepare';
import { analyse } from './analyse';
import type { Demand } from './result';

function under(definition: SectionDefinition, ...demands: Demand[]) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return analyse(section.value, { demands });
}

const said = (definition: SectionDefinition, demand: Demand) => under(definition, demand).verdict;

/** Class 1, fy 235: A = 10 600 mm², Mpl = 302.9 kNm, Vpl,z = 1.2 · 2600 · 235/√3 = 423.3 kN. */
const stocky: ISection = {
	kind: 'i',
	fabrication: 'welded',
	h: 300,
	b: 200,
	tw: 10,
	tf: 20,
	grade: 235
};
const Vpl = (1.2 * 2600 * 0.235) / Math.sqrt(3);

describe('an axial force alone', () => {
	it('is answered with the force that may be counted, not with a moment', () => {
		const { sentence, countable, status } = said(stocky, { N: 100 });
		expect(sentence).toBe('Class 1 in tension. Count 2491 kN.');
		expect(countable).toEqual({ moment: null, force: expect.closeTo(2491, 9), basis: null });
		expect(status).toBe('passes');
		expect(said(stocky, { N: -100 }).sentence).toBe('Class 1 in compression. Count 2491 kN.');
	});

	it('counts no moment of a girder that is class 4 in bending: 300·25·2 and 1950·8 of 355', () => {
		const girder: ISection = { ...stocky, h: 2000, b: 300, tw: 8, tf: 25, grade: 355 };
		const { sentence, countable, detail } = said(girder, { N: 100 });
		expect(sentence).toBe('Class 1 in tension. Count 10863 kN.');
		expect(countable.moment).toBeNull();
		expect(detail).toBe('No part is in compression.');
		const tube: SectionDefinition = { kind: 'circular-hollow', d: 1000, t: 5, grade: 355 };
		expect(said(tube, { N: 50 }).countable.moment).toBeNull();
	});

	it('counts nothing in class 4, with holes that it pulls, or when the member may buckle', () => {
		const slender: ISection = { ...stocky, h: 1540, tw: 8, grade: 355 };
		expect(said(slender, { N: -10 }).sentence).toBe(
			'Class 4 in compression. Nothing may be counted yet.'
		);
		const boltHoles = [{ part: 'web', diameter: 22, count: 2 }];
		expect(said({ ...stocky, boltHoles }, { N: 10 }).sentence).toBe(
			'Class 1 in tension. Nothing may be counted: bolt holes in tension are not checked.'
		);
		const long = said(stocky, { N: -10, unbracedLength: 3000 });
		expect(long.sentence).toBe(
			'Class 1 in compression. Nothing may be counted: member buckling is not checked.'
		);
		expect(long.countable.force).toBeNull();
	});
});

describe('a moment that a missing check may reduce', () => {
	it('is not counted beyond half of the plastic shear resistance, whether or not a moment acts', () => {
		for (const My of [0, 50]) {
			const high = said(stocky, { Vz: 0.99 * Vpl, My });
			expect(high.sentence).toBe(
				'Class 1. No moment may be counted: bending with high shear is not checked.'
			);
			expect(high.countable.moment).toBeNull();
			expect(high.ruler.countable).toBeNull();
			expect(said(stocky, { Vz: 0.5 * Vpl, My }).countable.moment).toBeCloseTo(302.915, 6);
		}
	});

	it('is not counted where shear acts and its resistance is missing', () => {
		const thin: ISection = { ...stocky, h: 740, tw: 10 };
		expect(said(thin, { My: 50 }).countable.moment).not.toBeNull();
		for (const My of [0, 50]) {
			const sheared = said(thin, { Vz: 1, My });
			expect(sheared.sentence).toBe(
				'Class 1. No moment may be counted: shear buckling is not checked.'
			);
			expect(sheared.status).toBe('incomplete');
		}
	});

	it('is not counted where an unbraced length calls for lateral–torsional buckling', () => {
		const long = said(stocky, { My: 50, unbracedLength: 5000 });
		expect(long.sentence).toBe(
			'Class 1. No moment may be counted: lateral–torsional buckling is not checked.'
		);
		expect(long.countable.moment).toBeNull();
	});

	it('is said to be without lateral–torsional buckling even when only shear acts, or nothing', () => {
		for (const demand of [{ Vz: 10 }, {}])
			expect(said(stocky, demand).notChecked).toContain('lateral–torsional buckling');
	});

	it('names every check that is missing', () => {
		const both = said(stocky, { My: 50, N: -10, unbracedLength: 5000, Vz: 0.6 * Vpl });
		expect(both.sentence).toBe(
			'Class 1. No moment may be counted: bending with high shear, lateral–torsional buckling and member buckling are not checked.'
		);
	});
});

describe('demands of one name', () => {
	it('are told apart by their place in checks, states and verdict', () => {
		const { demands, resistance, verdict } = under(
			stocky,
			{ name: 'A', My: 10 },
			{ name: 'A', My: 400 },
			{ name: 'A (2)', My: 20 }
		);
		const names = ['A', 'A (2)', 'A (2) (2)'];
		expect(demands.map(({ demand }) => demand)).toEqual(names);
		expect(resistance?.checks.map(({ demand }) => demand)).toEqual(names);
		expect(verdict.demand).toBe('A (2)');
		expect(demands[1]?.utilisation).toBeCloseTo(400 / 302.915, 6);
	});
});

describe('an effect that is nil beside the section', () => {
	it('counts as zero', () => {
		const whole = under(stocky, { My: 100 });
		for (const tiny of [5e-324, -5e-324, 1e-300, 1e-13]) {
			const analysis = under(stocky, { My: 100, N: tiny, Mz: tiny, Vy: tiny, Vz: tiny });
			expect(analysis.verdict).toEqual(whole.verdict);
			expect(analysis.resistance).toEqual(whole.resistance);
		}
	});

	it('never makes a figure without end', () => {
		const effects = [5e-324, -1e-310, 1e-200, -1e-20, 1e-9, 1e9];
		for (const classAlpha of ['actual-N', 'proportional'] as const)
			for (const N of effects)
				for (const My of effects) {
					const section = prepareSection(stocky);
					if (!section.ok) throw new Error('not built');
					const demands = [{ N, My, Mz: My, Vz: N, Vy: My }, { My }, { N }, { Vz: N, My }];
					const analysis = analyse(section.value, { code: { classAlpha }, demands });
					expect(strangers(analysis)).toEqual([]);
				}
	});
});

function strangers(value: unknown, path = ''): string[] {
	if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} ${value}`];
	if (typeof value !== 'object' || value === null) return [];
	return Object.entries(value).flatMap(([key, one]) => strangers(one, `${path}.${key}`));
}
