import { describe, expect, it } from 'vitest';
import { analyse } from '../../src/lib/engine/rules/analyse';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import { prepareSection } from '../../src/lib/engine/section/prepare';
import { analysed, element, figure, rolledI, workedExample } from './en1993-example';

const compression = { demands: [{ name: 'N', N: -1 }] };

describe('class by EN 1993-1-1:2005 Table 5.2 against published examples', () => {
	const cl02 = workedExample('CL02');
	it(`${cl02.id}: ${cl02.source}`, () => {
		const analysis = analysed(rolledI(cl02), compression);
		const { expected } = cl02;
		const [flange, web] = [element(analysis, 'topFlange'), element(analysis, 'web')];
		expect(Math.abs(flange.slenderness - figure(expected, 'cf_tf'))).toBeLessThan(0.01);
		expect(Math.abs(web.slenderness - figure(expected, 'cw_tw'))).toBeLessThan(0.01);
		expect(flange.class).toBe(expected.flange_class);
		expect(web.class).toBe(expected.web_class);
		expect(analysis.classification?.overall).toBe(expected.section_class);
		const NRd = analysis.resistance?.NRd ?? 0;
		expect(Math.abs(NRd - figure(expected, 'Nc_Rd_kN'))).toBeLessThan(1);
	});

	const cl03 = workedExample('CL03');
	it(`${cl03.id}: ${cl03.source}`, () => {
		const { inputs, expected } = cl03;
		const of = (name: string) => figure(inputs, name);
		const sizes = { h: of('h'), b: of('b'), tw: of('tw'), tf: of('tf'), weldLeg: of('weld') };
		const analysis = analysed({ kind: 'i', fabrication: 'welded', ...sizes, grade: of('fy') });
		const [flange, web] = [element(analysis, 'topFlange'), element(analysis, 'web')];
		expect(Math.abs(flange.slenderness - figure(expected, 'cf_tf'))).toBeLessThan(0.01);
		expect(Math.abs(web.slenderness - figure(expected, 'cw_tw'))).toBeLessThan(0.01);
		expect(flange.class).toBe(expected.flange_class);
		expect(web.class).toBe(expected.web_class);
		expect(analysis.resistance?.basis).toBe('effective-class-2');
		const Wel = analysis.gross.elasticModulusYTop;
		expect(Math.abs(Wel - figure(expected, 'Wel_y_mm3'))).toBeLessThan(2);
	});

	const cl06 = workedExample('CL06');
	it(`${cl06.id}: ${cl06.source}`, () => {
		const { inputs, expected } = cl06;
		const of = (name: string) => figure(inputs, name);
		const tube: SectionDefinition = {
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: of('h'),
			b: of('b'),
			t: of('t'),
			grade: of('fy')
		};
		const analysis = analysed(tube, compression);
		const flange = element(analysis, 'topFlange').slenderness;
		const web = element(analysis, 'leftWeb').slenderness;
		expect(Math.abs(flange - figure(expected, 'c_t_flange'))).toBeLessThan(0.01);
		expect(Math.abs(web - figure(expected, 'c_t_web'))).toBeLessThan(0.01);
		expect(analysis.classification?.overall).toBe(expected.section_class_pure_compression);
	});

	it.each([
		['CL08', compression],
		['CL09', undefined]
	])('%s: c/t of both parts and the class of the section', (id, request) => {
		const example = workedExample(id);
		const analysis = analysed(rolledI(example), request);
		const { expected } = example;
		const [flange, web] = [element(analysis, 'topFlange'), element(analysis, 'web')];
		expect(Math.abs(flange.slenderness - figure(expected, 'cf_tf'))).toBeLessThan(0.01);
		expect(Math.abs(web.slenderness - figure(expected, 'cw_tw'))).toBeLessThan(0.01);
		expect(analysis.classification?.overall).toBe(expected.section_class);
	});

	it.each([
		['CL14', compression],
		['CL18', undefined],
		['CL19', undefined]
	])('%s: class in the producer’s tables', (id, request) => {
		const example = workedExample(id);
		const analysis = analysed(rolledI(example), request);
		expect(analysis.classification?.overall).toBe(example.expected.section_class);
	});

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

/** h, b, tw, tf, r of EN 10365. */
type RolledRow = [name: string, h: number, b: number, tw: number, tf: number, r: number];

const beam = ([, h, b, tw, tf, r]: RolledRow, fy: number): SectionDefinition => ({
	kind: 'i',
	fabrication: 'rolled',
	h,
	b,
	tw,
	tf,
	r,
	grade: fy
});

// ArcelorMittal, Sections and Merchant Bars, class columns by EN 1993-1-1:2005 (from memory).
describe('class columns of the producer’s tables', () => {
	it.each<[RolledRow, number]>([
		[['HE 160 A', 152, 160, 6, 9, 15], 1],
		[['HE 180 A', 171, 180, 6, 9.5, 15], 2],
		[['HE 200 A', 190, 200, 6.5, 10, 18], 2],
		[['HE 220 A', 210, 220, 7, 11, 18], 2],
		[['HE 240 A', 230, 240, 7.5, 12, 21], 2],
		[['HE 260 A', 250, 260, 7.5, 12.5, 24], 3],
		[['HE 280 A', 270, 280, 8, 13, 24], 3],
		[['HE 300 A', 290, 300, 8.5, 14, 27], 3],
		[['HE 320 A', 310, 300, 9, 15.5, 27], 2],
		[['HE 340 A', 330, 300, 9.5, 16.5, 27], 1],
		[['HE 300 B', 300, 300, 11, 19, 27], 1]
	])('%s in S355, bent about y', (row, expected) => {
		expect(analysed(beam(row, 355)).classification?.byCase.plusMy).toBe(expected);
	});

	it.each<[RolledRow, number, number]>([
		[['IPE 200', 200, 100, 5.6, 8.5, 12], 1, 2],
		[['IPE 240', 240, 120, 6.2, 9.8, 15], 1, 2],
		[['IPE 270', 270, 135, 6.6, 10.2, 15], 2, 3],
		[['IPE 300', 300, 150, 7.1, 10.7, 15], 2, 4],
		[['IPE 400', 400, 180, 8.6, 13.5, 21], 3, 4],
		[['IPE 500', 500, 200, 10.2, 16, 21], 3, 4],
		[['IPE 600', 600, 220, 12, 19, 24], 4, 4]
	])('%s in compression, S235 and S355', (row, mild, strong) => {
		const compressed = (fy: number) => analysed(beam(row, fy)).classification?.byCase.compression;
		expect([compressed(235), compressed(355)]).toEqual([mild, strong]);
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
