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

	it('is that of the effective area in class 4', () => {
		// λp = 150/(28.4·ε·2), both webs halves: 1500·8 web of ρ = (λp − 0.22)/λp², flanges whole.
		const slender: ISection = { ...stocky, h: 1240, tw: 8, grade: 355 };
		const lambda = 150 / (28.4 * Math.sqrt(235 / 355) * 2);
		const area = 8000 + 1200 * 8 * ((lambda - 0.22) / lambda ** 2);
		expect(said(slender, { N: -10 }).countable.force).toBeCloseTo(area * 0.355, 6);
	});

	it('counts the net section of bolt holes: 0.9 · (10600 − 2 · 22 · 10) · 360/1.25', () => {
		const boltHoles = [{ part: 'web', diameter: 22, count: 2 }];
		const net = (0.9 * (10600 - 440) * 0.36) / 1.25;
		const holed = said({ ...stocky, grade: { fy: 235, fu: 360 }, boltHoles }, { N: 10 });
		expect(holed.countable.force).toBeCloseTo(Math.min(net, 2491), 9);
		expect(said({ ...stocky, boltHoles }, { N: 10 }).sentence).toBe(
			'Class 1 in tension. Nothing may be counted: bolt holes are not checked.'
		);
	});

	it('is not counted when the member may buckle', () => {
		const long = said(stocky, { N: -10, unbracedLength: 3000 });
		expect(long.sentence).toBe(
			'Class 1 in compression. Nothing may be counted: member buckling is not checked.'
		);
		expect(long.countable.force).toBeNull();
	});
});

describe('a moment that a missing check may reduce', () => {
	it('is reduced beyond half of the plastic shear resistance, whether or not it acts', () => {
		// 6.2.8(5): [Wpl − ρ (260·10)²/(4·10)] fy with ρ = (2 · 0.9 − 1)².
		const expected = 302.915 - (0.8 ** 2 * 2600 ** 2 * 235e-6) / 40;
		for (const My of [0, 50]) {
			const high = said(stocky, { Vz: 0.9 * Vpl, My });
			expect(high.sentence).toBe('Class 1. Count 277 kNm beside the shear.');
			expect(high.countable.moment).toBeCloseTo(expected, 6);
			expect(said(stocky, { Vz: 0.5 * Vpl, My }).countable.moment).toBeCloseTo(302.915, 6);
		}
	});

	it('is none where the shear alone is too much', () => {
		const over = said(stocky, { Vz: 1.01 * Vpl, My: 1 });
		expect(over.sentence).toBe(
			'Class 1. No moment may be counted: the shear is more than the section resists.'
		);
		expect(over.status).toBe('fails');
	});

	it('ends at lateral–torsional buckling where an unbraced length is given', () => {
		const long = said(stocky, { My: 50, unbracedLength: 5000 });
		expect(long.sentence).toMatch(/, limited by lateral–torsional buckling\.$/);
		expect(long.countable.moment).toBeLessThan(302.9);
		expect(long.notChecked).not.toContain('lateral–torsional buckling');
	});

	it('is said to be without lateral–torsional buckling even when only shear acts, or nothing', () => {
		for (const demand of [{ Vz: 10 }, {}])
			expect(said(stocky, demand).notChecked).toContain('lateral–torsional buckling');
	});

	it('names every check that is missing', () => {
		const both = said(stocky, { My: 50, Mz: 5, N: -10, unbracedLength: 5000 });
		expect(both.sentence).toBe(
			'Class 1. No moment may be counted: lateral–torsional buckling and member buckling are not checked.'
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
		expect([...new Set(resistance?.checks.map(({ demand }) => demand))]).toEqual(names);
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
