import { middleOf, type Segment } from './boundary-samples';
import { rimsOf, type Rim } from './rims';
import { groups, piecesOf, twinInside } from './side-links';
import { nextSide, sideKey, type Triangulation } from './triangulation';

/** Six-node triangles: corners anticlockwise, then the nodes on the sides 1–2, 2–3 and 3–1. */
export interface QuadraticMesh {
	readonly y: Float64Array;
	readonly z: Float64Array;
	readonly elements: Int32Array;
	/** Piece of each element; pieces hang together by edges, a shared point does not join them. */
	readonly pieceOf: Int32Array;
	readonly pieces: number;
	readonly rims: readonly Rim[];
}

/** Quadratic elements on a triangulation; sides on arcs are curved. */
export function quadraticMesh(mesh: Triangulation): QuadraticMesh {
	const corners = cornerNodes(mesh);
	const elements: number[] = [];
	const y: number[] = [];
	const z: number[] = [];
	for (let side = 0; side < corners.length; side++) {
		const node = corners[side]!;
		if (node < 0) continue;
		const point = mesh.points[mesh.corners[side]!]!;
		[y[node], z[node]] = [point.y, point.z];
	}
	const middles = sideMiddles(mesh, y, z);
	for (let t = 0; t < mesh.inside.length; t++) {
		if (!mesh.inside[t]) continue;
		for (const list of [corners, middles])
			for (let k = 0; k < 3; k++) elements.push(list[3 * t + k]!);
	}
	const { pieceOf, pieces } = piecesOf(mesh);
	const placed = { y: Float64Array.from(y), z: Float64Array.from(z) };
	const rims = rimsOf(mesh, corners, middles, placed);
	return { ...placed, elements: Int32Array.from(elements), pieceOf, pieces, rims };
}

/** Node of every triangle corner: corners at one point are one node only where triangles hang together around it. */
function cornerNodes(mesh: Triangulation): Int32Array {
	const count = mesh.corners.length;
	const find = groups(count, (join) => {
		for (let side = 0; side < count; side++) {
			const twin = mesh.inside[Math.floor(side / 3)] ? twinInside(mesh, side) : -1;
			if (twin < side) continue;
			join(side, nextSide(twin));
			join(nextSide(side), twin);
		}
	});
	const numbers = new Map<number, number>();
	return Int32Array.from({ length: count }, (_, side) => {
		if (!mesh.inside[Math.floor(side / 3)]) return -1;
		const leader = find(side);
		const node = numbers.get(leader) ?? numbers.size;
		numbers.set(leader, node);
		return node;
	});
}

/** Node in the middle of every side, added to the coordinates. */
function sideMiddles(mesh: Triangulation, y: number[], z: number[]): Int32Array {
	const { points, corners, inside } = mesh;
	const arcs = new Map(
		mesh.segments.map((segment) => [sideKey(segment.from, segment.to), segment])
	);
	const middles = new Int32Array(corners.length).fill(-1);
	for (let side = 0; side < corners.length; side++) {
		if (!inside[Math.floor(side / 3)] || middles[side]! >= 0) continue;
		const [from, to] = [corners[side]!, corners[nextSide(side)]!];
		const twin = twinInside(mesh, side);
		const wall: Segment | undefined = twin < 0 ? arcs.get(sideKey(from, to)) : undefined;
		const middle = middleOf(points[from]!, points[to]!, wall?.arc ?? null);
		middles[side] = y.push(middle.y) - 1;
		z.push(middle.z);
		if (twin >= 0) middles[twin] = middles[side]!;
	}
	return middles;
}
