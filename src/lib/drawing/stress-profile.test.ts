import { describe, expect, it } from 'vitest';
import type { StressStrainLaw } from '$lib/engine/material/law';
import { stressBlocks } from './stress-blocks';
import { lawStress, partStress, type DepthPart, type StrainLine } from './stress-profile';

const E = 210_000;

/** Elastic–perfectly plastic law of one strength, N/mm². */
const lawOf = (fy: number): StressStrainLaw => ({
	kinks: [-fy / E, fy / E],
	offsets: [-fy, 0, fy],
	slopes: [0, E, 0],
	yieldTension: fy / E,
	yieldCompression: fy / E
});

const part = (name: string, bottom: number, top: number, fy: number): DepthPart => ({
	name,
	bottom,
	top,
	law: lawOf(fy),
	fy,
	fyc: fy
});

/** Twice the yield curvature of a part from −100 to 100 mm. */
const twice = (fy: number): StrainLine => ({ atOrigin: 0, curvature: (2 * fy) / E / 100 });

describe('stress over the depth of a part', () => {
	it('follows the law on both sides of its kinks', () => {
		const law = lawOf(355);
		expect(lawStress(law, 0.001)).toBeCloseTo(210, 9);
		expect(lawStress(law, 0.01)).toBe(355);
		expect(lawStress(law, -0.01)).toBe(-355);
	});

	it('has its fronts at half the half-depth at twice the yield curvature', () => {
		const { knots, yielded } = partStress(part('bar', -100, 100, 355), twice(355));
		expect(knots.map(({ depth }) => Math.round(depth))).toEqual([100, 50, 0, -50, -100]);
		expect(knots.map(({ stress }) => Math.round(stress))).toEqual([-355, -355, 0, 355, 355]);
		expect(yielded).toHaveLength(2);
		expect(yielded.find(({ sense }) => sense === 'compression')?.bottom).toBeCloseTo(50, 9);
		expect(yielded.find(({ sense }) => sense === 'tension')?.top).toBeCloseTo(-50, 9);
	});

	it('is even when the section is only stretched', () => {
		const { knots, yielded } = partStress(part('bar', -100, 100, 355), {
			atOrigin: 0.01,
			curvature: 0
		});
		expect(knots.map(({ stress }) => stress)).toEqual([355, 355]);
		expect(yielded).toEqual([{ top: 100, bottom: -100, sense: 'tension' }]);
	});
});

describe('stress blocks of a section', () => {
	const flange = part('flange', 90, 100, 345);
	const web = part('web', -100, 90, 355);

	it('step at the edge between plates of unlike strength', () => {
		const blocks = stressBlocks([flange, web].map((each) => partStress(each, twice(355))));
		expect(blocks.map(({ top, bottom }) => [top, bottom])).toEqual([
			[100, 90],
			[90, -100]
		]);
		expect(blocks[0]?.knots.at(-1)?.stress).toBe(-345);
		expect(blocks[1]?.knots[0]?.stress).toBe(-355);
	});

	it('carry on through the edge between plates of one steel', () => {
		const one = part('flange', 90, 100, 355);
		const blocks = stressBlocks([one, web].map((each) => partStress(each, twice(355))));
		expect(blocks).toHaveLength(1);
	});

	it('put a second material at the same depth beside the first', () => {
		const left = part('left', -100, 100, 355);
		const right = part('right', -100, 100, 235);
		const blocks = stressBlocks([left, right].map((each) => partStress(each, twice(355))));
		expect(blocks.map(({ beside }) => beside)).toEqual([false, true]);
	});
});
