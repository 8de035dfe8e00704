import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ArcEdge, Edge, Loop } from './boundary';
import { edgeEnd, edgeStart } from './bounds';
import { circleLoop, rectangleLoop, reversedLoop, roundedLoop } from './loops';
import { regionMoments } from './moments';

/** Direction of travel at an end of an edge, radians. */
function heading(edge: Edge, atEnd: boolean): number {
	if (edge.kind === 'line') return Math.atan2(edge.to.z - edge.from.z, edge.to.y - edge.from.y);
	const angle = edge.start + (atEnd ? edge.sweep : 0);
	return angle + (Math.sign(edge.sweep) * Math.PI) / 2;
}

const area = (loop: Loop): number => regionMoments({ loops: [loop] }).area;
const sameAngle = (a: number, b: number) => Math.abs(Math.sin((a - b) / 2));

/** Wedge with a sloped side, its sharp corner rounded. */
const wedge = (slope: number, radius: number): Loop =>
	roundedLoop([
		{ y: 0, z: 0 },
		{ y: 100, z: 0 },
		{ y: 100, z: 40, radius },
		{ y: 0, z: 40 + 100 * slope }
	]);

describe('a loop with rounded corners', () => {
	it('has arcs tangent to both sides, whatever the slope', () => {
		fc.assert(
			fc.property(
				fc.double({ min: -0.3, max: 1, noNaN: true }),
				fc.double({ min: 0.01, max: 12, noNaN: true }),
				(slope, radius) => {
					const loop = wedge(slope, radius);
					const at = loop.findIndex(({ kind }) => kind === 'arc');
					const arc = loop[at] as ArcEdge;
					expect(sameAngle(heading(arc, false), heading(loop[at - 1]!, true))).toBeLessThan(1e-12);
					expect(sameAngle(heading(arc, true), heading(loop[at + 1]!, false))).toBeLessThan(1e-12);
				}
			)
		);
	});

	it('is closed: every edge begins where the one before ends', () => {
		const loop = wedge(0.08, 6);
		loop.forEach((edge, i) => {
			const before = edgeEnd(loop.at(i - 1)!);
			expect(Math.hypot(edgeStart(edge).y - before.y, edgeStart(edge).z - before.z)).toBeLessThan(
				1e-12
			);
		});
	});

	it('loses (tan(φ/2) − φ/2) r² at a corner that turns by φ (closed form)', () => {
		const turn = Math.PI / 2 - Math.atan(0.08);
		const lost = (Math.tan(turn / 2) - turn / 2) * 6 ** 2;
		expect(area(wedge(0.08, 0)) - area(wedge(0.08, 6))).toBeCloseTo(lost, 9);
	});

	it('is a circle when the corners of a square meet', () => {
		const loop = rectangleLoop(0, 0, 20, 20, 10);
		expect(loop.every(({ kind }) => kind === 'arc')).toBe(true);
		expect(area(loop)).toBeCloseTo(100 * Math.PI, 10);
		expect(area(circleLoop({ y: 10, z: 10 }, 10))).toBeCloseTo(100 * Math.PI, 10);
	});

	it('has the opposite area when it is run the other way', () => {
		const loop = wedge(0.08, 6);
		expect(area(reversedLoop(loop))).toBeCloseTo(-area(loop), 10);
	});
});
