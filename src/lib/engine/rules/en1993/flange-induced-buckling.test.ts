import { describe, expect, it } from 'vitest';
import type { ISection, SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { analyse, type AnalyseRequest } from '../analyse';

function analysed(definition: SectionDefinition, request?: AnalyseRequest) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const analysis = analyse(section.value, request);
	return { ...analysis, codes: analysis.notes.map(({ code }) => code) };
}

const code = 'flange-induced-buckling-not-checked';

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

describe('buckling of the flange into the web, EN 1993-1-5 8(1)', () => {
	it('is missing where 100 is over 0.4 · 210000/355 · 0.3266 = 77.3, counted as class 2', () => {
		const { verdict, demands, codes, resistance } = analysed(heavy, { demands: [{ My: 100 }] });
		expect(resistance?.basis).toBe('effective-class-2');
		expect(codes).toContain(code);
		expect(demands[0]?.missing.map((note) => note.code)).toContain(code);
		expect(demands[0]?.countable).toBeGreaterThan(0);
		expect(verdict).toMatchObject({ status: 'incomplete', clear: false });
		expect(verdict.notChecked).toContain('flange-induced buckling');
	});

	it('is met, and not mentioned, within 0.55 · 210000/355 · 0.3266 = 106.3 when counted to first yield', () => {
		const elastic = { code: { allowEffectiveClass2: false }, demands: [{ My: 100 }] };
		const { verdict, codes } = analysed(heavy, elastic);
		expect(codes).not.toContain(code);
		expect(verdict.status).toBe('passes');
	});

	it('looks at the flange in compression', () => {
		// Top flange 750×80 as before; bottom flange 300×25: √(6400/7500) = 0.92 is far from it.
		const uneven: ISection = { ...heavy, h: 905, bBottom: 300, tfBottom: 25 };
		expect(analysed(uneven, { demands: [{ My: -10 }] }).codes).not.toContain(code);
	});

	it('takes both webs of a box', () => {
		const box = (tf: number): SectionDefinition => ({
			kind: 'box',
			h: 800 + 2 * tf,
			b: 750,
			tw: 8,
			tfTop: tf,
			tfBottom: tf,
			webGap: 600,
			grade: 355
		});
		// √(12800/60000) = 0.462: 0.4 · 591.5 · 0.462 = 109.3. With 120 mm, 0.377: 89.2.
		expect(analysed(box(80), { demands: [{ My: 100 }] }).codes).not.toContain(code);
		expect(analysed(box(120), { demands: [{ My: 100 }] }).codes).toContain(code);
	});

	it('is said of +My when nothing is demanded, and of no bending about z or tension', () => {
		expect(analysed(heavy).codes).toContain(code);
		expect(analysed(heavy).verdict.notChecked).toContain('flange-induced buckling');
		expect(analysed(heavy, { demands: [{ Mz: 10 }] }).codes).not.toContain(code);
		expect(analysed(heavy, { demands: [{ N: 10 }] }).codes).not.toContain(code);
	});
});
