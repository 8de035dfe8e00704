import type { Point } from './boundary';
import { segmentPairs } from './segment-pairs';
import { distanceAlong, isOnSegment, segmentsCross } from './segments';
import { snappedPoints } from './snap';

/** A closed ring of points; `owner` tells whose it is. */
export interface OwnedRing {
	readonly points: readonly Point[];
	readonly owner: number;
}

/** Directed piece of an edge between two nodes that no other edge meets on the way. */
export interface Piece {
	readonly from: number;
	readonly to: number;
	readonly owner: number;
}

/** Rings cut at all points where they touch each other or themselves. */
export interface Arrangement {
	readonly nodes: readonly Point[];
	readonly pieces: readonly Piece[];
	/** First place where two edges cross each other between their ends. */
	readonly crossing: { readonly owners: readonly [number, number]; readonly at: Point } | null;
}

/**
 * Cuts rings at every point where they touch; points nearer than `tolerance` (mm) become one node.
 * Edges that run along each other end up as pieces between the same nodes.
 */
export function arrangementOf(rings: readonly OwnedRing[], tolerance: number): Arrangement {
	const { nodes, indices } = snappedPoints(
		rings.flatMap(({ points }) => points),
		tolerance
	);
	const edges = edgesOf(rings, indices);
	const cuts = edges.map((): number[] => []);
	let crossing: Arrangement['crossing'] = null;
	const segments = edges.map(({ from, to }) => [nodes[from]!, nodes[to]!] as const);
	for (const [i, j] of segmentPairs(segments, tolerance)) {
		const [a, b] = [edges[i]!, edges[j]!];
		const touching = cutsBetween(nodes, a, b, tolerance);
		cuts[i]!.push(...touching.onA);
		cuts[j]!.push(...touching.onB);
		if (touching.touch || crossing) continue;
		const at = segmentsCross(nodes[a.from]!, nodes[a.to]!, nodes[b.from]!, nodes[b.to]!);
		if (at) crossing = { owners: [a.owner, b.owner], at };
	}
	const pieces = edges.flatMap((edge, i) => piecesOf(nodes, edge, cuts[i]!));
	return { nodes, pieces, crossing };
}

function edgesOf(rings: readonly OwnedRing[], indices: readonly number[]): Piece[] {
	const edges: Piece[] = [];
	let offset = 0;
	for (const { points, owner } of rings) {
		for (let k = 0; k < points.length; k++) {
			const from = indices[offset + k]!;
			const to = indices[offset + ((k + 1) % points.length)]!;
			if (from !== to) edges.push({ from, to, owner });
		}
		offset += points.length;
	}
	return edges;
}

/** Nodes of each edge that lie within the other, and whether the edges meet at all. */
function cutsBetween(nodes: readonly Point[], a: Piece, b: Piece, tolerance: number) {
	const within = (edge: Piece, node: number) =>
		node !== edge.from &&
		node !== edge.to &&
		isOnSegment(nodes[node]!, nodes[edge.from]!, nodes[edge.to]!, tolerance);
	const onA = [b.from, b.to].filter((node) => within(a, node));
	const onB = [a.from, a.to].filter((node) => within(b, node));
	const shared = [a.from, a.to].some((node) => node === b.from || node === b.to);
	return { onA, onB, touch: shared || onA.length + onB.length > 0 };
}

function piecesOf(nodes: readonly Point[], edge: Piece, cuts: readonly number[]): Piece[] {
	const along = (node: number) => distanceAlong(nodes[node]!, nodes[edge.from]!, nodes[edge.to]!);
	const inside = [...new Set(cuts)].sort((p, q) => along(p) - along(q));
	const stops = [edge.from, ...inside, edge.to];
	return stops.slice(1).map((to, k) => ({ from: stops[k]!, to, owner: edge.owner }));
}
