import type { Point } from './boundary';

const cross = (o: Point, a: Point, b: Point): number =>
	(a.y - o.y) * (b.z - o.z) - (a.z - o.z) * (b.y - o.y);

/** How far along a segment a point's foot lies, mm from its start. */
export function distanceAlong(point: Point, from: Point, to: Point): number {
	const [dy, dz] = [to.y - from.y, to.z - from.z];
	return ((point.y - from.y) * dy + (point.z - from.z) * dz) / Math.hypot(dy, dz);
}

/** Distance from a point to a segment, mm. */
export function distanceToSegment(point: Point, from: Point, to: Point): number {
	const length = Math.hypot(to.y - from.y, to.z - from.z);
	if (length === 0) return Math.hypot(point.y - from.y, point.z - from.z);
	const along = Math.min(Math.max(distanceAlong(point, from, to), 0), length) / length;
	return Math.hypot(
		point.y - from.y - along * (to.y - from.y),
		point.z - from.z - along * (to.z - from.z)
	);
}

/** Whether a point lies on a segment within a tolerance in mm. */
export const isOnSegment = (point: Point, from: Point, to: Point, tolerance: number): boolean =>
	distanceToSegment(point, from, to) <= tolerance;

/** Point where two segments cross strictly between their ends; null when they do not. */
export function segmentsCross(a: Point, b: Point, c: Point, d: Point): Point | null {
	const [toA, toB] = [cross(c, d, a), cross(c, d, b)];
	const [toC, toD] = [cross(a, b, c), cross(a, b, d)];
	if (toA * toB >= 0 || toC * toD >= 0) return null;
	const share = toA / (toA - toB);
	return { y: a.y + share * (b.y - a.y), z: a.z + share * (b.z - a.z) };
}

/** Least distance between two segments that do not cross, mm. */
export const segmentGap = (a: Point, b: Point, c: Point, d: Point): number =>
	Math.min(
		distanceToSegment(a, c, d),
		distanceToSegment(b, c, d),
		distanceToSegment(c, a, b),
		distanceToSegment(d, a, b)
	);
