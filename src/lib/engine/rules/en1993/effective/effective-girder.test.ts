import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ISection } from '../../../section/definition';
import { testModel } from '../test-model';
import { effectiveAxial } from './effective-axial';
import { effectiveMoment } from './effective-moment';
import { effectiveSection } from './effective-section';

/** A horizontal slice's width and the levels between which it stands. */
type Piece = readonly [width: number, low: number, high: number];

/** Area, centroid and second moment by adding up thin slices. */
function slices(pieces: readonly Piece[]) {
	let [area, first, second] = [0, 0, 0];
	for (const [width, low, high] of pieces)
		for (let i = 0; i < 2000; i++) {
			const thick = (high - low) / 2000;
			const z = low + (i + 0.5) * thick;
			area += width * thick;
			first += width * thick * z;
			second += width * thick * z * z;
		}
	const z = first / area;
	return { area, z, second: second - area * z * z };
}

/** EN 1993-1-5 4.4 for a welded I with its top compressed, written out plate by plate. */
function byHand({ h, b, tf, bBottom, tfBottom, tw, weldLeg, fy }: Girder) {
	const epsilon = Math.sqrt(235 / fy);
	const outstand = (b - tw) / 2 - weldLeg;
	const flange = outstand / tf / (28.4 * epsilon * Math.sqrt(0.43));
	const lost = flange <= 0.748 ? 0 : outstand * (1 - Math.min(1, (flange - 0.188) / flange ** 2));
	const top: Piece = [b - 2 * lost, h - tf, h];
	const bottom: Piece = [bBottom, 0, tfBottom];
	const axis = slices([top, bottom, [tw, tfBottom, h - tf]]).z;
	const [upper, lower] = [h - tf - weldLeg, tfBottom + weldLeg];
	const psi = (lower - axis) / (upper - axis);
	// a symmetric girder has −1 but for rounding
	const k =
		psi >= -1 - 1e-9 ? 7.81 - 6.29 * psi + 9.78 * psi ** 2 : 5.98 * (1 - Math.max(psi, -3)) ** 2;
	const web = (upper - lower) / tw / (28.4 * epsilon * Math.sqrt(k));
	const share = 3 + Math.max(psi, -3);
	const rho =
		web <= 0.5 + Math.sqrt(0.085 - 0.055 * (share - 3))
			? 1
			: Math.min(1, (web - 0.055 * share) / web ** 2);
	const compressed = (upper - lower) / (1 - psi);
	const high = upper - 0.4 * rho * compressed;
	const low = upper - compressed + 0.6 * rho * compressed;
	return slices([top, bottom, [tw, tfBottom, low], [tw, high, h - tf]]);
}

interface Girder {
	h: number;
	b: number;
	tf: number;
	bBottom: number;
	tfBottom: number;
	tw: number;
	weldLeg: number;
	fy: number;
}

const definitionOf = ({ fy, ...sizes }: Girder): ISection => ({
	kind: 'i',
	fabrication: 'welded',
	...sizes,
	grade: fy
});

/** The same section upside down. */
const turned = (girder: Girder): Girder => ({
	...girder,
	b: girder.bBottom,
	tf: girder.tfBottom,
	bBottom: girder.b,
	tfBottom: girder.tf
});

const between = (min: number, max: number) =>
	fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

/** Slender webs whose axis stays in the web. */
const girders: fc.Arbitrary<Girder> = fc.record({
	h: between(800, 2500),
	b: between(200, 600),
	tf: between(10, 40),
	bBottom: between(200, 600),
	tfBottom: between(10, 40),
	tw: between(5, 14),
	weldLeg: between(0, 8),
	fy: between(235, 460)
});

const near = (actual: number, expected: number, share = 1e-6) =>
	expect(Math.abs(actual / expected - 1)).toBeLessThan(share);

