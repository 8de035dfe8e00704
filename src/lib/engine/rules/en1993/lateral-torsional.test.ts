import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import type { ISection, SectionDefinition } from '../../section/definition';
import type { CodeChoice, Demand } from '../result';
import { lateralTorsional } from './lateral-torsional';
import {
	generalReduction,
	lateralCurve,
	momentShapeFactor,
	rolledReduction
} from './lateral-torsional-curve';
import { asymmetry, criticalMoment, momentShape } from './lateral-torsional-moment';
import { testModel } from './test-model';

const E = 210_000;
const ipe: ISection = {
	kind: 'i',
	fabrication: 'rolled',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	grade: 235
};

function judged(definition: SectionDefinition, demand: Demand, code: Partial<CodeChoice> = {}) {
	const model = testModel(definition, code);
	const sense = (demand.My ?? 0) < 0 ? 'minusMy' : 'plusMy';
	const Mk = model.moments[sense].plastic.moment!;
	return { model, Mk, ...lateralTorsional(model, demand, 'one', Mk) };
}

const long = (more: Demand = {}): Demand => ({ My: 50, unbracedLength: 6000, ...more });

describe('elastic critical moment', () => {
	const stiffness = { E, G: E / 2.6, Iz: 6e6, It: 2e5, Iw: 1.3e11, zj: 0 };
	const uniform = { C1: 1, C2: 0, zg: 0 };

	it('is π√(EIz GIt)/L without warping, π²E√(Iz Iw)/L² without torsion (Timoshenko & Gere)', () => {
		const pure = criticalMoment({ ...stiffness, Iw: 0 }, uniform, 5000);
		expect(pure / ((Math.PI / 5000) * Math.sqrt(E * 6e6 * (E / 2.6) * 2e5) * 1e-6)).toBeCloseTo(
			1,
			12
		);
		const warped = criticalMoment({ ...stiffness, It: 0 }, uniform, 5000);
		const closed = (Math.PI / 5000) ** 2 * E * Math.sqrt(6e6 * 1.3e11) * 1e-6;
		expect(warped / closed).toBeCloseTo(1, 12);
	});

	it('solves the quadratic of a beam with one axis of symmetry, (M² − 2 zj Pz M = Pz(…)), in both senses', () => {
		// Galambos: M² = Pz(GIt + π²EIw/L² + 2 zj M), with Pz the Euler load about z
		const Pz = (Math.PI ** 2 * E * 6e6) / 5000 ** 2;
		const twist = (E / 2.6) * 2e5 + (Math.PI / 5000) ** 2 * E * 1.3e11;
		for (const zj of [-120, 0, 120]) {
			const M = criticalMoment({ ...stiffness, zj }, uniform, 5000) * 1e6;
			expect(M ** 2 / (Pz * (twist + 2 * zj * M))).toBeCloseTo(1, 9);
		}
	});

	it('falls with a load on top, and takes no gain from one below', () => {
		const at = (zg: number) => judged(ipe, long({ C1: 1.13, zg })).value!.Mcr;
		expect(at(150)).toBeLessThan(at(0));
		expect(at(-150)).toBe(at(0));
		expect(momentShape({ C1: 1.13, zg: 150 })).toEqual({ C1: 1.13, C2: 0.45, zg: 150 });
		expect(momentShape({ C1: 1.35, zg: 150 })?.C2).toBe(0.63);
	});

	it('is not given for a load on top whose C2 is not known', () => {
		const { value, notes } = judged(ipe, long({ zg: 150 }));
		expect(value).toBeNull();
		expect(notes.map(({ code }) => code)).toEqual(['ltb-not-covered']);
	});

	it('counts no C1 above 2.7', () => {
		expect(judged(ipe, long({ C1: 9 })).value!.Mcr).toBe(judged(ipe, long({ C1: 2.7 })).value!.Mcr);
	});
});

