import { describe, expect, it } from 'vitest';
import type { ISection, SectionDefinition } from '../../section/definition';
import type { CodeChoice, Demand } from '../result';
import { classifyDemand, effectsOf } from './demand-class';
import { pureCases } from './model';
import { testModel } from './test-model';

function standing(definition: SectionDefinition, demand: Demand, code: Partial<CodeChoice> = {}) {
	const model = testModel(definition, code);
	const { classified, basis } = classifyDemand(
		model,
		pureCases(model),
		effectsOf(demand),
		'tested'
	);
	return { ...classified, basis };
}

const part = (definition: SectionDefinition, demand: Demand, name: string, code = {}) => {
	const found = standing(definition, demand, code).elements.find((each) => each.part === name);
	if (!found) throw new Error(`no ${name}`);
	return found;
};

/** IPE 300, fy 355: A 5381 mm², c of the web 248.6. */
const ipe: ISection = {
	kind: 'i',
	fabrication: 'rolled',
	h: 300,
	b: 150,
	tw: 7.1,
	tf: 10.7,
	r: 15,
	grade: 355
};
const area = 2 * 150 * 10.7 + 278.6 * 7.1 + (4 - Math.PI) * 15 ** 2;

describe('web of a rolled I under N with bending', () => {
	it('has α = 0.5 + N γM0/(2 fy tw c) with the actual N', () => {
		const alpha = (N: number, gammaM0 = 1) =>
			part(ipe, { N: -N, My: 50 }, 'web', { gammaM0 }).alpha;
		const expected = (N: number) => 0.5 + (N * 1e3) / (2 * 355 * 7.1 * 248.6);
		expect(alpha(200)).toBeCloseTo(expected(200), 10);
		expect(alpha(200, 1.1)).toBeCloseTo(expected(220), 10);
		expect(alpha(600)).toBeCloseTo(expected(600), 10);
		expect(alpha(800)).toBe(1);
	});

	it('does not depend on the size of the moment, nor on its sense', () => {
		const alpha = (My: number) => part(ipe, { N: -200, My }, 'web').alpha;
		expect(alpha(1)).toBeCloseTo(alpha(100) ?? 0, 12);
		expect(alpha(-50)).toBeCloseTo(alpha(50) ?? 0, 12);
	});

	it('has the elastic ψ of its own edges when the extreme fibre yields', () => {
		// σN = N/A; bending part fy − σN at 150 mm, in proportion at the web edge 124.3 mm.
		const direct = 200e3 / area;
		const edge = ((355 - direct) * 124.3) / 150;
		const psi = part(ipe, { N: -200, My: 50 }, 'web').psi;
		expect(psi).toBeCloseTo((direct - edge) / (direct + edge), 10);
	});

	it('is less compressed under tension', () => {
		const pulled = part(ipe, { N: 200, My: 50 }, 'web');
		expect(pulled.alpha).toBeCloseTo(0.5 - 200e3 / (2 * 355 * 7.1 * 248.6), 10);
		expect(pulled.psi ?? 0).toBeLessThan(-1);
	});

	it('can be asked for N and M in proportion', () => {
		// Axis in the web: kM = Mpl − (kN)²/(4 tw fy). With N 100 kN, M 100 kNm and Mpl = 628.36e3·355.
		const fillet = (1 - Math.PI / 4) * 15 ** 2;
		const lever = 139.3 - (15 * (10 - 3 * Math.PI)) / (12 - 3 * Math.PI);
		const Wpl = 150 * 10.7 * 289.3 + (7.1 * 278.6 ** 2) / 4 + 4 * fillet * lever;
		const a = 100e3 ** 2 / (4 * 7.1 * 355);
		const k = (-100e6 + Math.sqrt(100e6 ** 2 + 4 * a * Wpl * 355)) / (2 * a);
		const web = part(ipe, { N: -100, My: 100 }, 'web', { classAlpha: 'proportional' });
		expect(web.alpha).toBeCloseTo(0.5 + (k * 100e3) / (2 * 355 * 7.1 * 248.6), 8);
		// ψ of N 100 kN and M 100 kNm themselves, with the tables' A 53.8 cm² and Iy 8356 cm⁴ (EN 10365).
		const [direct, edge] = [100e3 / 5380, (100e6 * 124.3) / 8356e4];
		expect(web.psi).toBeCloseTo((direct - edge) / (direct + edge), 3);
	});
});

