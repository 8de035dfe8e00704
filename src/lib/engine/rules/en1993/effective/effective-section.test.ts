import { describe, expect, it } from 'vitest';
import { regionMoments } from '../../../geometry/moments';
import type { SectionDefinition } from '../../../section/definition';
import { testModel } from '../test-model';
import { cutLoops } from './cut-mechanics';
import { effectiveAxial } from './effective-axial';
import { effectiveMoment } from './effective-moment';
import { effectiveSection, reducedSection, type EffectiveBasis } from './effective-section';

const bases: readonly EffectiveBasis[] = ['+My', '−My', '+Mz', '−Mz', 'N'];

const slender: Readonly<Record<string, SectionDefinition>> = {
	'welded I': {
		kind: 'i',
		fabrication: 'welded',
		h: 1540,
		b: 600,
		tf: 12,
		tw: 8,
		weldLeg: 6,
		grade: 'S355'
	},
	'mono-symmetric I': {
		kind: 'i',
		fabrication: 'welded',
		h: 1200,
		b: 300,
		tf: 10,
		bBottom: 500,
		tfBottom: 25,
		tw: 6,
		weldLeg: 5,
		grade: 'S460'
	},
	'rolled I': {
		kind: 'i',
		fabrication: 'rolled',
		h: 900,
		b: 300,
		tf: 6,
		tw: 5,
		r: 12,
		grade: 'S460'
	},
	channel: { kind: 'channel', h: 400, b: 150, tw: 4, tf: 5, r: 8, grade: 'S355' },
	'tapered channel': {
		kind: 'channel',
		h: 400,
		b: 150,
		tw: 4,
		tf: 5,
		r: 8,
		rToe: 2,
		flangeSlopePercent: 2,
		grade: 'S355'
	},
	tee: {
		kind: 'tee',
		fabrication: 'welded',
		h: 300,
		b: 300,
		tw: 6,
		tf: 8,
		weldLeg: 4,
		grade: 'S355'
	},
	angle: { kind: 'angle', h: 200, b: 150, t: 6, r: 10, rToe: 5, grade: 'S355' },
	tube: {
		kind: 'rectangular-hollow',
		h: 400,
		b: 200,
		t: 4,
		ro: 6,
		ri: 2,
		fabrication: 'cold-formed',
		grade: 'S355'
	},
	box: {
		kind: 'box',
		h: 1000,
		b: 900,
		tw: 6,
		tfTop: 8,
		tfBottom: 10,
		webGap: 700,
		weldLeg: 4,
		grade: 'S355'
	}
};

describe.each(Object.entries(slender))('effective section of a slender %s', (_, definition) => {
	const model = testModel(definition);
	const { section } = model;

	it.each(bases)('has the moments of the outlines with the strips cut out of them, %s', (basis) => {
		const { strips } = reducedSection(model, basis)!.once;
		const found = effectiveSection(model, basis)!;
		const loops = section.parts.flatMap((part) => cutLoops(section, part, strips));
		const exact = regionMoments({ loops }, found.centroid);
		const size = Math.sqrt(exact.area);
		expect(found.area / exact.area).toBeCloseTo(1, 10);
		expect(Math.abs(exact.firstY)).toBeLessThan(1e-9 * exact.area * size);
		expect(Math.abs(exact.firstZ)).toBeLessThan(1e-9 * exact.area * size);
		expect(found.secondMomentY / exact.secondY).toBeCloseTo(1, 10);
		expect(found.secondMomentZ / exact.secondZ).toBeCloseTo(1, 10);
		expect(Math.abs(found.productYZ - exact.product)).toBeLessThan(1e-10 * exact.secondY);
	});

	it('loses something in compression, and within the steel', () => {
		const { removed } = effectiveSection(model, 'N')!;
		expect(removed.length).toBeGreaterThan(0);
		const { left, right, bottom, top } = section.bounds;
		for (const { corners, from, to } of removed) {
			expect(to).toBeGreaterThan(from);
			for (const { y, z } of corners) {
				expect(y).toBeGreaterThanOrEqual(left - 1e-9);
				expect(y).toBeLessThanOrEqual(right + 1e-9);
				expect(z).toBeGreaterThanOrEqual(bottom - 1e-9);
				expect(z).toBeLessThanOrEqual(top + 1e-9);
			}
		}
	});

	it('comes to rest under bending in every sense', () => {
		for (const basis of bases)
			expect(effectiveSection(model, basis)!.notes.map(({ code }) => code)).not.toContain(
				'effective-section-not-converged'
			);
	});

	it('carries no more than the gross section', () => {
		for (const sense of ['plusMy', 'minusMy', 'plusMz', 'minusMz'] as const) {
			const moment = effectiveMoment(model, sense)!;
			expect(moment.value).toBeLessThanOrEqual(model.moments[sense].firstYield! * (1 + 1e-9));
			expect(moment.value).toBeGreaterThan(0.2 * model.moments[sense].firstYield!);
		}
	});
});

