import type { Point } from './boundary';

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
	return corners.map(([u, v]) => cornerFrom(plate, plate.centre.y, plate.centre.z, u, v));
}

const corners = [
	[-1, -1],
	[1, -1],
	[1, 1],
	[-1, 1]
] as const;

/** A corner of a rectangle whose centre lies at (y, z). */
const cornerFrom = (
	{ along, halfWidth, halfThickness }: TurnedRectangle,
	y: number,
	z: number,
	u: number,
	v: number
): Point => ({
	y: y + (u * halfWidth * along.y - v * halfThickness * along.z),
	z: z + (u * halfWidth * along.z + v * halfThickness * along.y)
});

/**
 * Clear distance between two plates, mm; negative when they overlap: then the least distance by
 * which one has to move to be clear (separating axes of the two rectangles).
 */
export function plateGap(a: TurnedRectangle, b: TurnedRectangle): number {
	const apart = Math.max(...separations(a, b));
	return apart < 0 ? apart : Math.hypot(...shortestWay(a, b));
}

/** Distances between two plates across the sides of both, negative where they overlap: along a, across a, along b, across b. */
function separations(a: TurnedRectangle, b: TurnedRectangle): [number, number, number, number] {
	const [dy, dz] = [b.centre.y - a.centre.y, b.centre.z - a.centre.z];
	const cosine = Math.abs(a.along.y * b.along.y + a.along.z * b.along.z);
	const sine = Math.abs(a.along.y * b.along.z - a.along.z * b.along.y);
	const off = ({ along }: TurnedRectangle) => Math.abs(dy * along.y + dz * along.z);
	const offAcross = ({ along }: TurnedRectangle) => Math.abs(dz * along.y - dy * along.z);
	const long = (one: TurnedRectangle) => one.halfWidth * cosine + one.halfThickness * sine;
	const thick = (one: TurnedRectangle) => one.halfWidth * sine + one.halfThickness * cosine;
	return [
		off(a) - a.halfWidth - long(b),
		offAcross(a) - a.halfThickness - thick(b),
		off(b) - b.halfWidth - long(a),
		offAcross(b) - b.halfThickness - thick(a)
	];
}

/** Shortest way from plate b to plate a when they are apart: from or to a corner of either, as (y, z), mm. */
function shortestWay(a: TurnedRectangle, b: TurnedRectangle): [number, number] {
	let best: [number, number] = [Infinity, Infinity];
	for (const [from, to, sign] of [
		[a, b, -1],
		[b, a, 1]
	] as const)
		for (const [u, v] of corners) {
			const [y, z] = [from.centre.y - to.centre.y, from.centre.z - to.centre.z];
			const way = wayTo(to, cornerFrom(from, y, z, u, v), sign);
			if (Math.hypot(...way) < Math.hypot(...best)) best = way;
		}
	return best;
}

/** From a point (measured from the rectangle's centre) straight to the rectangle. */
function wayTo(
	{ along, halfWidth, halfThickness }: TurnedRectangle,
	{ y, z }: Point,
	sign: 1 | -1
): [number, number] {
	const [u, v] = [y * along.y + z * along.z, z * along.y - y * along.z];
	const du = sign * (Math.min(Math.max(u, -halfWidth), halfWidth) - u);
	const dv = sign * (Math.min(Math.max(v, -halfThickness), halfThickness) - v);
	return [du * along.y - dv * along.z, du * along.z + dv * along.y];
}

/**
 * The least move of plate b, mm, after which it touches a: towards it when they are apart, out of it
 * when they overlap.
 */
export function moveToTouch(a: TurnedRectangle, b: TurnedRectangle): Point {
	const found = separations(a, b);
	const apart = Math.max(...found);
	if (apart > 0) {
		const [y, z] = shortestWay(a, b);
		return { y, z };
	}
	const axis = found.indexOf(apart);
	const { along } = axis < 2 ? a : b;
	const normal = axis % 2 === 0 ? along : { y: -along.z, z: along.y };
	const [dy, dz] = [b.centre.y - a.centre.y, b.centre.z - a.centre.z];
	const away = dy * normal.y + dz * normal.z < 0 ? apart : -apart;
	return { y: away * normal.y, z: away * normal.z };
}
