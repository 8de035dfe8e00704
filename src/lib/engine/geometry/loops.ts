import type { ArcEdge, Edge, Loop, Point } from './boundary';
import { edgeEnd, edgeStart } from './bounds';

/** A vertex of an outline, rounded by a true arc when `radius` is above 0, mm. */
export interface Corner extends Point {
	readonly radius?: number;
}

/** Lines shorter than this share of the loop's reach are rounding, not geometry. */
const nothing = 1e-14;

const difference = (a: Point, b: Point): Point => ({ y: a.y - b.y, z: a.z - b.z });

/** Length from a corner to where an arc of `radius` leaves its sides, mm. */
export function tangentLength(before: Point, corner: Point, after: Point, radius: number): number {
	return radius * Math.tan(Math.abs(turnAt(before, corner, after)) / 2);
}

/** Angle turned at a corner, radians, positive anticlockwise. */
function turnAt(before: Point, corner: Point, after: Point): number {
	const u = difference(corner, before);
	const v = difference(after, corner);
	return Math.atan2(u.y * v.z - u.z * v.y, u.y * v.y + u.z * v.z);
}

/**
 * The arc that rounds a corner, tangent to both of its sides exactly; the corner itself when
 * the radius is 0 or the sides run on straight.
 */
export function cornerArc(
	before: Point,
	corner: Point,
	after: Point,
	radius: number
): ArcEdge | Point {
	const turn = turnAt(before, corner, after);
	if (radius === 0 || turn === 0) return { y: corner.y, z: corner.z };
	const u = difference(corner, before);
	const length = Math.hypot(u.y, u.z);
	const [uy, uz] = [u.y / length, u.z / length];
	const back = radius * Math.tan(Math.abs(turn) / 2);
	const side = turn > 0 ? 1 : -1;
	const centre = {
		y: corner.y - uy * back - side * uz * radius,
		z: corner.z - uz * back + side * uy * radius
	};
	return { kind: 'arc', centre, radius, start: Math.atan2(-side * uy, side * uz), sweep: turn };
}

const isArc = (item: ArcEdge | Point): item is ArcEdge => 'kind' in item;

/** Closed loop through points and arcs in turn, joined by straight lines; lines of no length are left out. */
export function closedLoop(items: readonly (ArcEdge | Point)[]): Loop {
	const starts = items.map((item) => (isArc(item) ? edgeStart(item) : item));
	const ends = items.map((item) => (isArc(item) ? edgeEnd(item) : item));
	const first = starts[0];
	if (first === undefined) return [];
	const reach = Math.max(...starts.map((p) => Math.hypot(p.y - first.y, p.z - first.z)));
	const edges: Edge[] = [];
	items.forEach((item, i) => {
		if (isArc(item)) edges.push(item);
		const from = ends[i] ?? first;
		const to = starts[i + 1] ?? first;
		if (Math.hypot(to.y - from.y, to.z - from.z) > nothing * reach)
			edges.push({ kind: 'line', from: { y: from.y, z: from.z }, to: { y: to.y, z: to.z } });
	});
	return edges;
}

/** Closed loop through corners in order, each rounded by its own radius. */
export function roundedLoop(corners: readonly Corner[]): Loop {
	const around = (i: number): Corner => corners.at(i % corners.length) ?? { y: 0, z: 0 };
	return closedLoop(
		corners.map((corner, i) => cornerArc(around(i - 1), corner, around(i + 1), corner.radius ?? 0))
	);
}

/** Rectangle with equally rounded corners, anticlockwise. */
export function rectangleLoop(
	left: number,
	bottom: number,
	right: number,
	top: number,
	radius = 0
): Loop {
	return roundedLoop([
		{ y: left, z: bottom, radius },
		{ y: right, z: bottom, radius },
		{ y: right, z: top, radius },
		{ y: left, z: top, radius }
	]);
}

/** Circle of four quarter arcs, anticlockwise. */
export function circleLoop(centre: Point, radius: number): Loop {
	return [0, 1, 2, 3].map((quarter) => ({
		kind: 'arc',
		centre,
		radius,
		start: (quarter * Math.PI) / 2,
		sweep: Math.PI / 2
	}));
}

/** The same loop run the other way round. */
export function reversedLoop(loop: Loop): Loop {
	return loop
		.map((edge): Edge =>
			edge.kind === 'line'
				? { kind: 'line', from: edge.to, to: edge.from }
				: { ...edge, start: edge.start + edge.sweep, sweep: -edge.sweep }
		)
		.reverse();
}
