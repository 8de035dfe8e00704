import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Edge } from './boundary';
import { chainedLoops } from './chained';
import { cutAlong } from './cut';
import { frameAt } from './frame';
import { circleLoop, rectangleLoop, reversedLoop } from './loops';
import { regionMoments } from './moments';
import { stretchesAt } from './slice';

const origin = { y: 0, z: 0 };
const tolerance = 1e-10;
const areaOf = (edges: readonly Edge[]) => regionMoments({ loops: [edges] }).area;

/** A tube with rounded corners and, beside it, a ring. */
const body: Edge[] = [
	...rectangleLoop(-60, -40, 60, 40, 15),
	...reversedLoop(rectangleLoop(-50, -30, 50, 30, 5)),
	...circleLoop({ y: 100, z: 10 }, 30),
	...reversedLoop(circleLoop({ y: 100, z: 10 }, 20))
];

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a body cut along a line', () => {
	it('has the same moments of area in its two parts as before, wherever it is cut, twice', () => {
		const cut = fc.tuple(between(-Math.PI, Math.PI), between(-130, 130));
		fc.assert(
			fc.property(cut, cut, ([angle, level], [again, other]) => {
				const { below, above } = cutAlong(body, frameAt(origin, angle), level, tolerance);
				const pieces = [below, above].flatMap((edges) => {
					const twice = cutAlong(edges, frameAt(origin, again), other, tolerance);
					return [twice.below, twice.above];
				});
				const whole = regionMoments({ loops: [body] });
				const moments = pieces.map((edges) => regionMoments({ loops: [edges] }));
				for (const key of ['area', 'firstY', 'firstZ', 'secondY', 'secondZ', 'product'] as const) {
					const sum = moments.reduce((total, one) => total + one[key], 0);
					expect(Math.abs(sum - whole[key])).toBeLessThan(1e-9 * whole.area * 130 ** 2);
				}
				for (const { area } of moments) expect(area).toBeGreaterThan(-1e-6);
			}),
			{ numRuns: 200 }
		);
	});

	it('parts along its own edges and through its corners without loss', () => {
		for (const level of [-40, -30, 30, 40]) {
			const { below, above } = cutAlong(body.slice(0, 16), frameAt(origin, 0), level, tolerance);
			expect(areaOf(below) + areaOf(above)).toBeCloseTo(areaOf(body.slice(0, 16)), 8);
		}
		const square = rectangleLoop(0, 0, 10, 10);
		const { below, above } = cutAlong(square, frameAt(origin, Math.PI / 4), 0, tolerance);
		expect([areaOf(below), areaOf(above)]).toEqual([expect.closeTo(50, 9), expect.closeTo(50, 9)]);
	});

	it('leaves a half circle of π R²/2, closed by one straight edge', () => {
		const { above } = cutAlong(circleLoop(origin, 20), frameAt(origin, 0), 0, tolerance);
		expect(areaOf(above)).toBeCloseTo((Math.PI * 400) / 2, 9);
		expect(above.filter(({ kind }) => kind === 'line')).toHaveLength(1);
	});

	it('chains into one loop for each separate piece', () => {
		const { above } = cutAlong(body.slice(0, 16), frameAt(origin, Math.PI / 2), 0, tolerance);
		const { above: legs } = cutAlong(above, frameAt(origin, Math.PI / 2), 55, tolerance);
		expect(chainedLoops(legs)).toHaveLength(1);
		expect(chainedLoops(body)).toHaveLength(4);
	});
});

describe('steel along a line', () => {
	it('lies in the walls of a tube, and once only where two bodies meet', () => {
		expect(stretchesAt(body.slice(0, 16), 0, 0)).toEqual([
			[expect.closeTo(-40, 9), expect.closeTo(-30, 9)],
			[expect.closeTo(30, 9), expect.closeTo(40, 9)]
		]);
		const [left, right] = [rectangleLoop(0, 0, 5, 10), rectangleLoop(5, 0, 10, 10)];
		expect([...stretchesAt(left, 0, 5), ...stretchesAt(right, 0, 5)]).toEqual([[0, 10]]);
	});
});
