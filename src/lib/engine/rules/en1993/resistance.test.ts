import { describe, expect, it } from 'vitest';
import type { ISection, SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { analyse, type AnalyseRequest } from '../analyse';

function analysed(definition: SectionDefinition, request?: AnalyseRequest) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	const analysis = analyse(section.value, request);
	const { resistance } = analysis;
	if (!resistance) throw new Error('no resistance');
	return { ...analysis, resistance, codes: analysis.notes.map(({ code }) => code) };
}

const welded = (sizes: Partial<ISection> = {}): ISection => ({
	kind: 'i',
	fabrication: 'welded',
	h: 600,
	b: 200,
	tw: 6,
	tf: 20,
	weldLeg: 6,
	grade: 275,
	...sizes
});

/** Stocky welded I without fillets, class 1: flanges 200×20, web 260×10, fy 235. */
const stocky = welded({ h: 300, tw: 10, weldLeg: 0, grade: 235 });

describe('class 3 web as effective class 2 (6.2.2.4), by hand', () => {
	it('keeps 20εtw at the flange and at the plastic axis of the effective section', () => {
		// ε = √(235/275); strip 20·ε·6 = 110.93; kept 6 + 2·110.93 = 227.87 = stretched web;
		// axis 560 − 227.87 = 332.13 from the compression flange. Near strip 116.93.
		const strip = 120 * Math.sqrt(235 / 275);
		const stretched = 6 + 2 * strip;
		const axis = 560 - stretched;
		const near = 6 + strip;
		const web = near * (axis - near / 2) + strip ** 2 / 2 + stretched ** 2 / 2;
		const expected = (200 * 20 * 275 * 580 + 6 * 275 * web) * 1e-6;
		const { resistance } = analysed(welded());
		expect(expected).toBeCloseTo(743.8, 1);
		expect(resistance.MyRd).toBeCloseTo(expected, 6);
		expect(resistance.MyRdNegative).toBeCloseTo(expected, 6);
	});

	it('can be refused, and then first yield counts: 275 · 2 536 249 mm³', () => {
		const { resistance } = analysed(welded(), { code: { allowEffectiveClass2: false } });
		expect(resistance.basis).toBe('elastic');
		// Wel: Gardner & Nethercot, example 6.3.
		expect(resistance.MyRd).toBeCloseTo(275 * 2.536249, 2);
	});

	it('is not used with axial force', () => {
		const { demands } = analysed(welded(), { demands: [{ My: 100, N: -1 }] });
		expect(demands[0]?.countableBasis).toBe('elastic');
	});

	it('counts the root fillets of a rolled section', () => {
		// As welded I with the fillets' spandrels added at both flanges: each 2(1 − π/4)r² of area.
		const rolled = welded({ fabrication: 'rolled', r: 6 });
		const area = 2 * (1 - Math.PI / 4) * 36;
		const lever = 560 - (2 * 6 * (10 - 3 * Math.PI)) / (12 - 3 * Math.PI);
		const more =
			(analysed(rolled).resistance.MyRd ?? 0) - (analysed(welded()).resistance.MyRd ?? 0);
		expect(more).toBeCloseTo(area * 275 * lever * 1e-6, 6);
	});

	it('finds the same for a box with two webs of half the force', () => {
		const box: SectionDefinition = {
			kind: 'box',
			h: 600,
			b: 212,
			tw: 6,
			tfTop: 20,
			tfBottom: 20,
			webGap: 200,
			grade: 275
		};
		const { resistance, classification } = analysed(box);
		const strip = 120 * Math.sqrt(235 / 275);
		const axis = 560 - 2 * strip;
		const web = strip * (axis - strip / 2) + strip ** 2 / 2 + (2 * strip) ** 2 / 2;
		expect(classification?.overall).toBe(3);
		expect(resistance.MyRd).toBeCloseTo((212 * 20 * 275 * 580 + 12 * 275 * web) * 1e-6, 6);
	});
});

