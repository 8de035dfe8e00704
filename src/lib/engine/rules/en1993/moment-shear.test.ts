import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import type { ISection, SectionDefinition } from '../../section/definition';
import type { AxisSense } from '../section-moments';
import type { SectionClass } from '../result';
import { flangesMoment } from './effective/flange-moments';
import { momentUnderShear, shearedMechanics, shearLoss } from './moment-shear';
import { shearResistances } from './shear-resistance';
import { testModel } from './test-model';
import { webShearInteraction } from './web-shear-interaction';

const stocky: ISection = {
	kind: 'i',
	fabrication: 'welded',
	h: 540,
	b: 200,
	tw: 12,
	tf: 20,
	grade: 355
};

function under(
	definition: SectionDefinition,
	share: number,
	{ sense = 'plusMy' as AxisSense, overall = 1 as SectionClass } = {}
) {
	const model = testModel(definition);
	const shears = shearResistances(model, true);
	const shear = sense.endsWith('My') ? shears.z : shears.y;
	const limits = model.moments[sense];
	const value = overall <= 2 ? limits.plastic.moment! : limits.firstYield!;
	const V = share * (shear!.buckling?.Vbw ?? shear!.plastic);
	const found = momentUnderShear(model, sense, { value, overall }, V, shear, 'one');
	return { ...found, Mc: value, model, shear: shear! };
}

describe('bending with shear, EN 1993-1-1:2005 6.2.8', () => {
	it('is not touched up to half of Vpl, and is by one step more', () => {
		expect(under(stocky, 0.5)).toMatchObject({ rho: 0, by: null });
		expect(under(stocky, 0.5).MyVRd).toBe(under(stocky, 0.5).Mc);
		expect(under(stocky, 0.51).rho).toBeCloseTo(0.0004, 12);
		expect(under(stocky, 0.51).MyVRd).toBeLessThan(under(stocky, 0.51).Mc);
	});

	it('leaves the flanges alone at Vpl: 355·200·20·520', () => {
		expect(under(stocky, 1).MyVRd).toBeCloseTo(355 * 200 * 20 * 520 * 1e-6, 8);
		expect(under(stocky, 1.2).MyVRd).toBeCloseTo(355 * 200 * 20 * 520 * 1e-6, 8);
	});

	it('gives the closed form of equal flanges by the block of a hybrid too: flanges + (1 − ρ)fyw tw hw²/4', () => {
		const hybrid = { ...stocky, partGrades: { web: 275 } };
		const { MyVRd, rho, by } = under(hybrid, 0.8);
		expect(by).toBe('block');
		expect(rho).toBeCloseTo(0.36, 12);
		const expected = 355 * 200 * 20 * 520 + ((1 - 0.36) * 275 * 12 * 500 ** 2) / 4;
		expect(MyVRd! / (expected * 1e-6)).toBeCloseTo(1, 12);
	});

	it('agrees between the closed form and the block of a welded I of one steel', () => {
		const { model, MyVRd, shear, by } = under(stocky, 0.8);
		expect(by).toBe('equal-flanges');
		const { squash } = shearedMechanics(model, [{ shear, rho: 0.36 }]);
		expect(squash).toBeCloseTo(355 * (2 * 200 * 20 + 0.64 * 12 * 500), 4);
		const flanges = 355 * 200 * 20 * 520;
		expect(MyVRd! / ((flanges + (0.64 * 355 * 12 * 500 ** 2) / 4) * 1e-6)).toBeCloseTo(1, 12);
	});

	it('takes (1 − ρ) of everything from a solid bar', () => {
		const { MyVRd, Mc } = under({ kind: 'flat', b: 40, h: 100, grade: 235 }, 0.75);
		expect(MyVRd! / Mc).toBeCloseTo(0.75, 12);
	});

	it('takes ρ Av²/(8t) from a rectangular tube, nearly its two webs at Vpl', () => {
		const tube = {
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: 200,
			b: 100,
			t: 8,
			ro: 12,
			ri: 8,
			grade: 355
		} as const;
		const { MyVRd, model } = under(tube, 1);
		const { area, plasticModulusY } = model.section.gross;
		const Av = (area * 200) / 300;
		expect(MyVRd! / ((plasticModulusY - Av ** 2 / 64) * 355e-6)).toBeCloseTo(1, 12);
		// webs of 200 − 8 between the flanges' middles would leave 355·100·8·192 at most
		expect(MyVRd!).toBeLessThan(355 * 100 * 8 * 192 * 1e-6);
	});

	it('class 3: between the flanges alone and Mc, never more than either way of counting', () => {
		const { MyVRd, Mc, model } = under(stocky, 0.9, { overall: 3 });
		const Mf = flangesMoment(model, 'plusMy')!.value;
		expect(MyVRd! / (0.64 * Mf + 0.36 * Mc)).toBeCloseTo(1, 12);
		expect(MyVRd!).toBeLessThan(under(stocky, 0.9).MyVRd!);
		expect(under(stocky, 1, { overall: 3 }).MyVRd).toBeCloseTo(Math.min(Mf, Mc), 9);
	});

	it.each([
		['an I', stocky, 'plusMy'],
		['an I about z', stocky, 'plusMz'],
		['an uneven I', { ...stocky, bBottom: 300 }, 'minusMy'],
		[
			'a tee',
			{ kind: 'tee', fabrication: 'rolled', h: 150, b: 150, tw: 8, tf: 12, r: 12, grade: 235 },
			'plusMy'
		],
		[
			'a channel',
			{ kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, grade: 355 },
			'plusMy'
		],
		['an angle', { kind: 'angle', h: 90, b: 90, t: 9, r: 10, grade: 235 }, 'plusMy'],
		['a round tube', { kind: 'circular-hollow', d: 200, t: 8, grade: 355 }, 'plusMy']
	] as const)(
		'%s: never rises with V, never above Mc, and has no jump at half',
		(_, definition, sense) => {
			let before = Infinity;
			for (let share = 0.3; share <= 1.05; share += 0.05) {
				const { MyVRd, Mc } = under(definition, share, { sense });
				expect(MyVRd!).toBeLessThanOrEqual(Mc);
				expect(MyVRd!).toBeLessThanOrEqual(before * (1 + 1e-12));
				expect(MyVRd!).toBeGreaterThanOrEqual(0);
				before = MyVRd!;
			}
			const { MyVRd, Mc } = under(definition, 0.5001, { sense });
			expect(MyVRd! / Mc).toBeCloseTo(1, 6);
		}
	);

	it('turned over, an uneven I keeps its moment in the opposite sense', () => {
		const up = under({ ...stocky, bBottom: 300, tfBottom: 15 }, 0.8).MyVRd!;
		const down = under({ ...stocky, b: 300, tf: 15, bBottom: 200, tfBottom: 20 }, 0.8, {
			sense: 'minusMy'
		});
		expect(down.MyVRd! / up).toBeCloseTo(1, 12);
	});

	it('ρ is 0 up to half and 1 from Vpl on', () => {
		expect([0.5, 0.75, 1, 3].map((V) => shearLoss(V, 1))).toEqual([0, 0.25, 1, 1]);
	});
});

