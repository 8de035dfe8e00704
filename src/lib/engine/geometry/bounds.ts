import type { Edge, Loop, Point } from './boundary';
import { acrossOf, frameAt, type Frame } from './frame';

/** Least and greatest `across` of the loops in a frame, arcs included. */
export function extentAcross(loops: readonly Loop[], frame: Frame): { low: number; high: number } {
	let low = Infinity;
	let high = -Infinity;
	const include = (value: number) => {
		if (value < low) low = value;
		if (value > high) high = value;
	};
	for (const loop of loops) {
		for (const edge of loop) edgeExtremes(edge, frame, include);
	}
	return { low, high };
}

function edgeExtremes(edge: Edge, frame: Frame, include: (value: number) => void): void {
	if (edge.kind === 'line') {
		include(acrossOf(frame, edge.from));
		include(acrossOf(frame, edge.to));
		return;
	}
	const centre = acrossOf(frame, edge.centre);
	const start = edge.start - Math.atan2(frame.sin, frame.cos);
	include(centre + edge.radius * Math.sin(start));
	include(centre + edge.radius * Math.sin(start + edge.sweep));
	const [from, to] = edge.sweep < 0 ? [start + edge.sweep, start] : [start, start + edge.sweep];
	for (let k = Math.ceil((from - Math.PI / 2) / Math.PI); Math.PI / 2 + k * Math.PI <= to; k++) {
		include(centre + (k % 2 === 0 ? edge.radius : -edge.radius));
	}
}

/** Bounding box of loops, mm. */
export function loopBounds(loops: readonly Loop[]) {
	const origin: Point = { y: 0, z: 0 };
	const upright = extentAcross(loops, frameAt(origin, 0));
	const sideways = extentAcross(loops, frameAt(origin, Math.PI / 2));
	return { left: -sideways.high, right: -sideways.low, bottom: upright.low, top: upright.high };
}

/** First point of an edge. */
export function edgeStart(edge: Edge): Point {
	if (edge.kind === 'line') return edge.from;
	return arcPoint(edge.centre, edge.radius, edge.start);
}

/** Last point of an edge. */
export function edgeEnd(edge: Edge): Point {
	if (edge.kind === 'line') return edge.to;
	return arcPoint(edge.centre, edge.radius, edge.start + edge.sweep);
}

const arcPoint = ({ y, z }: Point, radius: number, angle: number): Point => ({
	y: y + radius * Math.cos(angle),
	z: z + radius * Math.sin(angle)
});

/** Length of a loop, mm. */
export function loopLength(loop: Loop): number {
	return loop.reduce((sum, edge) => sum + edgeLength(edge), 0);
}

function edgeLength(edge: Edge): number {
	if (edge.kind === 'arc') return edge.radius * Math.abs(edge.sweep);
	return Math.hypot(edge.to.y - edge.from.y, edge.to.z - edge.from.z);
}
