import type { Arrangement, Piece } from './arrangement';
import type { Loop, Point } from './boundary';
import { closedLoop } from './loops';

/**
 * Outline of the area that rings cover together: pieces that run both ways cancel, the rest is
 * followed round. Outer loops anticlockwise, holes clockwise, area to the left.
 */
export function mergedLoops({ nodes, pieces }: Arrangement): Loop[] {
	const leaving = remainingPieces(pieces);
	const loops: Loop[] = [];
	for (const start of [...leaving.keys()]) {
		while ((leaving.get(start) ?? []).length > 0) {
			const ring = follow(nodes, leaving, start);
			const corners = withoutStraightCorners(ring.map((node) => nodes[node]!));
			if (corners.length > 2) loops.push(closedLoop(corners));
		}
	}
	return loops;
}

/** Nodes that can be reached from each node once opposite pieces have cancelled. */
function remainingPieces(pieces: readonly Piece[]): Map<number, number[]> {
	const net = new Map<string, { from: number; to: number; count: number }>();
	for (const { from, to } of pieces) {
		const back = net.get(`${to},${from}`);
		if (back && back.count > 0) back.count -= 1;
		else {
			const same = net.get(`${from},${to}`) ?? { from, to, count: 0 };
			same.count += 1;
			net.set(`${from},${to}`, same);
		}
	}
	const leaving = new Map<number, number[]>();
	for (const { from, to, count } of net.values())
		for (let k = 0; k < count; k++) leaving.set(from, [...(leaving.get(from) ?? []), to]);
	return leaving;
}

/** Takes one closed walk off the pieces; where ways part, the one furthest to the right. */
function follow(nodes: readonly Point[], leaving: Map<number, number[]>, start: number): number[] {
	const walk = [start];
	let from: number | null = null;
	let here = start;
	do {
		const ways = leaving.get(here) ?? [];
		const next: number = from === null ? ways[0]! : rightmost(nodes, from, here, ways);
		ways.splice(ways.indexOf(next), 1);
		[from, here] = [here, next];
		walk.push(here);
	} while (here !== start);
	return walk.slice(0, -1);
}

function rightmost(
	nodes: readonly Point[],
	from: number,
	here: number,
	ways: readonly number[]
): number {
	const turn = (to: number) => turnAt(nodes[from]!, nodes[here]!, nodes[to]!);
	return [...ways].sort((a, b) => turn(a) - turn(b))[0]!;
}

function turnAt(a: Point, b: Point, c: Point): number {
	const [uy, uz, vy, vz] = [b.y - a.y, b.z - a.z, c.y - b.y, c.z - b.z];
	return Math.atan2(uy * vz - uz * vy, uy * vy + uz * vz);
}

/** Turns smaller than this (radians) are straight on. */
const straight = 1e-9;

const withoutStraightCorners = (corners: readonly Point[]): Point[] =>
	corners.filter((corner, i) => {
		const before = corners.at(i - 1)!;
		const after = corners[(i + 1) % corners.length]!;
		return Math.abs(turnAt(before, corner, after)) > straight;
	});
