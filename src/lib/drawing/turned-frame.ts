import type { Edge, Loop, Point } from '$lib/engine/geometry/boundary';

/** The section seen turned so that the axis at `angle` degrees lies level: side to the right, depth upward, mm. */
export interface TurnedFrame {
	readonly origin: Point;
	readonly angle: number;
	readonly cos: number;
	readonly sin: number;
}

/** Extent in the turned frame, mm from its origin. */
export interface Extent {
	readonly left: number;
	readonly right: number;
	readonly bottom: number;
	readonly top: number;
}

const exact = (value: number) => (Math.abs(value) < 1e-15 ? 0 : value);

export function turnedFrame(origin: Point, angle: number): TurnedFrame {
	const radians = (angle * Math.PI) / 180;
	return { origin, angle, cos: exact(Math.cos(radians)), sin: exact(Math.sin(radians)) };
}

/** Height of a point above the level axis through the origin, mm. */
export const depthOf = (frame: TurnedFrame, { y, z }: Point) =>
	(z - frame.origin.z) * frame.cos - (y - frame.origin.y) * frame.sin;

/** Distance of a point to the right of the origin along the level axis, mm. */
export const sideOf = (frame: TurnedFrame, { y, z }: Point) =>
	(y - frame.origin.y) * frame.cos + (z - frame.origin.z) * frame.sin;

/** Extent of loops with straight and arc edges; of nothing: a point at the origin. */
export function extentOf(frame: TurnedFrame, loops: readonly Loop[]): Extent {
	const points = loops.flat().flatMap((edge) => extremePoints(frame, edge));
	if (points.length === 0) return { left: 0, right: 0, bottom: 0, top: 0 };
	const sides = points.map((point) => sideOf(frame, point));
	const depths = points.map((point) => depthOf(frame, point));
	return {
		left: sides.reduce((a, b) => Math.min(a, b)),
		right: sides.reduce((a, b) => Math.max(a, b)),
		bottom: depths.reduce((a, b) => Math.min(a, b)),
		top: depths.reduce((a, b) => Math.max(a, b))
	};
}

function extremePoints(frame: TurnedFrame, edge: Edge): Point[] {
	if (edge.kind === 'line') return [edge.from, edge.to];
	const turn = (frame.angle * Math.PI) / 180;
	const quarters = [0, 1, 2, 3].map((quarter) => turn + (quarter * Math.PI) / 2);
	const angles = [edge.start, edge.start + edge.sweep, ...quarters.filter((a) => within(edge, a))];
	return angles.map((angle) => ({
		y: edge.centre.y + edge.radius * Math.cos(angle),
		z: edge.centre.z + edge.radius * Math.sin(angle)
	}));
}

function within(arc: { start: number; sweep: number }, angle: number): boolean {
	const full = 2 * Math.PI;
	const along = arc.sweep >= 0 ? angle - arc.start : arc.start - angle;
	return ((along % full) + full) % full <= Math.abs(arc.sweep);
}