describe('parts by sense of bending', () => {
	it('turns compression with the sense of My', () => {
		expect(part(ipe, { My: 50 }, 'topFlange').stress).toBe('compression');
		expect(part(ipe, { My: 50 }, 'bottomFlange')).toMatchObject({
			stress: 'tension',
			limits: [],
			class: 1
		});
		expect(part(ipe, { My: -50 }, 'topFlange').stress).toBe('tension');
	});

	it('leaves the web of an I out of bending about z and classes the outstands by their gradient', () => {
		expect(part(ipe, { Mz: 5 }, 'web').stress).toBe('tension');
		const flange = part(ipe, { Mz: 5 }, 'topFlange');
		expect(flange).toMatchObject({ alpha: 1, stress: 'combined' });
		// Stress in proportion to the distance from the axis: root 18.55, tip 75 mm.
		expect(flange.psi).toBeCloseTo(18.55 / 75, 10);
	});

	it('has every part in uniform compression under N alone and none under tension', () => {
		const pushed = standing(ipe, { N: -10 });
		expect(pushed.elements.every(({ stress }) => stress === 'compression')).toBe(true);
		expect(pushed.basis).toBe('N');
		const pulled = standing(ipe, { N: 10 });
		expect(pulled.overall).toBe(1);
		expect(pulled.elements.every(({ limits }) => limits.length === 0)).toBe(true);
	});

	it('mirrors a section bent the other way', () => {
		const uneven: ISection = { ...ipe, fabrication: 'welded', bBottom: 250, tfBottom: 8, tw: 4 };
		const turned: ISection = { ...uneven, b: 250, tf: 8, bBottom: 150, tfBottom: 10.7 };
		for (const N of [0, -100, 100]) {
			const one = standing(uneven, { N, My: 40, Mz: 3 });
			const other = standing(turned, { N, My: -40, Mz: 3 });
			expect(one.overall).toBe(other.overall);
			const web = (of: typeof one) => of.elements.find((each) => each.part === 'web');
			expect(web(one)?.alpha).toBeCloseTo(web(other)?.alpha ?? 0, 9);
			expect(web(one)?.psi).toBeCloseTo(web(other)?.psi ?? 0, 9);
		}
	});
});

describe('mono-symmetric I', () => {
	it('takes α from its own plastic axis and ψ from its elastic one', () => {
		// Flanges 200×20 top, 100×20 bottom, web 400×10, one strength: equal areas at
		// (6000 + 4000)/2 = 4000 + 10·x from the top, x = 100 below the top flange.
		const girder: ISection = {
			kind: 'i',
			fabrication: 'welded',
			h: 440,
			b: 200,
			tf: 20,
			bBottom: 100,
			tfBottom: 20,
			tw: 10,
			grade: 235
		};
		const web = part(girder, { My: 50 }, 'web');
		expect(web.alpha).toBeCloseTo(0.25, 12);
		// Centroid from the bottom: (4000·430 + 4000·220 + 2000·10)/10000 = 262; web edges 420 and 20.
		expect(web.psi).toBeCloseTo((20 - 262) / (420 - 262), 12);
	});

	it('is class 4 where the plastic block lets a web through that the elastic stress of class 3 does not', () => {
		// Strong top flange: class 3 (7.3 between 10ε 7.15 and 14ε of 460), and it pulls the plastic
		// axis up: α 0.141, class 1 limit 182. Elastically the web is bent evenly: 125 over 124ε = 88.6.
		const girder: ISection = {
			kind: 'i',
			fabrication: 'welded',
			h: 1040,
			b: 300,
			tf: 20,
			tw: 8,
			grade: 235,
			partGrades: { topFlange: 460 }
		};
		const { overall, elements } = standing(girder, { My: 50 });
		const named = (name: string) => elements.find((each) => each.part === name);
		expect(named('topFlange')?.class).toBe(3);
		expect(named('web')?.alpha).toBeCloseTo((3025e3 - 2760e3) / (8 * 235 * 1000), 6);
		expect(named('web')?.class).toBe(4);
		expect(overall).toBe(4);
	});
});
