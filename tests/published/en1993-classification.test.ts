import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
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
	it(`${ef02.id}: no resistance while effective widths are not built. ${ef02.source}`, () => {
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
		const analysis = analysed(girder);
		expect(analysis.classification?.overall).toBe(4);
		expect(analysis.resistance).toMatchObject({ MyRd: null, MyRdNegative: null, NRd: null });
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
