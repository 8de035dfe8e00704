import { describe, expect, it } from 'vitest';
import { testModel } from '../test-model';
import { effectiveAxial } from './effective-axial';
import { effectiveMoment } from './effective-moment';
import { effectiveSection } from './effective-section';
import { slender } from './slender-sections';

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
