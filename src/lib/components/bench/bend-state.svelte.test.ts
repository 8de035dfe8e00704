import { describe, expect, it } from 'vitest';
import { prepareSection } from '$lib/engine/section/prepare';
import type { ResidualPattern } from '$lib/engine/material/residual/pattern';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { BendState } from './bend-state.svelte';
import { buildKinds } from './opening-sections';
import { openingBend, openingStudy, type BendChoice } from './study';

function bent(
	definition: SectionDefinition,
	choice: Partial<BendChoice> = {},
	N = 0,
	residual: ResidualPattern = 'none'
) {
	const built = prepareSection(definition);
	if (!built.ok) throw new Error('cannot be built');
	const source = {
		section: () => built.value,
		demandN: () => N,
		residual: () => residual
	};
	return new BendState(source, { ...openingBend, ...choice });
}

const angle = buildKinds.find(({ key }) => key === 'angle')!.opening;

describe('bending', () => {
	it('reaches first yield at the ratio 1', () => {
		const bend = bent(openingStudy.section, { ratio: 1 });
		expect(bend.state.moment).toBeCloseTo(bend.bender.firstYield.moment ?? NaN, 6);
	});

	it.each([0, 45, 90])(
		'about an axis at %s° has tension at the bottom of the drawing, and the other way at its top',
		(axisAngle) => {
			const bend = bent(angle, { axisAngle });
			expect(Math.abs(bend.seenAngle - axisAngle)).toBeLessThanOrEqual(90);
			expect(bend.line.curvature).toBeGreaterThan(0);
			bend.bendTo(-2);
			expect(bend.line.curvature).toBeLessThan(0);
		}
	);

	it('keeps the drawing upright for a section that bends level', () => {
		const bend = bent(openingStudy.section);
		for (const ratio of [0, 0.5, 3, -4]) {
			bend.bendTo(ratio);
			expect(bend.seenAngle).toBe(0);
		}
	});

	it('stops at ten times first yield by hand, and takes more when it is typed', () => {
		const bend = bent(openingStudy.section);
		bend.bendTo(40);
		expect(bend.ratio).toBe(10);
		bend.bendToCurvature(bend.unit * 40);
		expect(bend.ratio).toBeCloseTo(40, 9);
	});

	it('refuses a moment above full plastic and stays where it is', () => {
		const bend = bent(openingStudy.section);
		expect(bend.bendToMoment((bend.bender.plasticMoment ?? 0) * 1.01)).toBe(false);
		expect(bend.ratio).toBe(2);
	});

	it('has no state when N alone is more than the section carries', () => {
		const bend = bent(openingStudy.section, {}, -50_000);
		expect(bend.state.converged).toBe(false);
		expect(bend.line).toEqual({ atOrigin: 0, curvature: 0 });
		expect(Number.isFinite(bend.unit)).toBe(true);
	});
});
