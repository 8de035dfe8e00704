import { describe, expect, it } from 'vitest';
import { codeChoice } from '../../src/lib/engine/rules/code-choice';
import { lateralTorsional } from '../../src/lib/engine/rules/en1993/lateral-torsional';
import { momentUnderShear } from '../../src/lib/engine/rules/en1993/moment-shear';
import { shearResistances } from '../../src/lib/engine/rules/en1993/shear-resistance';
import { testModel } from '../../src/lib/engine/rules/en1993/test-model';
import type { ISection } from '../../src/lib/engine/section/definition';
import { figure, rolledI, workedExample, type WorkedExample } from './en1993-example';

/** The example's web in a girder with flanges 400×20, which take no part in Vbw,Rd. */
function girder({ inputs }: WorkedExample): ISection {
	const fyw = figure(inputs, 'fyw');
	const h = figure(inputs, 'hw') + 40;
	const sizes = { h, b: 400, tf: 20, tw: figure(inputs, 'tw') };
	return { kind: 'i', fabrication: 'welded', ...sizes, grade: fyw };
}

const near = (value: number, expected: number, tolerance: number) =>
	expect(Math.abs(value - expected)).toBeLessThanOrEqual(tolerance);

describe('shear buckling by EN 1993-1-5 clause 5 against published examples', () => {
	const sh01 = workedExample('SH01');
	it(`${sh01.id}: ${sh01.source}`, () => {
		const { z } = shearResistances(testModel(girder(sh01)), true);
		near(z!.buckling!.slenderness, figure(sh01.expected, 'lam_w'), 0.006);
		near(z!.buckling!.chiW, figure(sh01.expected, 'chi_w'), 0.001);
		near(z!.buckling!.Vbw, figure(sh01.expected, 'Vbw_Rd_kN'), 0.002 * 1197);
		expect(z!.buckling!.Vbf).toBe(0);
	});

	const sh02 = workedExample('SH02');
	it(`${sh02.id}: ${sh02.source}`, () => {
		const stiffeners = { spacing: figure(sh02.inputs, 'a'), endPost: 'non-rigid' } as const;
		const { z } = shearResistances({ ...testModel(girder(sh02)), stiffeners }, true);
		near(z!.buckling!.kTau, figure(sh02.expected, 'k_tau'), 0.005);
		near(z!.buckling!.Vbw, figure(sh02.expected, 'Vbw_Rd_kN'), 0.002 * 1583);
	});

	const sh03 = workedExample('SH03');
	it(`${sh03.id}: ${sh03.source}`, () => {
		const { inputs, expected } = sh03;
		const stiffeners = { spacing: figure(inputs, 'a'), endPost: 'rigid' } as const;
		const code = { gammaM1: figure(inputs, 'gammaM1') };
		const { z } = shearResistances({ ...testModel(girder(sh03), code), stiffeners }, true);
		near(z!.buckling!.kTau, figure(expected, 'k_tau'), 0.01);
		near(z!.buckling!.slenderness, figure(expected, 'lam_w'), 0.01);
		near(z!.buckling!.chiW, figure(expected, 'chi_w'), 0.005);
		near(z!.buckling!.Vbw / 1000, figure(expected, 'Vbw_Rd_MN'), 0.005 * 4.44);
	});
});

describe('plastic shear and its moment by EN 1993-1-1:2005 6.2.6 and 6.2.8 against published examples', () => {
	const sh13 = workedExample('SH13');
	it(`${sh13.id}: ${sh13.source}`, () => {
		const { z } = shearResistances(
			testModel({
				kind: 'rectangular-hollow',
				fabrication: 'hot-finished',
				h: 200,
				b: 100,
				t: 16,
				grade: figure(sh13.inputs, 'fy')
			}),
			true
		);
		near(z!.resistance, figure(sh13.expected, 'Vpl_Rd_kN'), 1);
	});

	const mv01 = workedExample('MV01');
	it(`${mv01.id}: ${mv01.source}`, () => {
		const model = testModel(rolledI(mv01));
		const { z } = shearResistances(model, true);
		const Mc = model.moments.plusMy.plastic.moment!;
		const counted = { value: Mc, overall: 1 } as const;
		const under = momentUnderShear(model, 'plusMy', counted, figure(mv01.inputs, 'VEd_kN'), z);
		const { expected } = mv01;
		near(z!.plastic, figure(expected, 'Vpl_Rd_kN'), 0.3);
		near(under.rho, figure(expected, 'rho'), 0.006);
		near(under.MyVRd!, figure(expected, 'MyV_Rd_kNm'), 0.4);
		near(Mc, figure(expected, 'Mc_Rd_kNm'), 1);
	});

	it.each([
		// ArcelorMittal sections and merchant bars, column Avz, cm² (from memory)
		['IPE 300', { h: 300, b: 150, tw: 7.1, tf: 10.7, r: 15 }, 25.68],
		['HE 300 A', { h: 290, b: 300, tw: 8.5, tf: 14, r: 27 }, 37.28],
		['HE 300 B', { h: 300, b: 300, tw: 11, tf: 19, r: 27 }, 47.43]
	] as const)('%s has the Av of the published tables', (_, sizes, expected) => {
		const model = testModel(
			{ kind: 'i', fabrication: 'rolled', ...sizes, grade: 235 },
			codeChoice({ eta: 1 })
		);
		near(shearResistances(model, true).z!.area / 100, expected, 0.01);
	});
});

describe('lateral–torsional buckling by EN 1993-1-1:2005 6.3.2.2 against a published example', () => {
	// Gardner & Nethercot, Designers' Guide to EN 1993-1-1, Example 6.8 (from memory): 762×267×173 UB, S275
	// at its thickness 275, segment BC of 3.2 m with C1 1.052: Mcr 5699, λLT 0.55, χLT 0.86, Mb 1469 kNm.
	it('762×267×173 UB over 3.2 m: Mcr 5699 kNm, Mb,Rd 1469 kNm', () => {
		const sizes = { h: 762.2, b: 266.7, tw: 14.3, tf: 21.6, r: 16.5 };
		const model = testModel({ kind: 'i', fabrication: 'rolled', ...sizes, grade: 275 });
		const demand = { My: 1362, unbracedLength: 3200, C1: 1.052 };
		const Mk = model.moments.plusMy.plastic.moment!;
		const { value } = lateralTorsional(model, demand, 'BC', Mk);
		near(value!.Mcr, 5699, 0.01 * 5699);
		near(value!.lambda, 0.55, 0.005);
		expect(value!.curve).toBe('b');
		near(value!.chi, 0.86, 0.005);
		near(value!.MbRd, 1469, 0.005 * 1469);
	});
});
