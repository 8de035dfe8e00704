import { describe, expect, it } from 'vitest';
import type { OutlineSection, Ring } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import {
	namedRings,
	withHole,
	withPointAfter,
	withRegion,
	withRegionGrade,
	withRing,
	withoutRing
} from './outline-edits';

const square: Ring = [
	[0, 0],
	[100, 0],
	[100, 100],
	[0, 100]
];
const short: OutlineSection = { kind: 'outline', grade: 'S355', outer: square };
const area = (section: OutlineSection) => {
	const built = prepareSection(section);
	return built.ok ? built.value.gross.area : built.error[0]?.message;
};

describe('edits of an outline', () => {
	it('leave the short form behind and keep the section', () => {
		const next = withRing(short, { region: 0, hole: null }, square);
		expect(next).toEqual({ kind: 'outline', grade: 'S355', regions: [{ outer: square }] });
	});

	it('add a hole of a tenth of the size in the middle, and take it away', () => {
		const holed = withHole(short, 0);
		expect(area(holed)).toBeCloseTo(100 * 100 - 10 * 10, 9);
		expect(namedRings(holed).map(({ title }) => title)).toEqual(['Outer ring', 'Hole 1']);
		expect(area(withoutRing(holed, { region: 0, hole: 0 }))).toBeCloseTo(1e4, 9);
	});

	it('add a region that touches, with a grade of its own', () => {
		const two = withRegionGrade(withRegion(short), 1, 'S275');
		expect(area(two)).toBeCloseTo(1e4 + 400, 9);
		expect(two.regions?.[1]?.grade).toBe('S275');
		expect(namedRings(two).map(({ title }) => title)).toEqual([
			'Region 1, outer ring',
			'Region 2, outer ring'
		]);
		expect(withoutRing(two, { region: 1, hole: null }).regions).toHaveLength(1);
	});

	it('put a point half way to the next, round the end too', () => {
		expect(withPointAfter(square, 3).at(-1)).toEqual([0, 50]);
	});
});
