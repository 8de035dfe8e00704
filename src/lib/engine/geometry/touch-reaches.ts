import type { Point } from './boundary';
import { wound } from './rings';
import type { Sides, Touch } from './touching-circle';

/** Part of a side, or of the fan of directions at a corner that points inwards, where a circle within may touch. */
export interface Reach {
	readonly from: Touch;
	readonly to: Touch;
}

type Ring = readonly Point[];

/** Rings with the area on their left: the first is the outline, the others are its holes. */
export const woundRings = (rings: readonly Ring[]): Ring[] =>
	rings.map((ring, i) => wound(ring, i === 0));

/** The sides of rings, one ring after the other. */
export const sidesOf = (rings: readonly Ring[]): Sides =>
	Float64Array.from(
		rings.flatMap((ring) =>
			ring.flatMap(({ y, z }, k) => {
				const next = ring[(k + 1) % ring.length]!;
				return [y, z, next.y, next.z];
			})
		)
	);

/** All places where a circle within can touch a ring: for each side, the corner that it starts from, then itself. */
export const touchReaches = (ring: Ring): Reach[][] =>
	ring.map((point, k) => {
		const next = ring[(k + 1) % ring.length]!;
		const [before, after] = [direction(ring.at(k - 1)!, point), direction(point, next)];
		return [...fanAt(point, before, after), along(point, next, after)];
	});

function direction(from: Point, to: Point): Point {
	const length = Math.hypot(to.y - from.y, to.z - from.z);
	return { y: (to.y - from.y) / length, z: (to.z - from.z) / length };
}

const along = (from: Point, to: Point, { y, z }: Point): Reach => {
	const at = (point: Point): Touch => ({ y: point.y, z: point.z, inY: -z, inZ: y });
	return { from: at(from), to: at(to) };
};

/** Directions at a corner between two sides, in two halves; none where the area's angle is below 180°. */
function fanAt({ y, z }: Point, a: Point, b: Point): Reach[] {
	if (a.y * b.z - a.z * b.y > 0) return [];
	const middle =
		a.y * b.y + a.z * b.z > 0 ? { y: -a.z - b.z, z: a.y + b.y } : { y: a.y - b.y, z: a.z - b.z };
	const size = Math.hypot(middle.y, middle.z);
	const half: Touch = { y, z, inY: middle.y / size, inZ: middle.z / size };
	return [
		{ from: { y, z, inY: -a.z, inZ: a.y }, to: half },
		{ from: half, to: { y, z, inY: -b.z, inZ: b.y } }
	];
}

/** A place of a reach, by its share of the way from one end to the other. */
export function touchAt({ from, to }: Reach, share: number): Touch {
	const inY = from.inY + share * (to.inY - from.inY);
	const inZ = from.inZ + share * (to.inZ - from.inZ);
	const size = Math.hypot(inY, inZ);
	return {
		y: from.y + share * (to.y - from.y),
		z: from.z + share * (to.z - from.z),
		inY: inY / size,
		inZ: inZ / size
	};
}
