import type { Arrangement, Piece } from './arrangement';
import type { Point } from './boundary';

/** Where the number of turns of the rings is not allowed, and whose turns they are. */
export interface WindingFault {
	readonly at: Point;
	/** Turns of each owner's rings on the faulty side. */
	readonly turns: ReadonlyMap<number, number>;
}

const pieceKey = ({ from, to }: Piece): string => (from < to ? `${from},${to}` : `${to},${from}`);

/**
 * Looks for a place where the rings together wind round another number of times than 0 or `once`
 * (1, or −1 for a clockwise ring): there edges cross through a shared point, or areas overlap, or a
 * hole lies outside. Null when all is well. One probe for each chain of pieces between branchings.
 */
export function windingFault(arrangement: Arrangement, once: number): WindingFault | null {
	for (const piece of chainsOf(arrangement.pieces)) {
		for (const turns of turnsBeside(arrangement, piece)) {
			const total = [...turns.values()].reduce((sum, turn) => sum + turn, 0);
			if (total !== 0 && total !== once) return { at: middleOf(arrangement, piece), turns };
		}
	}
	return null;
}

/** One piece of every chain: pieces that follow each other without a branching share their sides. */
function chainsOf(pieces: readonly Piece[]): Piece[] {
	const atNode = new Map<number, Set<string>>();
	for (const piece of pieces)
		for (const node of [piece.from, piece.to])
			atNode.set(node, (atNode.get(node) ?? new Set()).add(pieceKey(piece)));
	const byKey = new Map(pieces.map((piece) => [pieceKey(piece), piece]));
	const seen = new Set<string>();
	const heads: Piece[] = [];
	for (const [key, piece] of byKey) {
		if (seen.has(key)) continue;
		heads.push(piece);
		markChain(key, byKey, atNode, seen);
	}
	return heads;
}

function markChain(
	start: string,
	byKey: ReadonlyMap<string, Piece>,
	atNode: ReadonlyMap<number, ReadonlySet<string>>,
	seen: Set<string>
): void {
	const waiting = [start];
	for (let key = waiting.pop(); key !== undefined; key = waiting.pop()) {
		if (seen.has(key)) continue;
		seen.add(key);
		const { from, to } = byKey.get(key)!;
		for (const node of [from, to]) {
			const meeting = atNode.get(node)!;
			if (meeting.size === 2) waiting.push(...meeting);
		}
	}
}

function middleOf({ nodes }: Arrangement, { from, to }: Piece): Point {
	const [a, b] = [nodes[from]!, nodes[to]!];
	return { y: a.y + (b.y - a.y) / 2, z: a.z + (b.z - a.z) / 2 };
}

/** Turns of every owner just beside a piece, on either side of it. */
function turnsBeside(arrangement: Arrangement, piece: Piece): Map<number, number>[] {
	const { nodes, pieces } = arrangement;
	const [a, b] = [nodes[piece.from]!, nodes[piece.to]!];
	const steep = Math.abs(b.z - a.z) >= Math.abs(b.y - a.y);
	// turned a quarter when the piece lies flat, so that a ray across it is well away from its line
	const seenFrom = (point: Point): Point => (steep ? point : { y: point.z, z: -point.y });
	const probe = seenFrom(middleOf(arrangement, piece));
	const key = pieceKey(piece);
	const beyond = new Map<number, number>();
	const before = new Map<number, number>();
	for (const other of pieces) {
		const [p, q] = [seenFrom(nodes[other.from]!), seenFrom(nodes[other.to]!)];
		const along = pieceKey(other) === key;
		const turn = along ? Math.sign(q.z - p.z) : turnRightOf(probe, p, q);
		add(before, other.owner, turn);
		if (!along) add(beyond, other.owner, turn);
	}
	return [beyond, before];
}

const add = (turns: Map<number, number>, owner: number, turn: number): void => {
	turns.set(owner, (turns.get(owner) ?? 0) + turn);
};

/** +1 when the edge rises through the ray from the probe to the right, −1 when it falls, else 0. */
function turnRightOf(probe: Point, p: Point, q: Point): number {
	const rises = p.z <= probe.z && q.z > probe.z;
	const falls = q.z <= probe.z && p.z > probe.z;
	if (!rises && !falls) return 0;
	const side = (q.y - p.y) * (probe.z - p.z) - (probe.y - p.y) * (q.z - p.z);
	if (rises) return side > 0 ? 1 : 0;
	return side < 0 ? -1 : 0;
}