describe('resistances of a stocky section, by hand', () => {
	const { resistance } = analysed(stocky, { code: { gammaM0: 1.1 } });

	it('are full plastic moments over γM0', () => {
		const Wply = 200 * 20 * 280 + (10 * 260 ** 2) / 4;
		const Wplz = (2 * 20 * 200 ** 2) / 4 + (260 * 10 ** 2) / 4;
		expect(resistance.MyRd).toBeCloseTo((Wply * 235e-6) / 1.1, 9);
		expect(resistance.MzRd).toBeCloseTo((Wplz * 235e-6) / 1.1, 9);
	});

	it('are A fy over γM0 along the member', () => {
		expect(resistance.NRd).toBeCloseTo((10600 * 0.235) / 1.1, 9);
		expect(resistance.NtRd).toBeCloseTo((10600 * 0.235) / 1.1, 9);
	});

	it('are Av fy/√3 in shear: 1.2 hw tw along the web, the flanges across it', () => {
		const strength = 0.235 / Math.sqrt(3) / 1.1;
		expect(resistance.VzRd).toBeCloseTo(1.2 * 2600 * strength, 9);
		expect(resistance.VyRd).toBeCloseTo(8000 * strength, 9);
	});

	it('have 2A/π in shear for a round tube', () => {
		const tube: SectionDefinition = { kind: 'circular-hollow', d: 219.1, t: 10, grade: 355 };
		const area = Math.PI * (219.1 - 10) * 10;
		const { VzRd, VyRd } = analysed(tube).resistance;
		expect(VzRd).toBeCloseTo((((2 * area) / Math.PI) * 0.355) / Math.sqrt(3), 6);
		expect(VyRd).toBe(VzRd);
	});

	it('have η hw tw of both webs for a box, with the strength of the webs', () => {
		const box: SectionDefinition = {
			kind: 'box',
			h: 340,
			b: 320,
			tw: 10,
			tfTop: 20,
			tfBottom: 20,
			webGap: 200,
			grade: 355,
			partGrades: { leftWeb: 235, rightWeb: 235 }
		};
		const { VzRd } = analysed(box).resistance;
		expect(VzRd).toBeCloseTo((1.2 * 2 * 300 * 10 * 0.235) / Math.sqrt(3), 6);
	});
});

describe('hybrid girders', () => {
	/** Flanges 460, web 355, class 3 flanges: c/t 9.5·… over 10ε of 460. */
	const hybrid = welded({
		h: 540,
		b: 230,
		tf: 14,
		tw: 12,
		weldLeg: 0,
		grade: 460,
		partGrades: { web: 235 }
	});

	it('end class 3 at the first yield of any fibre, here the web edge', () => {
		const { resistance, classification, gross, codes } = analysed(hybrid);
		expect(classification?.overall).toBe(3);
		// Web edge at 256 mm with fy 235 yields before the flange at 270 mm with fy 460.
		expect(resistance.MyRd).toBeCloseTo(((235 * gross.secondMomentY) / 256) * 1e-6, 6);
		expect(codes).toContain('hybrid-first-yield');
	});

	it('take the weakest strength for N where forces do not balance about the centroid', () => {
		const uneven = welded({ h: 300, tw: 10, grade: 235, partGrades: { topFlange: 355 } });
		const { resistance, gross } = analysed(uneven);
		expect(resistance.NRd).toBeCloseTo(gross.area * 0.235, 6);
	});

	it('take each part at its own strength where they do', () => {
		const even = welded({ h: 300, tw: 10, grade: 355, partGrades: { web: 235 } });
		expect(analysed(even).resistance.NtRd).toBeCloseTo(8000 * 0.355 + 2600 * 0.235, 6);
	});
});

