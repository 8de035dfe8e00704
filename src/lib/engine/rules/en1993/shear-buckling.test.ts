import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import type { ISection, SectionDefinition } from '../../section/definition';
import type { Demand, Stiffeners } from '../result';
import { flangesMoment } from './effective/flange-moments';
import { shearBucklingCoefficient, shearReduction } from './shear-buckling';
import { shearResistances } from './shear-resistance';
import { testModel } from './test-model';

const girder = (tw: number, changes: Partial<ISection> = {}): ISection => ({
	kind: 'i',
	fabrication: 'welded',
	h: 1040,
	b: 300,
	tw,
	tf: 20,
	grade: 235,
	...changes
});

function sheared(
	definition: SectionDefinition,
	stiffeners: Stiffeners | null = null,
	demand?: Demand,
	code = {}
) {
	const model = { ...testModel(definition, code), stiffeners };
	return { model, ...shearResistances(model, true, demand, 'one') };
}

describe('whether shear buckling is checked, EN 1993-1-5 5.1(2)', () => {
	it('72ε/η = 60 of an unstiffened web: not on it, but one step beyond', () => {
		expect(sheared(girder(1000 / 60)).z!.buckling).toBeNull();
		expect(sheared(girder(1000 / 60.001)).z!.buckling).not.toBeNull();
	});

	it('31ε√kτ/η between stiffeners: 31·√9.34/1.2 = 78.95 with a = hw', () => {
		const stiffeners = { spacing: 1000, endPost: 'rigid' } as const;
		const limit = (31 * Math.sqrt(9.34)) / 1.2;
		expect(sheared(girder(1000 / limit), stiffeners).z!.buckling).toBeNull();
		expect(sheared(girder(1000 / (limit + 0.001)), stiffeners).z!.buckling).not.toBeNull();
	});

	it('takes ε of the web, not of the flanges', () => {
		const hybrid = girder(1000 / 60, { partGrades: { topFlange: 355, bottomFlange: 355 } });
		expect(sheared(hybrid).z!.buckling).toBeNull();
	});
});

describe('χw and kτ', () => {
	it('kτ is continuous at a = hw, falls to 5.34, and is 5.34 without stiffeners', () => {
		expect(shearBucklingCoefficient(1000, 1000)).toBeCloseTo(9.34, 12);
		expect(shearBucklingCoefficient(1000, 1000 * (1 - 1e-9))).toBeCloseTo(9.34, 6);
		expect(shearBucklingCoefficient(1000, 1e9)).toBeCloseTo(5.34, 9);
		expect(shearBucklingCoefficient(1000, null)).toBe(5.34);
		expect(shearBucklingCoefficient(1000, 500)).toBeCloseTo(4 + 5.34 * 4, 12);
	});

	it.each([1, 1.2])(
		'χw with η %d is continuous at 0.83/η, and at 1.08 within the code’s rounding',
		(eta) => {
			const at = 0.83 / eta;
			expect(shearReduction(at * (1 - 1e-12), eta, 'rigid')).toBe(eta);
			expect(shearReduction(at, eta, 'rigid')).toBeCloseTo(eta, 12);
			expect(shearReduction(1.08 - 1e-9, eta, 'rigid')).toBeCloseTo(0.83 / 1.08, 6);
			expect(shearReduction(1.08, eta, 'rigid')).toBeCloseTo(1.37 / 1.78, 12);
			expect(1.37 / 1.78 - 0.83 / 1.08).toBeLessThan(0.0012);
			expect(shearReduction(2, eta, 'rigid')).toBeCloseTo(1.37 / 2.7, 12);
			expect(shearReduction(2, eta, 'non-rigid')).toBeCloseTo(0.415, 12);
		}
	);
});

describe('shear buckling resistance', () => {
	it('never exceeds Vpl, meets it at the limit, and rises with the web', () => {
		let before = 0;
		for (let tw = 4; tw <= 24; tw += 0.125) {
			const { z } = sheared(girder(tw));
			expect(z!.resistance).toBeLessThanOrEqual(z!.plastic * (1 + 1e-12));
			expect(z!.resistance).toBeGreaterThan(before);
			before = z!.resistance;
		}
		// λw = 72/(86.4η) = 0.8333/η there: 0.83/0.8333 = 0.996 of Vpl, the code's own rounding
		const { z } = sheared(girder(1000 / 60.001));
		expect(z!.resistance / z!.plastic).toBeCloseTo(0.996, 3);
	});

	it('counts both webs of a box, and each flange of it as a web in shear along y', () => {
		const box = (webGap: number): SectionDefinition => ({
			kind: 'box',
			h: 1040,
			b: webGap + 20,
			tw: 10,
			tfTop: 20,
			tfBottom: 20,
			webGap,
			grade: 235
		});
		const { z, y } = sheared(box(1300));
		const one = sheared(girder(10)).z!.buckling!;
		expect(z!.buckling!.Vbw).toBeCloseTo(2 * one.Vbw, 8);
		expect(z!.buckling!.Vbf).toBe(0);
		// 1300/20 = 65 > 60: λ = 65/86.4, χ = 0.83/λ = 1.103
		const chi = 0.83 / (65 / 86.4);
		expect(y!.buckling!.chiW).toBeCloseTo(chi, 9);
		expect(y!.buckling!.Vbw).toBeCloseTo((2 * chi * 0.235 * 1300 * 20) / Math.sqrt(3), 6);
	});

	it('gives a rectangular tube none beyond 72ε/η, with a note', () => {
		const tube = (t: number): SectionDefinition => ({
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: 400,
			b: 200,
			t,
			grade: 355
		});
		expect(sheared(tube(10)).z).not.toBeNull();
		const { z, notes } = sheared(tube(7));
		expect(z).toBeNull();
		expect(notes.map(({ code }) => code)).toContain('shear-buckling-not-built');
	});

	it('is the same for a section turned over, and grows as the square of its size', () => {
		const uneven = girder(8, { tfBottom: 30, bBottom: 400 });
		const turned = girder(8, { b: 400, tf: 30, bBottom: 300, tfBottom: 20 });
		const stiffeners = { spacing: 1500, endPost: 'rigid' } as const;
		const up = sheared(uneven, stiffeners, { My: 500 }).z!.buckling!;
		const down = sheared(turned, stiffeners, { My: -500 }).z!.buckling!;
		expect(down.Vb).toBeCloseTo(up.Vb, 9);
		const large = { ...girder(80), h: 10400, b: 3000, tf: 200 };
		const [a, b] = [sheared(large).z!.buckling!, sheared(girder(8)).z!.buckling!];
		expect(a.chiW).toBeCloseTo(b.chiW, 12);
		expect(a.Vb / b.Vb).toBeCloseTo(100, 8);
	});
});