const stocky: readonly SectionDefinition[] = [
	{ kind: 'i', fabrication: 'rolled', h: 300, b: 300, tw: 11, tf: 19, r: 27, grade: 'S355' },
	{ kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, grade: 'S355' },
	{ kind: 'angle', h: 100, b: 100, t: 12, r: 12, rToe: 6, grade: 'S355' },
	{
		kind: 'rectangular-hollow',
		h: 200,
		b: 100,
		t: 10,
		ro: 15,
		ri: 10,
		fabrication: 'hot-finished',
		grade: 'S355'
	}
];

describe('effective section of stocky plates', () => {
	it.each(stocky)('is the gross section itself: $kind', (definition) => {
		const model = testModel(definition);
		const { gross } = model.section;
		for (const basis of bases) {
			const found = effectiveSection(model, basis)!;
			expect(found.removed).toEqual([]);
			expect(found.area).toBe(gross.area);
			expect(found.secondMomentY).toBe(gross.secondMomentY);
			expect(found.elasticModulusYTop).toBe(gross.elasticModulusYTop);
			expect(found.elasticModulusZLeft).toBe(gross.elasticModulusZLeft);
			expect([found.centroidShiftY, found.centroidShiftZ]).toEqual([0, 0]);
			expect(found.converged.secondMomentY).toBe(gross.secondMomentY);
		}
		for (const sense of ['plusMy', 'minusMy', 'plusMz', 'minusMz'] as const) {
			const moment = effectiveMoment(model, sense)!.value;
			expect(moment / model.moments[sense].firstYield!).toBeCloseTo(1, 9);
		}
	});
});

describe('effectiveSection', () => {
	it('measures an upright strip by z and a level one by y', () => {
		const model = testModel(slender['welded I']!);
		const { removed } = effectiveSection(model, '+My')!;
		const web = removed.find(({ part }) => part === 'web')!;
		expect(web.from).toBeGreaterThan(1540 / 2);
		expect(web.to).toBeLessThan(1540 - 12 - 6);
		const flange = removed.filter(({ part }) => part === 'topFlange');
		expect(flange.map(({ from }) => from).sort((a, b) => a - b)[0]).toBeCloseTo(0, 9);
		expect(flange.map(({ to }) => to).sort((a, b) => b - a)[0]).toBeCloseTo(600, 9);
	});

	// EN 1993-1-5 4.4(2): for angles b is the full leg
	it('takes the full leg of an angle: λp = (200/6)/(28.4 ε √0.43)', () => {
		const leg = effectiveSection(testModel(slender.angle!), 'N')!.elements[0]!;
		expect(leg.width).toBeCloseTo(200, 9);
		const epsilon = Math.sqrt(235 / 355);
		expect(leg.slenderness).toBeCloseTo(200 / 6 / (28.4 * epsilon * Math.sqrt(0.43)), 9);
	});

	it('moves the modulus to the fibre that remains when compressed tips are taken away', () => {
		const found = effectiveSection(testModel(slender['welded I']!), '+Mz')!;
		const cut = Math.max(...found.removed.map(({ to }) => to));
		expect(found.elasticModulusZLeft).toBeCloseTo(
			found.secondMomentZ / (found.centroid.y - cut),
			3
		);
		expect(found.elasticModulusZRight).toBeCloseTo(
			found.secondMomentZ / (600 - found.centroid.y),
			3
		);
	});

	it('says that a channel is left without an axis of symmetry and bends with no moment across', () => {
		const found = effectiveSection(testModel(slender.channel!), '+My')!;
		expect(found.notes.map(({ code }) => code)).toContain('effective-section-skew');
		expect(effectiveSection(testModel(slender.channel!), 'N')!.notes).toEqual([]);
	});

	it('shifts the centroid of a doubly symmetric section nowhere in compression', () => {
		const axial = effectiveAxial(testModel(slender['welded I']!))!;
		expect(axial.shiftY).toBeCloseTo(0, 9);
		expect(axial.shiftZ).toBeCloseTo(0, 9);
		const { shiftZ } = effectiveAxial(testModel(slender.tee!))!;
		expect(Math.abs(shiftZ)).toBeGreaterThan(1);
	});

	it('counts more where the stress is low, and says by which clause', () => {
		const model = testModel(slender['welded I']!);
		const low = effectiveSection(model, '+My', () => 0.5)!;
		expect(low.secondMomentY).toBeGreaterThan(effectiveSection(model, '+My')!.secondMomentY);
		expect(low.notes[0]?.clause).toBe('EN 1993-1-5 4.4(4)');
		const full = effectiveSection(model, '+My', () => 1)!;
		expect(full.secondMomentY).toBeCloseTo(effectiveSection(model, '+My')!.secondMomentY, 3);
	});

	it('has no answer for a round tube: EN 1993-1-6', () => {
		const model = testModel({ kind: 'circular-hollow', d: 1000, t: 5, grade: 'S355' });
		expect(effectiveSection(model, '+My')).toBeNull();
		expect(effectiveMoment(model, 'plusMy')).toBeNull();
		expect(effectiveAxial(model)).toBeNull();
	});
});
