import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../section/definition';
import { effectiveSection } from './effective/effective-section';
import { lateralTorsional } from './lateral-torsional';
import { reductionAtStress } from './effective/reduction';
import { flangeShare } from './shear-buckling-flange';
import { panelBuckling } from './shear-buckling';
import { classUnder, testModel } from './test-model';

/** Class of one size of plate on a limit, and one step beyond it. */
function besides(
	size: (slenderness: number) => SectionDefinition,
	effects: Parameters<typeof classUnder>[1],
	limits: readonly number[]
) {
	return limits.map((limit) =>
		[1 - 1e-9, 1 + 1e-9].map((step) => classUnder(size(limit * step), effects).overall)
	);
}

const pressed = { N: -1 };

describe('classes on and beside limits, fy 235 (ε 1), Table 5.2 worked by hand', () => {
	it('channel in compression: web c = h − 2(tf + r) at 33, 38, 42; flange c = b − tw − r at 9, 10, 14', () => {
		const web = (slenderness: number): SectionDefinition => ({
			kind: 'channel',
			h: 10 * slenderness + 60,
			b: 60,
			tw: 10,
			tf: 20,
			r: 10,
			grade: 235
		});
		expect(besides(web, pressed, [33, 38, 42])).toEqual([
			[1, 2],
			[2, 3],
			[3, 4]
		]);
		const flange = (slenderness: number): SectionDefinition => ({
			kind: 'channel',
			h: 140,
			b: 10 * slenderness + 20,
			tw: 10,
			tf: 10,
			r: 10,
			grade: 235
		});
		expect(besides(flange, pressed, [9, 10, 14])).toEqual([
			[1, 2],
			[2, 3],
			[3, 4]
		]);
	});

	it('welded tee in compression: stem c = h − tf at 9, 10, 14', () => {
		const tee = (slenderness: number): SectionDefinition => ({
			kind: 'tee',
			fabrication: 'welded',
			h: 10 * slenderness + 20,
			b: 150,
			tw: 10,
			tf: 20,
			grade: 235
		});
		expect(besides(tee, pressed, [9, 10, 14])).toEqual([
			[1, 2],
			[2, 3],
			[3, 4]
		]);
	});

	it('equal angle in compression: (b + h)/(2t) within 11.5 is the last of class 3', () => {
		const angle = (slenderness: number): SectionDefinition => ({
			kind: 'angle',
			h: 10 * slenderness,
			b: 10 * slenderness,
			t: 10,
			grade: 235
		});
		expect(classUnder(angle(11.5 * (1 + 1e-9)), pressed).overall).toBe(4);
		expect(classUnder(angle(11.5), pressed).overall).toBeLessThan(4);
	});

	it('box in compression: flange between webs at 33, 38, 42', () => {
		const box = (slenderness: number): SectionDefinition => ({
			kind: 'box',
			h: 220,
			b: 10 * slenderness + 40,
			tw: 20,
			tfTop: 10,
			tfBottom: 10,
			webGap: 10 * slenderness,
			grade: 235
		});
		expect(besides(box, pressed, [33, 38, 42])).toEqual([
			[1, 2],
			[2, 3],
			[3, 4]
		]);
	});
});

describe('reduction by stress level, EN 1993-1-5 4.4(4)', () => {
	it('internal λp 1.2, σ/fyd 0.5, ψ 1: by hand 0.8730 + 0.1054', () => {
		// λred = 1.2√0.5 = 0.848528; (1 − 0.22/0.848528)/0.848528 + 0.18·(0.351472/0.6)
		const red = 1.2 * Math.sqrt(0.5);
		expect(red).toBeCloseTo(0.848528, 6);
		expect(reductionAtStress('internal', 1.2, red, 1)).toBeCloseTo(0.872955 + 0.105442, 5);
	});

	it('outstand λp 1.2, σ/fyd 0.5: (1 − 0.188/λred)/λred + 0.18(λp − λred)/(λp − 0.6)', () => {
		const red = 1.2 * Math.sqrt(0.5);
		const own = (1 - 0.188 / red) / red + (0.18 * (1.2 - red)) / 0.6;
		expect(reductionAtStress('outstand', 1.2, red, 1)).toBeCloseTo(Math.min(1, own), 12);
	});
});

