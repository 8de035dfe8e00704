import { ringArea } from '../geometry/rings';
import type { OutlineRegion, Ring } from './definition';

/** A ring and the line of the text that it begins on. */
export interface TextRing {
	readonly line: number;
	readonly points: [number, number][];
}

/**
 * Rings as regions: a ring in an even number of others is a region, in an odd number a hole of the
 * smallest that it lies in. In the order they were given. Rings that cross are left for the outline's own checks.
 */
export function nestedRegions(rings: readonly TextRing[]): OutlineRegion[] {
	const areas = rings.map(({ points }) => Math.abs(ringArea(points.map(([y, z]) => ({ y, z })))));
	const around = rings.map(({ points }, i) =>
		rings.flatMap((other, j) =>
			areas[j]! > areas[i]! && isWithin(points, other.points) ? [j] : []
		)
	);
	const owner = around.map((list) =>
		list.length % 2 === 0 ? null : list.reduce((a, b) => (areas[b]! < areas[a]! ? b : a))
	);
	return rings.flatMap(({ points }, i) => {
		if (owner[i] !== null) return [];
		const holes = rings.filter((_, j) => owner[j] === i).map((ring) => ring.points);
		return [{ outer: points, ...(holes.length > 0 ? { holes } : {}) }];
	});
}

/** Whether a ring lies within a larger one: told by its corners that do not stand on the other's edge, or else by the middles of its sides. */
function isWithin(ring: Ring, other: Ring): boolean {
	const middles = ring.map(([y, z], i): [number, number] => {
		const [y2, z2] = ring[(i + 1) % ring.length]!;
		return [(y + y2) / 2, (z + z2) / 2];
	});
	const sides = [...ring, ...middles]
		.map((point) => sideOf(point, other))
		.filter((side) => side !== 0);
	return sides.length > 0 && sides.every((side) => side > 0);
}

/** 1 inside a ring, −1 outside, 0 on its edge. */
function sideOf([y, z]: readonly [number, number], ring: Ring): number {
	let inside = false;
	for (const [i, [py, pz]] of ring.entries()) {
		const [qy, qz] = ring[(i + 1) % ring.length]!;
		const cross = (qy - py) * (z - pz) - (qz - pz) * (y - py);
		const between = (y - py) * (y - qy) + (z - pz) * (z - qz) <= 0;
		if (cross === 0 && between) return 0;
		if (pz > z !== qz > z && cross > 0 === qz > pz) inside = !inside;
	}
	return inside ? 1 : -1;
}
