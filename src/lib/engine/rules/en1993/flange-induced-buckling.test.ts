import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import type { ISection, SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { analyse, type AnalyseRequest } from '../analyse';
import { flangeInducedBucklingCheck, type Counted } from './flange-induced-buckling';
import { testModel } from './test-model';

function judged(definition: SectionDefinition, request?: AnalyseRequest) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const { resistance, verdict } = analyse(section.value, request);
	const check = resistance?.checks.find(({ name }) => name === 'flange-induced buckling');
	return { check, verdict, resistance };
}

/** Web 800×8 (Aw 6400, hw/tw 100, class 3 of fy 355), flanges 750×80 (60 000): √(Aw/Afc) = 0.3266. */
const heavy: ISection = {
	kind: 'i',
	fabrication: 'welded',
	h: 960,
	b: 750,
	tw: 8,
	tf: 80,
	grade: 355
};

const plastic: Counted = { overall: 2, basis: 'plastic', topCompressed: true };

describe('buckling of the flange into the web, EN 1993-1-5 8(1)', () => {
	it.each([
		['class 1', { ...plastic, overall: 1 }, 0.3],
		['class 2', plastic, 0.4],
		['a class 3 web taken as class 2', { ...plastic, overall: 3, basis: 'effective-class-2' }, 0.4],
		['class 3', { ...plastic, overall: 3, basis: 'elastic' }, 0.55],
		['class 4', { ...plastic, overall: 4, basis: 'effective' }, 0.55]
	] as const)('%s: hw/tw 100 against k · 210000/355 · 0.3266', (_, counted, k) => {
		const model = testModel(heavy);
		const found = flangeInducedBucklingCheck(model, counted, 'one')!;
		expect(found.value).toBe(100);
		expect(found.limit / (k * (210_000 / 355) * Math.sqrt(6400 / 60_000))).toBeCloseTo(1, 12);
		const { formula, inputs, result } = Object.values(model.workings.explanation())[0]!;
		const worked = formulaValue(formula, inputs);
		expect(worked.ok && worked.value / result.value).toBeCloseTo(1, 9);
	});

	it('a failing k 0.4 falls back to first yield with k 0.55: 100 is over 77.3, within 106.3', () => {
		const { check, verdict, resistance } = judged(heavy, { demands: [{ My: 100 }] });
		// I = (750·960³ − 742·800³)/12, over 480 mm, of 355 N/mm²
		const first = (((750 * 960 ** 3 - 742 * 800 ** 3) / 12 / 480) * 355) / 1e6;
		expect(resistance?.basis).toBe('elastic');
		expect((resistance?.MyRd ?? 0) / first).toBeCloseTo(1, 12);
		expect(verdict.countable).toMatchObject({ basis: 'elastic' });
		expect(verdict.countable.moment! / first).toBeCloseTo(1, 12);
		expect(check?.limit).toBeCloseTo(0.55 * (210_000 / 355) * Math.sqrt(6400 / 60_000), 9);
		expect(verdict.status).toBe('passes');
		expect(judged(heavy).verdict.countable.moment! / first).toBeCloseTo(1, 12);
	});

	it('counts first yield beside N, shear and Mz as well', () => {
		for (const beside of [{ N: -50 }, { N: 50 }, { Mz: 5 }, { Vz: 20 }]) {
			const { check, verdict } = judged(heavy, { demands: [{ My: 100, ...beside }] });
			expect(check?.utilisation).toBeLessThan(1);
			expect(verdict.countable.basis).toBe('elastic');
			expect(verdict.countable.moment).toBeGreaterThan(0);
		}
	});

	it('counts nothing where 0.55 fails too: flanges 2000×80 give 0.55 · 591.5 · 0.2 = 65.1', () => {
		const { verdict } = judged({ ...heavy, b: 2000 }, { demands: [{ My: 100 }] });
		expect(verdict.status).toBe('fails');
		expect(verdict.countable.moment).toBe(0);
	});

	it('counts the plastic moment of class 1 with k 0.4 where 0.3 fails, without rotation of a hinge', () => {
		// top 500×30 of fy 275, web 1000×6: 0.3 · 763.6 · √0.4 = 144.9 < 166.7 < 193.2
		const girder: ISection = {
			...heavy,
			h: 1060,
			b: 500,
			bBottom: 300,
			tw: 6,
			tf: 30,
			tfBottom: 30,
			grade: 275
		};
		const section = prepareSection(girder);
		if (!section.ok) throw new Error('not built');
		const { resistance, notes } = analyse(section.value, { demands: [{ My: 1 }] });
		expect(resistance?.basis).toBe('plastic');
		expect(
			resistance?.checks.find(({ name }) => name === 'flange-induced buckling')?.limit
		).toBeCloseTo(0.4 * (210_000 / 275) * Math.sqrt(0.4), 9);
		expect(notes.map(({ code }) => code)).toContain('flange-induced-no-rotation');
	});

	it('is met within 0.55 · 210000/355 · 0.3266 = 106.3 when counted to first yield', () => {
		const elastic = { code: { allowEffectiveClass2: false }, demands: [{ My: 100 }] };
		expect(judged(heavy, elastic).check?.limit).toBeCloseTo(106.3, 1);
	});

	it('looks at the flange in compression', () => {
		// Top flange 750×80 as before; bottom flange 300×25: √(6400/7500) = 0.92 is far from it.
		const uneven: ISection = { ...heavy, h: 905, bBottom: 300, tfBottom: 25 };
		const found = flangeInducedBucklingCheck(testModel(uneven), {
			...plastic,
			topCompressed: false
		})!;
		expect(found.part).toBe('bottomFlange');
		expect(found.limit).toBeCloseTo(0.4 * (210_000 / 355) * Math.sqrt(6400 / 7500), 9);
	});

	it('takes both webs of a box', () => {
		const box: SectionDefinition = {
			kind: 'box',
			h: 960,
			b: 750,
			tw: 8,
			tfTop: 80,
			tfBottom: 80,
			webGap: 600,
			grade: 355
		};
		// √(12800/60000) = 0.462: 0.4 · 591.5 · 0.462 = 109.3
		expect(flangeInducedBucklingCheck(testModel(box), plastic)!.limit).toBeCloseTo(109.3, 1);
	});

	it('is not asked of rolled sections, of bending about z or of tension', () => {
		expect(
			flangeInducedBucklingCheck(testModel({ ...heavy, fabrication: 'rolled' }), plastic)
		).toBeNull();
		expect(judged(heavy, { demands: [{ Mz: 10 }] }).check).toBeUndefined();
		expect(judged(heavy, { demands: [{ N: 10 }] }).check).toBeUndefined();
	});
});