const slender: ISection = { ...stocky, h: 1540, b: 400, tw: 8 };

describe('bending with shear in a web that may buckle, EN 1993-1-5 7.1', () => {
	// Mf = 355·400·20·1520 of effective flanges: c/tε = 196/20/0.8136 = 12.0, under 14.3 (λp 0.748): whole
	const Mf = 355 * 400 * 20 * 1520 * 1e-6;
	const Mpl = Mf + ((355 * 8 * 1500 ** 2) / 4) * 1e-6;
	const at = (M: number, share: number, N = 0) => {
		const model = testModel(slender);
		const { z } = shearResistances(model, true);
		const V = share * z!.buckling!.Vbw;
		return webShearInteraction(model, 'plusMy', { M, V, N }, z, 'one');
	};

	it('counts the web whole whatever its class, and Vbw alone', () => {
		const found = at(4500, 0.8)!;
		expect(found.Mf).toBeCloseTo(Mf, 6);
		expect(found.Mpl).toBeCloseTo(Mpl, 6);
		expect(found.eta3).toBeCloseTo(0.8, 12);
		expect(found.value).toBeCloseTo(4500 / Mpl + (1 - Mf / Mpl) * 0.36, 10);
	});

	it('is asked from η3 0.5 and from Mf on only', () => {
		expect(at(4500, 0.5)).toBeNull();
		expect(at(4500, 0.501)).not.toBeNull();
		expect(at(Mf * 0.9999, 0.9)).toBeNull();
		expect(at(Mf * 1.0001, 0.9)).not.toBeNull();
	});

	it('is met everywhere below Mf up to Vbw, and just met at both ends', () => {
		expect(at(Mf * (1 + 1e-9), 1)!.value).toBeCloseTo(1, 6);
		expect(at(Mpl, 0.5 + 1e-9)!.value).toBeCloseTo(1, 6);
	});

	it('lowers both moments with N, and drops the flanges once the web is squashed', () => {
		const found = at(4500, 0.8, -1000)!;
		expect(found.Mf).toBeCloseTo(Mf * (1 - 1000 / (355 * 2 * 400 * 20 * 1e-3)), 6);
		expect(found.Mpl).toBeLessThan(Mpl);
		const web = (355 * 8 * 1500) / 1000;
		expect(at(4500, 0.8, -web * 0.999)!.Mf).toBeGreaterThan(0);
		expect(at(4500, 0.8, -web * 1.001)!.Mf).toBe(0);
	});

	it('gives the moment beside V, capped by Mc', () => {
		const found = under(slender, 0.9, { overall: 3 });
		expect(found.by).toBe('web-buckling');
		const left = Mpl - (Mpl - Mf) * 0.64;
		expect(found.MyVRd).toBeCloseTo(Math.min(left, found.Mc), 6);
		expect(under(slender, 1, { overall: 1 }).MyVRd).toBeCloseTo(Mf, 6);
	});
});

describe('workings of bending with shear', () => {
	it.each([
		['an I', stocky, 1],
		['a hybrid', { ...stocky, partGrades: { web: 275 } }, 1],
		['class 3', stocky, 3],
		['a slender web', slender, 1],
		[
			'a tube',
			{ kind: 'rectangular-hollow', fabrication: 'hot-finished', h: 200, b: 100, t: 8, grade: 355 },
			1
		]
	] as const)('%s: give their own results again', (_, definition, overall) => {
		const { model } = under(definition, 0.85, { overall });
		const { z } = shearResistances(model, true);
		webShearInteraction(model, 'plusMy', { M: 5000, V: 0.8 * z!.resistance, N: 0 }, z, 'one');
		const entries = Object.entries(model.workings.explanation()).filter(([key]) => /one/.test(key));
		expect(entries.length).toBeGreaterThan(1);
		for (const [key, { formula, inputs, result }] of entries) {
			const found = formulaValue(formula, inputs);
			expect(found.ok && found.value / result.value, `${key}: ${formula}`).toBeCloseTo(1, 9);
		}
	});
});
