import { describe, expect, it } from 'vitest';
import { analyse } from '../../src/lib/engine/rules/analyse';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import { analysed, element, figure, workedExample } from './en1993-example';

const compression = { demands: [{ name: 'N', N: -1 }] };

describe('class by EN 1993-1-1:2005 Table 5.2 against published examples', () => {
	const ef02 = workedExample('EF02');
	it(`${ef02.id}: class 4 in bending. ${ef02.source}`, () => {
		const of = (name: string) => figure(ef02.inputs, name);
		const girder: SectionDefinition = {
			kind: 'i',
			fabrication: 'welded',
			h: of('hw') + 2 * of('tf'),
			b: of('b'),
			tw: of('tw'),
			tf: of('tf'),
			weldLeg: of('weld'),
			grade: of('fy')
		};
		expect(analysed(girder).classification?.overall).toBe(4);
	});

	it('SHS 300×10 S355 in compression is class 2: 27.0 is over 33ε = 26.85 (common practice, c = b − 3t)', () => {
		const tube: SectionDefinition = {
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: 300,
			b: 300,
			t: 10,
			ro: 15,
			ri: 10,
			grade: 'S355'
		};
		const analysis = analysed(tube, compression);
		expect(element(analysis, 'topFlange').slenderness).toBe(27);
		expect(analysis.classification?.overall).toBe(2);
	});
});

describe('details usually got wrong', () => {
	it('fy of a 20 mm flange steps at 16 mm by the product standard alone: 345 against 355', () => {
		const epsilon = (strengthBasis: 'code-table' | 'product-standard') => {
			const section = prepareSection(
				{ kind: 'i', fabrication: 'welded', h: 940, b: 400, tw: 14, tf: 20, grade: 'S355' },
				strengthBasis
			);
			if (!section.ok) throw new Error('not a section');
			return element(analyse(section.value), 'topFlange').epsilon;
		};
		expect(epsilon('code-table')).toBeCloseTo(Math.sqrt(235 / 355), 12);
		expect(epsilon('product-standard')).toBeCloseTo(Math.sqrt(235 / 345), 12);
	});

	it('SHS 300×10 S355 in compression is class 2 in 2022 too: 27.0 between 28ε = 22.8 and 34ε = 27.7', () => {
		const tube: SectionDefinition = {
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: 300,
			b: 300,
			t: 10,
			ro: 15,
			ri: 10,
			grade: 'S355'
		};
		const analysis = analysed(tube, { code: { standard: 'EN1993-1-1:2022' } });
		expect(analysis.classification?.byCase.compression).toBe(2);
	});
});
