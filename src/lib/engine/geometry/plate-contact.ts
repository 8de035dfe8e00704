import type { Point } from './boundary';
import { segmentGap } from './segments';

/** A rectangle turned in its plane. */
export interface TurnedRectangle {
	readonly centre: Point;
	/** Unit vector of the width; the thickness stands a quarter turn anticlockwise from it. */
	readonly along: Point;
	readonly halfWidth: number;
	readonly halfThickness: number;
}

/** Corners, anticlockwise, mm. */
export function cornersOf(plate: TurnedRectangle): Point[] {
	return cornersFrom(plate, { y: 0, z: 0 });
}

/** Corners measured from a point, so that nothing is lost far from the origin. */
function cornersFrom({ centre, along, halfWidth, halfThickness }: TurnedRectangle, from: Point) {
	const [cy, cz] = [centre.y - from.y, centre.z - from.z];
	const at = (u: number, v: number): Point => ({
		y: cy + (u * halfWidth * along.y - v * halfThickness * along.z),
		z: cz + (u * halfWidth * along.z + v * halfThickness * along.y)
	});
	return [at(-1, -1), at(1, -1), at(1, 1), at(-1, 1)];
}

/**
 * Clear distance between two plates, mm; negative when they overlap: then the least distance by
 * which one has to move to be clear (separating axes of the two rectangles).
 */
export function plateGap(a: TurnedRectangle, b: TurnedRectangle): number {
	const [cornersA, cornersB] = [cornersFrom(a, a.centre), cornersFrom(b, a.centre)];
	const normals = [a.along, b.along].flatMap(({ y, z }) => [
		{ y, z },
		{ y: -z, z: y }
	]);
	const apart = Math.max(...normals.map((normal) => separation(cornersA, cornersB, normal)));
	return apart < 0 ? apart : Math.min(...edgeGaps(cornersA, cornersB));
}

function separation(a: readonly Point[], b: readonly Point[], normal: Point): number {
	const across = (point: Point) => point.y * normal.y + point.z * normal.z;
	const [onA, onB] = [a.map(across), b.map(across)];
	return Math.max(Math.min(...onB) - Math.max(...onA), Math.min(...onA) - Math.max(...onB));
}

function edgeGaps(a: readonly Point[], b: readonly Point[]): number[] {
	return a.flatMap((p, i) => b.map((q, j) => segmentGap(p, a[(i + 1) % 4]!, q, b[(j + 1) % 4]!)));
}
