import { describe, expect, it } from 'vitest';
import type { OutlineSection, Ring } from '../definition';
import { prepareSection } from '../prepare';
import type { PreparedSection } from '../prepared';

const square = (y: number, z: number, side: number): Ring => [
	[y, z],
	[y + side, z],
	[y + side, z + side],
	[y, z + side]
];
const outline = (outer: Ring, ...holes: Ring[]): OutlineSection => ({
	kind: 'outline',
	grade: 355,
	outer,
	holes
});
const regions = (...outers: Ring[]): OutlineSection => ({
	kind: 'outline',
	grade: 355,
	regions: outers.map((outer) => ({ outer }))
});

function prepared(definition: OutlineSection): PreparedSection {
	const result = prepareSection(definition);
	if (!result.ok) throw new Error(result.error.map(({ message }) => message).join(' '));
	return result.value;
}

function messages(definition: OutlineSection): string[] {
	const result = prepareSection(definition);
	return result.ok ? [] : result.error.map(({ path, message }) => `${path}: ${message}`);
}

describe('an outline', () => {
	it('may wind either way, its holes too', () => {
		const [outer, hole] = [square(0, 0, 100), square(20, 20, 30)];
		const turned = outline([...outer].reverse(), [...hole].reverse());
		expect(prepared(turned).gross.area).toBeCloseTo(9100, 9);
		expect(prepared(turned).gross).toEqual(prepared(turned).gross);
		expect(prepared(outline(outer, hole)).gross.area).toBeCloseTo(9100, 9);
	});

	it('may repeat points, and its first point at the end', () => {
		const outer = square(0, 0, 10).flatMap((point) => [point, point]);
		expect(prepared(outline([...outer, outer[0]!])).gross.area).toBeCloseTo(100, 12);
	});

	it('may touch itself at a corner', () => {
		const bow: Ring = [
			[0, 0],
			[10, 10],
			[20, 0],
			[20, 20],
			[10, 10],
			[0, 20]
		];
		expect(prepared(outline(bow)).gross.area).toBeCloseTo(200, 9);
	});

	it('may run along itself to reach a hole, which is drawn as a hole', () => {
		const keyhole: Ring = [
			[0, 0],
			[100, 0],
			[100, 100],
			[0, 100],
			[0, 0],
			[20, 20],
			[20, 80],
			[80, 80],
			[80, 20],
			[20, 20]
		];
		const section = prepared(outline(keyhole));
		expect(section.gross.area).toBeCloseTo(6400, 9);
		expect(section.contours).toHaveLength(2);
		expect(section.gross.perimeter).toBeCloseTo(400, 9);
	});

	it('may have a hole that touches its outer ring', () => {
		expect(
			prepared(
				outline(square(0, 0, 100), [
					[0, 50],
					[50, 25],
					[50, 75]
				])
			).gross.area
		).toBeCloseTo(8750, 9);
	});

	it('may be of regions that share a border, each with its own grade', () => {
		const two: OutlineSection = {
			kind: 'outline',
			grade: 355,
			regions: [{ outer: square(0, 0, 10) }, { outer: square(10, 2, 5), grade: 235 }]
		};
		const section = prepared(two);
		expect(section.parts.map(({ name, material }) => [name, material.fy])).toEqual([
			['region1', 355],
			['region2', 235]
		]);
		expect(section.contours).toHaveLength(1);
		expect(section.gross.perimeter).toBeCloseTo(50, 9);
	});

	it('may lie a kilometre from the origin', () => {
		const { gross } = prepared(outline(square(999_000, -1e6, 0.0625)));
		expect(gross.area).toBe(0.0625 ** 2);
		expect(gross.secondMomentY / (0.0625 ** 4 / 12)).toBeCloseTo(1, 12);
	});

	it('takes its nominal strength at the largest circle within it', () => {
		const flat: Ring = [
			[0, 0],
			[200, 0],
			[200, 16],
			[0, 16]
		];
		const [part] = prepared({ ...outline(flat), grade: 'S355' }).parts;
		expect(part?.thickness).toBe(16);
		expect(part?.material.fy).toBe(355);
		const triangle: Ring = [
			[0, 0],
			[30, 0],
			[0, 40]
		];
		expect(prepared(outline(triangle)).parts[0]?.thickness).toBeCloseTo(20, 6);
	});
});

describe('an outline that cannot be', () => {
	it('crosses itself between corners', () => {
		const bow: Ring = [
			[0, 0],
			[10, 10],
			[10, 0],
			[0, 10]
		];
		expect(messages(outline(bow))).toEqual(['outer: Outer ring crosses itself near (5, 5).']);
	});

	it('crosses itself through a corner', () => {
		const bow: Ring = [
			[0, 0],
			[10, 10],
			[20, 20],
			[20, 0],
			[10, 10],
			[0, 20]
		];
		expect(messages(outline(bow))[0]).toContain('outer: Outer ring crosses itself near');
	});

	it('runs round twice', () => {
		const twice = [...square(0, 0, 10), ...square(0, 0, 10)];
		expect(messages(outline(twice))[0]).toContain('outer: Outer ring crosses itself near');
	});

	it('has a hole outside, across, or over another', () => {
		const outer = square(0, 0, 100);
		expect(messages(outline(outer, square(200, 0, 10)))).toEqual([
			'holes.0: Hole 1 lies outside the outer ring.'
		]);
		expect(messages(outline(outer, square(95, 20, 10)))[0]).toContain(
			'holes.0: Hole 1 crosses the outer ring near'
		);
		expect(messages(outline(outer, square(10, 10, 30), square(20, 20, 30)))[0]).toContain(
			'holes.1: Holes 1 and 2 overlap near'
		);
		expect(messages(outline(outer, square(10, 10, 30), square(20, 20, 5)))[0]).toContain(
			'holes.1: Holes 1 and 2 overlap near'
		);
	});

	it('has regions that overlap, contain each other, coincide or lie apart', () => {
		const first = square(0, 0, 10);
		for (const second of [square(5, 5, 10), square(2, 2, 3), first])
			expect(messages(regions(first, second))[0]).toContain(
				'regions.1: Regions region1 and region2 overlap near'
			);
		expect(messages(regions(first, square(12, 0, 5)))[0]).toContain(
			'Regions region1 and region2 do not touch: the gap is 2 mm.'
		);
	});

	it('has too few points, or points that are no numbers', () => {
		expect(
			messages(
				outline([
					[0, 0],
					[1, 1],
					[0, 0]
				])
			)
		).toEqual(['outer: Outer ring needs at least 3 different points.']);
		expect(
			messages(
				outline([
					[0, 0],
					[1, 1],
					[0, Infinity]
				])
			)[0]
		).toBe('outer.2.1: Outer ring: z of point 3 must be a number.');
		expect(
			messages(
				outline([
					[0, 0],
					[1, 1],
					[2, 2]
				])
			)
		).not.toEqual([]);
	});
});