describe('flange contribution to shear buckling, EN 1993-1-5 5.4', () => {
	it('web 1500×8, flanges 300×25, a 2000, fy 235, My 1000 kNm: 82.6 kN times 1 − (1000/2687.8)²', () => {
		const definition: SectionDefinition = {
			kind: 'i',
			fabrication: 'welded',
			h: 1550,
			b: 300,
			tw: 8,
			tf: 25,
			grade: 235
		};
		const stiffeners = { spacing: 2000, endPost: 'rigid' } as const;
		const model = { ...testModel(definition), stiffeners };
		const web = { part: 'web', depth: 1500, thickness: 8, support: 'both-edges' } as const;
		const panel = panelBuckling(model, web, 235);
		// bf tf² = 187 500 mm³; c = 2000(0.25 + 1.6·187500/(8·1500²)) = 2000·0.2666667 = 533.33 mm
		// Mf = 7500·235·1525 = 2687.8 kNm; 187500·235/533.33 = 82.617 kN · (1 − (1000/2687.8)²)
		const Mf = 7500 * 235 * 1525e-6;
		const expected = ((187_500 * 235) / 533.3333333333334 / 1e3) * (1 - (1000 / Mf) ** 2);
		expect(flangeShare(model, panel, { My: 1000 })!.Vbf).toBeCloseTo(expected, 9);
	});
});

describe('critical moments against the closed form', () => {
	const E = 210_000;
	const G = E / 2.6;

	it('channel bent about y: π²EIz/L² √(Iw/Iz + L²GIt/(π²EIz)) with the section’s own constants', () => {
		const model = testModel({
			kind: 'channel',
			h: 200,
			b: 75,
			tw: 8.5,
			tf: 11.5,
			r: 11.5,
			grade: 275
		});
		const { secondMomentZ: Iz, torsionConstant: It, warpingConstant: Iw } = model.section.gross;
		const L = 3000;
		const euler = (Math.PI ** 2 * E * Iz) / L ** 2;
		const { value } = lateralTorsional(model, { My: 10, unbracedLength: L }, 'one', 60);
		expect(value!.Mcr).toBeCloseTo(euler * Math.sqrt(Iw! / Iz + (G * It!) / euler) * 1e-6, 9);
	});

	it('rolled curve with f: λ 1.0, C1 1.77: kc 0.7516, f 0.8857, χ as (6.57)', () => {
		const model = testModel(
			{ kind: 'i', fabrication: 'rolled', h: 400, b: 180, tw: 8.6, tf: 13.5, r: 21, grade: 275 },
			{ ltbCurves: 'rolled-or-equivalent' }
		);
		const at = (Mk: number) =>
			lateralTorsional(model, { My: 10, unbracedLength: 6000, C1: 1.77 }, 'one', Mk).value!;
		const { Mcr } = at(100);
		const found = at(Mcr);
		expect(found.lambda).toBeCloseTo(1, 9);
		// h/b 2.22: curve c, α 0.49; Φ = 0.5(1 + 0.49·0.6 + 0.75) = 1.022
		const chi = 1 / (1.022 + Math.sqrt(1.022 ** 2 - 0.75));
		const f = 1 - 0.5 * (1 - 1 / Math.sqrt(1.77)) * (1 - 2 * 0.04);
		expect(found.f).toBeCloseTo(f, 9);
		expect(found.chi).toBeCloseTo(Math.min(1, chi / f), 9);
	});
});

describe('cover plate and stiffened plate, c and ρ by hand', () => {
	it('a cover plate 400×8 welded along its edges on a flange 300×20 has the internal width 300 between welds', () => {
		const plate = (name: string, z: number, width: number, thickness: number, angle: number) => ({
			name,
			y: 0,
			z,
			width,
			thickness,
			angle
		});
		const model = testModel({
			kind: 'plates',
			grade: 235,
			plates: [
				plate('bottom', 10, 300, 20, 0),
				plate('web', 220, 400, 12, 90),
				plate('top', 430, 300, 20, 0),
				plate('cover', 444, 400, 8, 0)
			]
		});
		if (model.elements.kind !== 'plates') throw new Error('no plates');
		const cover = model.elements.plates.filter(({ part }) => part === 'cover');
		expect(cover.map(({ type, c }) => [type, Math.round(c)]).sort()).toEqual([
			['internal', 300],
			['outstand', 50],
			['outstand', 50]
		]);
		// In compression: 300/8 = 37.5 is under 42 and λp = 37.5/(28.4·2) = 0.660 < 0.673: all counts.
		const effective = effectiveSection(model, 'N');
		expect(effective?.elements.find((one) => one.part === 'cover')?.rho ?? 1).toBe(1);
	});
});
