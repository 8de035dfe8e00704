import type { Point } from '../boundary';
import { groups, twinInside } from './side-links';
import { nextSide, type Triangulation } from './triangulation';

/** One closed rim of a piece: around the outside, or around a hole. */
export interface Rim {
	readonly nodes: readonly number[];
	/** Area it encloses: positive round the outside, negative round a hole. */
	readonly area: number;
}

/** Rims of the area, from the nodes at the corners and in the middles of the sides. */
export function rimsOf(
	mesh: Triangulation,
	corners: Int32Array,
	middles: Int32Array,
	{ y, z }: { y: Float64Array; z: Float64Array }
): Rim[] {
	const sides: number[] = [];
	for (let side = 0; side < corners.length; side++)
		if (corners[side]! >= 0 && twinInside(mesh, side) < 0) sides.push(side);
	const find = groups(y.length, (join) => {
		for (const side of sides) join(corners[side]!, corners[nextSide(side)]!);
	});
	const rims = new Map<number, { nodes: number[]; area: number }>();
	for (const side of sides) {
		const [a, b, m] = [corners[side]!, corners[nextSide(side)]!, middles[side]!];
		const rim = rims.get(find(a)) ?? { nodes: [], area: 0 };
		rims.set(find(a), rim);
		rim.nodes.push(a, m);
		rim.area += (y[a]! * z[b]! - y[b]! * z[a]!) / 2 + bulgeArea(pointAt(a), pointAt(m), pointAt(b));
	}
	return [...rims.values()];

	function pointAt(node: number): Point {
		return { y: y[node]!, z: z[node]! };
	}
}

/** Area between a chord and the parabola through its middle node, positive where it bulges to the right. */
const bulgeArea = (a: Point, m: Point, b: Point): number => {
	const [dy, dz] = [m.y - (a.y + b.y) / 2, m.z - (a.z + b.z) / 2];
	return (2 / 3) * (dy * (b.z - a.z) - dz * (b.y - a.y));
};
