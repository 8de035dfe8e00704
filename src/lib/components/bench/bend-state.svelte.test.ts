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

describe('letting go', () => {
	const bar: SectionDefinition = { kind: 'flat', b: 20, h: 100, grade: 355 };

	/** Flat bar, perfectly plastic, at 4 κy: M = 1.5 My (1 − 1/(3·4²)), and it springs back by M/My (closed form). */
	const sprungBack = 4 - 1.5 * (1 - 1 / 48);

	it('leaves a flat bar with the curvature of the closed form and no moment', () => {
		const bend = bent(bar, { ratio: 4 });
		bend.release();
		expect(bend.ratio).toBeCloseTo(sprungBack, 9);
		expect(bend.moment).toBe(0);
		expect(bend.released).toBe(true);
		expect(bend.present?.cells.length).toBeGreaterThan(1);
	});

	it('loads again along a straight line to where it was let go', () => {
		const bend = bent(bar, { ratio: 4 });
		const before = bend.state.moment ?? NaN;
		bend.release();
		bend.bendTo((sprungBack + 4) / 2);
		expect(bend.state.moment).toBeCloseTo(before / 2, 6);
		bend.bendTo(4);
		expect(bend.state.moment).toBeCloseTo(before, 6);
	});

	it('is taken back turn by turn, and forgotten by a fresh start or another axis', () => {
		const bend = bent(bar, { ratio: 4 });
		bend.release();
		bend.backTurn();
		expect(bend.ratio).toBe(4);
		expect(bend.turns).toEqual([4]);
		bend.backTurn();
		expect(bend.turns).toEqual([]);
		expect(bend.ratio).toBe(4);
		bend.release();
		bend.axisAngle = 90;
		expect(bend.turns).toEqual([]);
		bend.release();
		bend.startFresh();
		expect([bend.ratio, bend.turns]).toEqual([0, []]);
	});

	it('follows a cycle to its last turn', () => {
		const bend = bent(bar);
		bend.cycle([3, -3, 3, -3]);
		expect(bend.ratio).toBeCloseTo(-3, 9);
		expect(bend.turned?.legs).toHaveLength(4);
		expect(bend.turned?.lost).toBeNull();
	});
});

describe('residual stress', () => {
	it('of welding leaves κy that of steel free of stress, first yield at no moment, full plastic as it was', () => {
		const plain = bent(openingStudy.section);
		const welded = bent(openingStudy.section, {}, 0, 'welded');
		expect(welded.unit).toBe(plain.unit);
		expect(welded.bender.firstYield.moment).toBe(0);
		expect(welded.bender.plasticMoment).toBeCloseTo(plain.bender.plasticMoment ?? NaN, 6);
	});

	it('that no pattern covers is told, and bending goes on without it', () => {
		const bend = bent(openingStudy.section, {}, 0, 'rolled');
		expect(bend.fault?.code).toBe('residual-not-covered');
		expect(bend.state.converged).toBe(true);
	});
});

describe('N', () => {
	it('is held as typed, whatever the demand', () => {
		const bend = bent(openingStudy.section, { typedN: -300 }, -900);
		expect(bend.state.N).toBeCloseTo(-300, 6);
		bend.typedN = null;
		expect(bend.state.N).toBeCloseTo(-900, 6);
	});
});
