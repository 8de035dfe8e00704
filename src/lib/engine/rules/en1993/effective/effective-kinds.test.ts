import { describe, expect, it } from 'vitest';
import { regionMoments } from '../../../geometry/moments';
import type { SectionDefinition } from '../../../section/definition';
import { testModel } from '../test-model';
import { cutLoops } from './cut-mechanics';
import { effectiveMoment } from './effective-moment';
import { effectiveSection, reducedSection, type EffectiveBasis } from './effective-section';
import { slender } from './slender-sections';

const bases: readonly EffectiveBasis[] = ['+My', '−My', '+Mz', '−Mz', 'N'];

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
