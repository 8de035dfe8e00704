import { describe, expect, it } from 'vitest';
import { testModel } from '../test-model';
import { effectiveAxial } from './effective-axial';
import { effectiveMoment } from './effective-moment';
import { effectiveSection } from './effective-section';

// EN 1993-1-5 4.4(2), Tables 4.1 and 4.2, written out for each case; S355, t ≤ 16 mm
const fy = 355;
const epsilon = Math.sqrt(235 / fy);
const slenderness = (b: number, t: number, k: number) => b / t / (28.4 * epsilon * Math.sqrt(k));
const internal = (lambda: number, psi: number) => (lambda - 0.055 * (3 + psi)) / lambda ** 2;
const outstand = (lambda: number) => (lambda - 0.188) / lambda ** 2;

/** Rectangles by width, height and level of the middle. */
function gathered(rectangles: readonly (readonly [number, number, number])[]) {
	const area = rectangles.reduce((sum, [b, h]) => sum + b * h, 0);
	const z = rectangles.reduce((sum, [b, h, at]) => sum + b * h * at, 0) / area;
	const I = rectangles.reduce(
		(sum, [b, h, at]) => sum + (b * h ** 3) / 12 + b * h * (at - z) ** 2,
		0
	);
	return { area, z, I };
}

describe('effective sections worked by hand', () => {
	it('box in compression: flange 700 × 8, 700 × 10 and webs 982 × 6, short outstands whole', () => {
		const model = testModel({
			kind: 'box',
			h: 1000,
			b: 752,
			tw: 6,
			tfTop: 8,
			tfBottom: 10,
			webGap: 700,
			grade: 'S355'
		});
		const lost = (b: number, t: number) => b * t * (1 - internal(slenderness(b, t, 4), 1));
		const gross = 752 * 18 + 2 * 982 * 6;
		const [top, bottom, web] = [lost(700, 8), lost(700, 10), lost(982, 6)];
		const axial = effectiveAxial(model)!;
		const area = gross - top - bottom - 2 * web;
		expect(axial.effective.area).toBeCloseTo(area, 6);
		expect(axial.value).toBeCloseTo(area * fy * 1e-3, 6);
		const { z } = model.section.gross.centroid;
		const shift = -(top * (996 - z) + bottom * (5 - z) + 2 * web * (501 - z)) / area;
		expect(axial.shiftZ).toBeCloseTo(shift, 6);
		expect(axial.shiftY).toBeCloseTo(0, 9);
	});

	it('tee with the tip of its stem compressed', () => {
		const [h, b, tw, tf] = [500, 200, 8, 14];
		const model = testModel({ kind: 'tee', fabrication: 'welded', h, b, tw, tf, grade: 'S355' });
		const gross = gathered([
			[b, tf, h - tf / 2],
			[tw, h - tf, (h - tf) / 2]
		]);
		const c = h - tf;
		const psi = -(c - gross.z) / gross.z;
		const rho = outstand(slenderness(c, tw, 0.57 - 0.21 * psi + 0.07 * psi ** 2));
		const lost = (1 - rho) * (c / (1 - psi));
		const left = gathered([
			[b, tf, h - tf / 2],
			[tw, c - lost, (c + lost) / 2]
		]);
		const moment = effectiveMoment(model, 'minusMy')!;
		expect(moment.effective.area).toBeCloseTo(left.area, 6);
		expect(moment.effective.centroid.z).toBeCloseTo(left.z, 8);
		expect(moment.effective.secondMomentY / left.I).toBeCloseTo(1, 10);
		const lever = Math.max(left.z - lost, h - left.z);
		expect(moment.value).toBeCloseTo((left.I / lever) * fy * 1e-6, 8);
	});

	it('I bent about z: both flanges lose their compressed tips', () => {
		const [h, b, tw, tf] = [400, 500, 10, 8];
		const model = testModel({ kind: 'i', fabrication: 'welded', h, b, tw, tf, grade: 'S355' });
		const c = (b - tw) / 2;
		const psi = tw / b;
		const rho = outstand(slenderness(c, tf, 0.57 - 0.21 * psi + 0.07 * psi ** 2));
		const lost = (1 - rho) * c;
		// seen turned: flanges upright, the compressed tip at the bottom
		const left = gathered([
			[2 * tf, b - lost, (b + lost) / 2],
			[h - 2 * tf, tw, b / 2]
		]);
		const found = effectiveSection(model, '+Mz')!;
		expect(found.area).toBeCloseTo(left.area, 6);
		expect(found.centroid.y).toBeCloseTo(left.z, 8);
		expect(found.secondMomentZ / left.I).toBeCloseTo(1, 10);
		const lever = Math.max(left.z - lost, b - left.z);
		const elastic = model.moments.plusMz.firstYield!;
		const expected = Math.min((left.I / lever) * fy * 1e-6, elastic);
		expect(effectiveMoment(model, 'plusMz')!.value).toBeCloseTo(expected, 8);
	});

	it('square tube in compression: four walls of b − 3t', () => {
		const [b, t] = [300, 5];
		const model = testModel({
			kind: 'rectangular-hollow',
			h: b,
			b,
			t,
			ro: 10,
			ri: 5,
			fabrication: 'cold-formed',
			grade: 'S355'
		});
		const c = b - 3 * t;
		const lost = 4 * c * t * (1 - internal(slenderness(c, t, 4), 1));
		const axial = effectiveAxial(model)!;
		expect(axial.effective.area).toBeCloseTo(model.section.gross.area - lost, 6);
	});

	it('web over a heavy pulled flange: ψ from the axis of its whole flanges and gross web', () => {
		const model = testModel({
			kind: 'i',
			fabrication: 'welded',
			h: 900,
			b: 200,
			tf: 12,
			bBottom: 900,
			tfBottom: 16,
			tw: 10,
			grade: 'S355'
		});
		const { elements } = effectiveSection(model, '+My')!;
		const web = elements.find(({ element }) => element === 'web')!;
		const { z } = model.section.gross.centroid;
		expect(web.psi).toBeCloseTo((16 - z) / (888 - z), 9);
		const psi = web.psi;
		const k = psi < 0 ? 7.81 - 6.29 * psi + 9.78 * psi ** 2 : 8.2 / (1.05 + psi);
		expect(web.kSigma).toBeCloseTo(k, 12);
		expect(web.slenderness).toBeCloseTo(slenderness(872, 10, k), 9);
	});
});