describe('asymmetry zj of an I', () => {
	const uneven: ISection = { ...ipe, fabrication: 'welded', r: 0, b: 200, bBottom: 100 };

	it('is nothing for equal flanges, and turns its sign over with the section', () => {
		expect(asymmetry(testModel(ipe).section)).toBe(0);
		const up = asymmetry(testModel(uneven).section);
		const down = asymmetry(testModel({ ...uneven, b: 100, bBottom: 200 }).section);
		expect(up).toBeGreaterThan(0);
		expect(down / up).toBeCloseTo(-1, 9);
	});

	it('agrees with an integral over small squares', () => {
		const { section } = testModel(uneven);
		const { centroid, shearCentre, secondMomentY } = section.gross;
		let third = 0;
		const strips = [
			{ b: 200, low: 289.3, high: 300 },
			{ b: 7.1, low: 10.7, high: 289.3 },
			{ b: 100, low: 0, high: 10.7 }
		];
		for (const { b, low, high } of strips)
			for (let m = 0; m < 400; m++)
				for (let n = 0; n < 100; n++) {
					const z = low + ((high - low) * (m + 0.5)) / 400 - centroid.z;
					const y = (b * (n + 0.5)) / 100 - b / 2;
					third += z * (y * y + z * z) * (((high - low) / 400) * (b / 100));
				}
		const expected = shearCentre!.z - centroid.z - third / (2 * secondMomentY);
		expect(asymmetry(section) / expected).toBeCloseTo(1, 3);
	});

	it('counts against the member always, in its favour only under a moment said to be uniform', () => {
		const Mcr = (demand: Demand) => judged(uneven, long(demand)).value!.Mcr;
		expect(Mcr({ C1: 1 })).toBeGreaterThan(Mcr({}));
		expect(Mcr({ My: -50, C1: 1 })).toBe(Mcr({ My: -50 }));
		expect(Mcr({ My: -50 })).toBeLessThan(Mcr({}));
		// 2.5: the moment changes its sense, so both senses stand for the worse
		expect(Mcr({ C1: 2.5 })).toBe(Mcr({ My: -50, C1: 2.5 }));
	});
});

describe('curves and reductions of 6.3.2', () => {
	it('rolled a to h/b 2, b above; welded c, d; others d (Table 6.4)', () => {
		const curve = (h: number, fabrication: 'rolled' | 'welded') =>
			lateralCurve({ ...ipe, h, fabrication }, 'general').curve;
		expect([curve(300, 'rolled'), curve(300.1, 'rolled')]).toEqual(['a', 'b']);
		expect([curve(300, 'welded'), curve(300.1, 'welded')]).toEqual(['c', 'd']);
		expect(lateralCurve({ kind: 'round', d: 10, grade: 235 }, 'rolled-or-equivalent')).toEqual({
			curve: 'd',
			method: 'general'
		});
	});

	it('rolled b and c, welded c and d by Table 6.5', () => {
		const curve = (h: number, fabrication: 'rolled' | 'welded') =>
			lateralCurve({ ...ipe, h, fabrication }, 'rolled-or-equivalent').curve;
		expect([curve(300, 'rolled'), curve(300.1, 'rolled')]).toEqual(['b', 'c']);
		expect([curve(300, 'welded'), curve(300.1, 'welded')]).toEqual(['c', 'd']);
	});

	it.each([
		// the European buckling curves as tabulated by ECCS, Manual on Stability of Steel Structures, λ = 1.0 (from memory)
		['a', 0.6656],
		['b', 0.597],
		['c', 0.5399],
		['d', 0.4671]
	] as const)('curve %s reduces to %d at λ 1.0', (curve, expected) => {
		expect(generalReduction(1, curve)).toBeCloseTo(expected, 3);
	});

	it('is 1 up to the plateau and continuous there', () => {
		expect(generalReduction(0.2, 'd')).toBe(1);
		expect(generalReduction(0.2 + 1e-9, 'd')).toBeCloseTo(1, 7);
		expect(rolledReduction(0.4, 'c')).toBe(1);
		expect(rolledReduction(0.4 + 1e-9, 'c')).toBeCloseTo(1, 7);
		expect(rolledReduction(3, 'b')).toBeLessThanOrEqual(1 / 9);
	});

	it('f is 1 for a uniform moment and lowest at λ 0.8', () => {
		expect(momentShapeFactor(0.8, 1)).toBe(1);
		expect(momentShapeFactor(0.8, 1.77)).toBeCloseTo(1 - 0.5 * (1 - 1 / Math.sqrt(1.77)), 12);
		expect(momentShapeFactor(3, 1.77)).toBe(1);
	});
});

