import type { Edge, Loop, Point } from '../boundary';
import { edgeEnd, edgeStart } from '../bounds';
import { acrossOf, alongOf, type Frame } from '../frame';
import { distanceAlong, isOnSegment } from '../segments';

/** Loops in a frame of their own, lengths divided by `scale`; plain numbers from here on. */
export const placedLoops = (loops: readonly Loop[], frame: Frame, scale: number): Loop[] => {
	const turn = Math.atan2(frame.sin, frame.cos);
	const placed = (point: Point): Point => ({
		y: alongOf(frame, point) / scale,
		z: acrossOf(frame, point) / scale
	});
	const edge = (e: Edge): Edge =>
		e.kind === 'line'
			? { kind: 'line', from: placed(e.from), to: placed(e.to) }
			: { ...e, centre: placed(e.centre), radius: e.radius / scale, start: e.start - turn };
	return loops.map((loop) => loop.map(edge));
};

/**
 * Loops whose straight edges are cut wherever a corner of any loop lies on them within `tolerance`,
 * so that loops which touch share a point.
 */
export function cutLoops(loops: readonly Loop[], tolerance: number): Loop[] {
	const corners = loops.flatMap((loop) => loop.map(edgeStart));
	return loops.map((loop) => loop.flatMap((edge) => cutEdge(edge, corners, tolerance)));
}

function cutEdge(edge: Edge, corners: readonly Point[], tolerance: number): Edge[] {
	if (edge.kind === 'arc') return [edge];
	const { from, to } = edge;
	const away = (p: Point, q: Point) => Math.hypot(p.y - q.y, p.z - q.z) > tolerance;
	const [left, right] = [Math.min(from.y, to.y) - tolerance, Math.max(from.y, to.y) + tolerance];
	const on = corners.filter(
		(corner) =>
			corner.y >= left &&
			corner.y <= right &&
			away(corner, from) &&
			away(corner, to) &&
			isOnSegment(corner, from, to, tolerance)
	);
	if (on.length === 0) return [edge];
	on.sort((p, q) => distanceAlong(p, from, to) - distanceAlong(q, from, to));
	const stops = [from, ...on.filter((p, i) => i === 0 || away(p, on[i - 1]!)), to];
	return stops.slice(1).map((end, i) => ({ kind: 'line', from: stops[i]!, to: end }));
}

/** Point at a share of an edge's length. */
export function edgePoint(edge: Edge, share: number): Point {
	if (share === 0) return edgeStart(edge);
	if (share === 1) return edgeEnd(edge);
	if (edge.kind === 'line')
		return {
			y: edge.from.y + share * (edge.to.y - edge.from.y),
			z: edge.from.z + share * (edge.to.z - edge.from.z)
		};
	const angle = edge.start + share * edge.sweep;
	return {
		y: edge.centre.y + edge.radius * Math.cos(angle),
		z: edge.centre.z + edge.radius * Math.sin(angle)
	};
}

/** Unit direction of travel at a share of an edge's length. */
export function edgeDirection(edge: Edge, share: number): Point {
	if (edge.kind === 'arc') {
		const angle = edge.start + share * edge.sweep;
		const side = Math.sign(edge.sweep);
		return { y: -side * Math.sin(angle), z: side * Math.cos(angle) };
	}
	const [dy, dz] = [edge.to.y - edge.from.y, edge.to.z - edge.from.z];
	const length = Math.hypot(dy, dz);
	return { y: dy / length, z: dz / length };
}

export const edgeSpan = (edge: Edge): number =>
	edge.kind === 'arc'
		? edge.radius * Math.abs(edge.sweep)
		: Math.hypot(edge.to.y - edge.from.y, edge.to.z - edge.from.z);