describe('effective section of a welded girder', () => {
	it('is that of the rules written out plate by plate and added up in thin slices', () => {
		fc.assert(
			fc.property(girders, (girder) => {
				const effective = effectiveSection(testModel(definitionOf(girder)), '+My')!;
				const { area, z, second } = byHand(girder);
				near(effective.area, area);
				near(effective.centroid.z, z);
				near(effective.secondMomentY, second);
				near(effective.elasticModulusYTop, second / (girder.h - z));
				near(effective.elasticModulusYBottom, second / z);
			}),
			{ numRuns: 30 }
		);
	});

	it('turns over with the section', () => {
		fc.assert(
			fc.property(girders, (girder) => {
				const upright = effectiveSection(testModel(definitionOf(girder)), '+My')!;
				const over = effectiveSection(testModel(definitionOf(turned(girder))), '−My')!;
				near(over.area, upright.area, 1e-12);
				near(over.elasticModulusYBottom, upright.elasticModulusYTop, 1e-10);
				near(over.converged.secondMomentY, upright.converged.secondMomentY, 1e-9);
				expect(over.centroidShiftZ + upright.centroidShiftZ).toBeCloseTo(0, 8);
			}),
			{ numRuns: 30 }
		);
	});

	it('is alike in bending to the left and to the right', () => {
		fc.assert(
			fc.property(girders, (girder) => {
				const model = testModel(definitionOf(girder));
				const [plus, minus] = [effectiveSection(model, '+Mz')!, effectiveSection(model, '−Mz')!];
				near(plus.secondMomentZ, minus.secondMomentZ, 1e-10);
				near(plus.elasticModulusZLeft, minus.elasticModulusZRight, 1e-10);
				const [to, fro] = [effectiveMoment(model, 'plusMz')!, effectiveMoment(model, 'minusMz')!];
				near(to.value, fro.value, 1e-10);
			}),
			{ numRuns: 30 }
		);
	});

	it('never counts more than the gross section', () => {
		fc.assert(
			fc.property(girders, (girder) => {
				const model = testModel(definitionOf(girder));
				const { gross } = model.section;
				for (const basis of ['+My', '−My', '+Mz', '−Mz', 'N'] as const)
					for (const found of [effectiveSection(model, basis)!].flatMap((e) => [e, e.converged])) {
						expect(found.area).toBeLessThanOrEqual(gross.area * (1 + 1e-12));
						expect(found.secondMomentY).toBeLessThanOrEqual(gross.secondMomentY * (1 + 1e-12));
						expect(found.secondMomentZ).toBeLessThanOrEqual(gross.secondMomentZ * (1 + 1e-12));
					}
				for (const sense of ['plusMy', 'minusMy', 'plusMz', 'minusMz'] as const)
					expect(effectiveMoment(model, sense)!.value).toBeLessThanOrEqual(
						model.moments[sense].firstYield! * (1 + 1e-9)
					);
				expect(effectiveAxial(model)!.value).toBeLessThanOrEqual(
					gross.area * girder.fy * 1e-3 * (1 + 1e-12)
				);
			}),
			{ numRuns: 30 }
		);
	});

	it.each(['tw', 'tf', 'tfBottom'] as const)('carries more with a thicker plate: %s', (plate) => {
		fc.assert(
			fc.property(girders, between(1.001, 1.2), (girder, more) => {
				const thicker = { ...girder, [plate]: girder[plate] * more };
				// the same depth between the flanges
				thicker.h += thicker.tf - girder.tf + thicker.tfBottom - girder.tfBottom;
				const moment = (g: Girder) => effectiveMoment(testModel(definitionOf(g)), 'plusMy')!.value;
				expect(moment(thicker)).toBeGreaterThan(moment(girder));
				const axial = (g: Girder) => effectiveAxial(testModel(definitionOf(g)))!.value;
				expect(axial(thicker)).toBeGreaterThan(axial(girder));
			}),
			{ numRuns: 30 }
		);
	});

	it('grows with the square and the cube of its size', () => {
		fc.assert(
			fc.property(girders, fc.constantFrom(0.01, 0.1, 7), (girder, scale) => {
				const sized = { ...girder };
				for (const size of ['h', 'b', 'tf', 'bBottom', 'tfBottom', 'tw', 'weldLeg'] as const)
					sized[size] *= scale;
				const [one, other] = [girder, sized].map((g) => testModel(definitionOf(g)));
				for (const sense of ['plusMy', 'minusMz'] as const) {
					const [a, b] = [effectiveMoment(one!, sense)!, effectiveMoment(other!, sense)!];
					near(b.value, a.value * scale ** 3, 1e-9);
					near(b.converged, a.converged * scale ** 3, 1e-8);
				}
				near(effectiveAxial(other!)!.value, effectiveAxial(one!)!.value * scale ** 2, 1e-10);
			}),
			{ numRuns: 20 }
		);
	});
});