describe('resistance to lateral–torsional buckling', () => {
	it('is the moment itself for a short length, falls with length, and nears Mcr', () => {
		let before = Infinity;
		for (const unbracedLength of [200, 2000, 4000, 8000, 16000, 50000]) {
			const { value, Mk } = judged(ipe, long({ unbracedLength }));
			expect(value!.MbRd).toBeLessThanOrEqual(Math.min(Mk, value!.Mcr) * (1 + 1e-12));
			expect(value!.MbRd).toBeLessThanOrEqual(before);
			before = value!.MbRd;
		}
		expect(judged(ipe, long({ unbracedLength: 200 })).value!.chi).toBe(1);
	});

	it('6.3.2.3 gives more than 6.3.2.2 under a moment that falls, and its χ stays within 1 and 1/λ²', () => {
		const demand = long({ C1: 1.77, unbracedLength: 4000 });
		const general = judged(ipe, demand).value!;
		const rolled = judged(ipe, demand, { ltbCurves: 'rolled-or-equivalent' }).value!;
		expect(rolled.clause).toContain('6.3.2.3');
		expect(rolled.MbRd).toBeGreaterThan(general.MbRd);
		expect(rolled.chi).toBeLessThanOrEqual(Math.min(1, 1 / rolled.lambda ** 2));
	});

	it('2022: the general curves with a note that the rule is from memory', () => {
		const { value, notes } = judged(ipe, long(), {
			standard: 'EN1993-1-1:2022',
			ltbCurves: 'rolled-or-equivalent'
		});
		expect(value!.method).toBe('general');
		expect(value!.clause).toContain('2022');
		expect(notes.map(({ code }) => code)).toContain('rule-from-memory');
	});

	it('closed sections lose next to nothing about their stronger axis, and do not buckle about the other', () => {
		const tube = {
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: 200,
			b: 100,
			t: 10,
			grade: 235
		} as const;
		expect(judged(tube, long({ unbracedLength: 2000 })).value!.chi).toBeGreaterThan(0.9);
		const weak = judged(tube, { Mz: 10, unbracedLength: 2000 });
		expect(weak).toMatchObject({ applies: false, value: null });
	});

	it('a channel takes curve d and the load through its shear centre', () => {
		const { value, notes } = judged(
			{ kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, grade: 235 },
			long()
		);
		expect(value!.curve).toBe('d');
		expect(notes[0]!.message).toContain('shear centre, beside the web');
	});

	it.each([
		[
			'a tee',
			{ kind: 'tee', fabrication: 'rolled', h: 150, b: 150, tw: 8, tf: 12, r: 12, grade: 235 },
			{ My: 5 }
		],
		['an angle', { kind: 'angle', h: 90, b: 90, t: 9, grade: 235 }, { Mz: 5 }],
		['a flat bar on edge', { kind: 'flat', b: 20, h: 100, grade: 235 }, { My: 5 }]
	] as const)('%s has no figure but a note', (_, definition, moments) => {
		const { applies, value, notes } = judged(definition, { ...moments, unbracedLength: 3000 });
		expect({ applies, value }).toEqual({ applies: true, value: null });
		expect(notes.map(({ code }) => code)).toEqual(['ltb-not-covered']);
	});

	it('is not asked without a length, nor of round bars', () => {
		expect(judged(ipe, { My: 50 }).applies).toBe(false);
		expect(judged({ kind: 'round', d: 50, grade: 235 }, long()).applies).toBe(false);
	});

	it('scales with the cube of the section’s size', () => {
		const large: ISection = { ...ipe, h: 3000, b: 1500, tw: 71, tf: 107, r: 150, grade: 235 };
		const [a, b] = [judged(large, long({ unbracedLength: 60000 })), judged(ipe, long())];
		expect(a.value!.MbRd / b.value!.MbRd).toBeCloseTo(1000, 4);
	});

	it.each(['general', 'rolled-or-equivalent'] as const)(
		'%s: workings give their own results again',
		(ltbCurves) => {
			for (const demand of [
				long({ C1: 1.13, zg: 150 }),
				long({ unbracedLength: 300 }),
				long({ C1: 2.2 })
			]) {
				const { model } = judged({ ...ipe, bBottom: 120 }, demand, { ltbCurves });
				const entries = Object.entries(model.workings.explanation()).filter(([key]) =>
					/^reduced/.test(key)
				);
				expect(entries.map(([key]) => key).sort()).toEqual(
					['Mcr', 'MbRd', 'chiLT', 'lambdaLT'].map((figure) => `reduced.one.${figure}`).sort()
				);
				for (const [key, { formula, inputs, result }] of entries) {
					const found = formulaValue(formula, inputs);
					expect(found.ok && found.value / result.value, `${key}: ${formula}`).toBeCloseTo(1, 9);
				}
			}
		}
	);
});