describe('part of the flanges, EN 1993-1-5 5.4', () => {
	const stiffeners = { spacing: 1500, endPost: 'rigid' } as const;

	it('is bf tf² fyf/(c γM1) without a moment, c = a(0.25 + 1.6 bf tf² fyf/(t hw² fyw))', () => {
		const { z } = sheared(girder(8), stiffeners, { Vz: 1 });
		const c = 1500 * (0.25 + (1.6 * 300 * 400) / (8 * 1e6));
		expect(z!.buckling!.Vbf).toBeCloseTo((300 * 400 * 0.235) / c, 9);
	});

	it('counts no more than 15ε tf of a flange on each side of the web', () => {
		const { z } = sheared(girder(8, { b: 900 }), stiffeners, { Vz: 1 });
		const bf = 2 * 15 * 20 + 8;
		const c = 1500 * (0.25 + (1.6 * bf * 400) / (8 * 1e6));
		expect(z!.buckling!.Vbf).toBeCloseTo((bf * 400 * 0.235) / c, 9);
	});

	it('falls with (M/Mf)² and is nothing from Mf on', () => {
		const { model, z } = sheared(girder(8), stiffeners, { My: 0 });
		const Mf = flangesMoment(model, 'plusMy')!.value;
		const half = sheared(girder(8), stiffeners, { My: Mf / 2 }).z!.buckling!;
		expect(half.Vbf).toBeCloseTo(0.75 * z!.buckling!.Vbf, 9);
		expect(sheared(girder(8), stiffeners, { My: Mf }).z!.buckling!.Vbf).toBe(0);
		expect(sheared(girder(8), stiffeners, { My: -1.01 * Mf }).z!.buckling!.Vbf).toBe(0);
	});

	it('is not counted without a demand or without stiffeners between supports', () => {
		expect(sheared(girder(8), stiffeners).z!.buckling!.Vbf).toBe(0);
		expect(sheared(girder(8), null, { My: 0 }).z!.buckling!.Vbf).toBe(0);
	});

	it('does not raise the whole above η fyw hw t/(√3 γM1)', () => {
		const thick = girder(12, { tf: 80, h: 1160 });
		const { z } = sheared(thick, { spacing: 600, endPost: 'rigid' }, { Vz: 1 });
		const most = (1.2 * 0.235 * 1000 * 12) / Math.sqrt(3);
		expect((z!.buckling?.Vb ?? most) / most).toBeLessThanOrEqual(1 + 1e-12);
	});
});

describe('workings of shear', () => {
	it.each([
		['an unstiffened girder', girder(8), null, undefined],
		['a stiffened girder', girder(8), { spacing: 800, endPost: 'rigid' }, { My: 300, Vz: 500 }],
		['a stocky girder', girder(20), null, { Vz: 500 }],
		[
			'a tee',
			{ kind: 'tee', fabrication: 'rolled', h: 150, b: 150, tw: 8, tf: 12, r: 12, grade: 355 },
			null,
			undefined
		],
		['an angle', { kind: 'angle', h: 90, b: 70, t: 9, rToe: 4, grade: 235 }, null, undefined],
		['a round bar', { kind: 'round', d: 40, grade: 235 }, null, undefined],
		['a flat bar', { kind: 'flat', b: 40, h: 80, grade: 235 }, null, undefined],
		[
			'a channel',
			{ kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, grade: 355 },
			null,
			undefined
		]
	] as const)('of %s give their own results again', (_, definition, stiffeners, demand) => {
		const { model } = sheared(definition as SectionDefinition, stiffeners, demand);
		const entries = Object.entries(model.workings.explanation()).filter(([key]) =>
			/shear|V[yz]Rd|Vbf/.test(key)
		);
		expect(entries.length).toBeGreaterThan(3);
		for (const [key, { formula, inputs, result }] of entries) {
			const found = formulaValue(formula, inputs);
			expect(found.ok && found.value / result.value, `${key}: ${formula}`).toBeCloseTo(1, 9);
		}
	});
});
