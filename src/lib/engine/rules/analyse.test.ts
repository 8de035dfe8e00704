import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../section/definition';
import { prepareSection } from '../section/prepare';
import { analyse, type AnalyseRequest } from './analyse';

function analysed(definition: SectionDefinition, request?: AnalyseRequest) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return analyse(section.value, request);
}

const codes = ({ notes }: { notes: readonly { code: string }[] }) => notes.map(({ code }) => code);

/** Flanges 400×20, web 900×14, fillets 8 leg, S355: flanges fy 345 (over 16 mm), web fy 355. */
const girder: SectionDefinition = {
	kind: 'i',
	fabrication: 'welded',
	h: 940,
	b: 400,
	tw: 14,
	tf: 20,
	weldLeg: 8,
	grade: 'S355'
};

describe('direction figure, computed by hand', () => {
	const analysis = analysed(girder, { demands: [{ name: 'G2', My: 2400 }] });
	const { classification, resistance, moment } = analysis;

	it('classes the top flange 3: c = (400 − 14)/2 − 8 = 185, c/t 9.25 over 10√(235/345) = 8.253', () => {
		const flange = classification?.elements.find(({ part }) => part === 'topFlange');
		expect(flange).toMatchObject({ c: 185, slenderness: 9.25, class: 3, stress: 'compression' });
		expect(flange?.limits[1]).toBeCloseTo(8.253, 3);
		expect(classification).toMatchObject({ overall: 3, governing: 'topFlange', basis: '+My' });
	});

	it('classes the web 2: c = 900 − 16 = 884, c/t 63.14 between 72ε 58.58 and 83ε 67.53 of fy 355', () => {
		const web = classification?.elements.find(({ part }) => part === 'web');
		expect(web).toMatchObject({ c: 884, class: 2, stress: 'bending' });
		expect(web?.slenderness).toBeCloseTo(63.143, 3);
		expect(web?.limits[0]).toBeCloseTo(58.58, 2);
		expect(web?.limits[1]).toBeCloseTo(67.53, 2);
	});

	it('counts first yield: 345 · 4236.633e6/470 = 3109.87 kNm', () => {
		// I = 400·940³/12 − 386·900³/12 = 4236.633e6 mm⁴
		expect(moment.firstYieldY).toBeCloseTo(3109.869, 3);
		expect(resistance?.MyRd).toBeCloseTo(3109.869, 3);
		expect(resistance?.basis).toBe('elastic');
	});

	it('has 345·400·20·920 + 355·14·900²/4 = 3545.625 kNm of full plastic moment', () => {
		expect(moment.plasticY).toBeCloseTo(3545.625, 6);
	});

	it('uses 2400/3109.87 = 77 % of it', () => {
		expect(resistance?.utilisation?.value).toBeCloseTo(0.7717, 4);
		expect(resistance?.utilisation?.governing).toBe('bending about y–y');
	});

	it('says so in one sentence and names the deciding part', () => {
		expect(analysis.verdict.sentence).toBe('Class 3. Count 3110 kNm, up to first yield.');
		expect(analysis.verdict.detail).toBe(
			'The top flange decides it: c/t 9.25 is over the Class 2 limit 8.25. The 436 kNm beyond first yield are not to be counted.'
		);
	});

	it('checks the web for shear buckling: 900/14 = 64.3 is over 72ε/η = 48.8', () => {
		// EN 1993-1-5 5.3 with fyw 355 at 14 mm: λw = 900/(86.4 · 14 · ε), χw = 0.83/λw below 1.08, whatever the end post.
		const epsilon = Math.sqrt(235 / 355);
		const slenderness = 900 / (86.4 * 14 * epsilon);
		const Vb = ((0.83 / slenderness) * 355 * 900 * 14 * 1e-3) / Math.sqrt(3);
		expect(slenderness).toBeLessThan(1.08);
		expect(resistance?.VzRd).toBeCloseTo(Vb, 6);
		expect(codes(analysis)).toContain('shear-buckling-assumptions');
		expect(analysis.verdict.notChecked).toContain('lateral–torsional buckling');
	});

	it('takes the full block once the flanges are 350 mm wide: 345·7000·920 + 1006.425 = 3228 kNm', () => {
		const narrow = analysed({ ...girder, b: 350 });
		expect(narrow.classification?.overall).toBe(2);
		expect(narrow.resistance?.MyRd).toBeCloseTo(3228.225, 3);
		expect(narrow.resistance?.basis).toBe('plastic');
	});
});
