/** A place on the outline, with the unit direction into the area there. */
export interface Touch {
	readonly y: number;
	readonly z: number;
	readonly inY: number;
	readonly inZ: number;
}

/** Straight sides with the area on their left: y, z of the start and of the end of each, mm. */
export type Sides = Float64Array;

/** A neighbour that turns in by less than this slope goes straight on. */
const straightOn = 1e-9;

/**
 * Radius of the circle that touches the outline at a place and a side besides, mm: the least over the
 * side's points p of |p|²/(2p·n), seen from the place with n into the area. Infinite when the side is
 * behind or surely leaves `most` (mm), zero when it turns in there. As the place moves along a side, or
 * n turns about a corner, it is nowhere greater than at the ends.
 */
export function touchingRadius(at: Touch, sides: Sides, side: number, most = Infinity): number {
	const { y, z, inY, inZ } = at;
	const fromY = sides[4 * side]! - y;
	const fromZ = sides[4 * side + 1]! - z;
	const toY = sides[4 * side + 2]! - y;
	const toZ = sides[4 * side + 3]! - z;
	const fromUp = fromY * inY + fromZ * inZ;
	const toUp = toY * inY + toZ * inZ;
	if (fromUp <= 0 && toUp <= 0) return Infinity;
	if (fromUp >= 2 * most && toUp >= 2 * most) return Infinity;
	const from = fromY * inZ - fromZ * inY;
	const to = toY * inZ - toZ * inY;
	if ((from >= most && to >= most) || (from <= -most && to <= -most)) return Infinity;
	if (fromY === 0 && fromZ === 0) return toUp > straightOn * Math.abs(to) ? 0 : Infinity;
	if (toY === 0 && toZ === 0) return fromUp > straightOn * Math.abs(from) ? 0 : Infinity;
	return leastRadius(from, fromUp, to, toUp);
}

/** The same of a side given by its ends across the direction and along it. */
function leastRadius(from: number, fromUp: number, to: number, toUp: number): number {
	const length = Math.sqrt((to - from) * (to - from) + (toUp - fromUp) * (toUp - fromUp));
	const across = (to - from) / length;
	const up = (toUp - fromUp) / length;
	const moment = up * from - across * fromUp;
	const radius = moment > 0 ? moment / (1 - across) : -moment / (1 + across);
	const along = up * (radius - fromUp) - across * from;
	if (along < 0) return throughPoint(from, fromUp);
	if (along > length) return throughPoint(to, toUp);
	return Number.isFinite(radius) ? radius : Infinity;
}

const throughPoint = (across: number, up: number): number =>
	up > 0 ? (across * across + up * up) / (2 * up) : Infinity;