describe('nothing favourable by omission', () => {
	it('gives a class 4 web its effective area in compression', () => {
		// IPE 300, c/t 248.6/7.1 over 42ε; EN 1993-1-5 Table 4.1: k 4, ρ = (λp − 0.22)/λp².
		const ipe = welded({
			fabrication: 'rolled',
			h: 300,
			b: 150,
			tw: 7.1,
			tf: 10.7,
			r: 15,
			grade: 355
		});
		const { resistance, gross, effective } = analysed(ipe, { demands: [{ N: -10 }] });
		const lambda = 248.6 / 7.1 / (56.8 * Math.sqrt(235 / 355));
		const lost = (1 - (lambda - 0.22) / lambda ** 2) * 248.6 * 7.1;
		expect(resistance.NRd).toBeCloseTo((gross.area - lost) * 0.355, 6);
		expect(effective).toMatchObject({ basis: 'N', area: expect.closeTo(gross.area - lost, 6) });
		expect(resistance.utilisation?.governing).toBe('compression');
	});

	it('lowers the moment where shear exceeds half of its resistance', () => {
		const { VzRd } = analysed(stocky).resistance;
		const at = (share: number) =>
			analysed(stocky, { demands: [{ My: 10, Vz: share * (VzRd ?? 0) }] });
		expect(at(0.5).resistance.MyVRd).toBeUndefined();
		expect(at(0.5).demands[0]?.countable).toBeCloseTo(302.915, 6);
		// 6.2.8(5): Wpl − ρ (260·10)²/40, ρ = 0.02².
		const lost = (0.02 ** 2 * 2600 ** 2 * 235e-6) / 40;
		expect(at(0.51).resistance.MyVRd).toBeCloseTo(302.915 - lost, 9);
		expect(at(0.51).demands[0]?.countable).toBeCloseTo(302.915 - lost, 9);
	});

	it('judges high shear alone', () => {
		const { VzRd } = analysed(stocky).resistance;
		const alone = analysed(stocky, { demands: [{ Vz: 0.8 * (VzRd ?? 0) }] });
		expect(alone.resistance.utilisation?.value).toBeCloseTo(0.8, 12);
	});

	it('puts N, My and Mz together by the curve of 6.2.9.1(6)', () => {
		const { resistance } = analysed(stocky, { demands: [{ N: -500, My: 60, Mz: 20 }] });
		const n = 500 / 2491;
		const MNy = (302.915 * (1 - n)) / (1 - 0.5 * (2600 / 10600));
		const sum = (60 / MNy) ** 2 + (20 / (resistance.MzRd ?? 0)) ** Math.max(1, 5 * n);
		const check = resistance.checks.find(({ clause }) => clause.includes('6.2.9.1(6)'));
		expect(check?.utilisation).toBeCloseTo(sum, 12);
	});

	it('has no utilisation when a length and a thrust call for member buckling', () => {
		const long = { My: 60, N: -1, unbracedLength: 6000 };
		expect(analysed(stocky, { demands: [long] }).resistance.utilisation).toBeNull();
		const square: SectionDefinition = {
			kind: 'rectangular-hollow',
			fabrication: 'hot-finished',
			h: 200,
			b: 200,
			t: 10,
			grade: 355
		};
		const tube = analysed(square, { demands: [{ My: 60, unbracedLength: 6000 }] });
		expect(tube.resistance.utilisation).not.toBeNull();
		expect(tube.codes).not.toContain('ltb-not-checked');
	});

	it('says that lateral–torsional buckling is not checked even when no length is given', () => {
		const analysis = analysed(stocky, { demands: [{ My: 60 }] });
		expect(analysis.codes).toContain('ltb-not-checked');
		expect(analysis.resistance.utilisation).not.toBeNull();
		expect(analysed(stocky, { demands: [{ Mz: 6 }] }).codes).not.toContain('ltb-not-checked');
	});

	it('has no figure for holes in a pulled part whose grade gives no fu', () => {
		const holes = [{ part: 'topFlange', diameter: 22, count: 2 }];
		const { resistance, codes } = analysed({ ...stocky, boltHoles: holes });
		expect(resistance.MyRd).not.toBeNull();
		expect(resistance).toMatchObject({ MyRdNegative: null, MzRd: null, NtRd: null });
		expect(resistance.NRd).not.toBeNull();
		expect(codes).toContain('net-section-not-checked');
		const pulled = analysed({ ...stocky, boltHoles: holes }, { demands: [{ My: -10 }] });
		expect(pulled.resistance.utilisation).toBeNull();
	});

	it('has no figure when one of several demands has none', () => {
		const demands = [{ My: 10 }, { My: 10, N: -1, unbracedLength: 3000 }];
		const analysis = analysed(stocky, { demands });
		expect(analysis.resistance.utilisation).toBeNull();
		expect(analysis.demands.map(({ utilisation }) => utilisation === null)).toEqual([false, true]);
	});
});
