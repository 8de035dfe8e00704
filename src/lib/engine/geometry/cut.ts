import type { ArcEdge, Edge, LineEdge } from './boundary';
import { edgeEnd, edgeStart } from './bounds';
import { acrossOf, alongOf, pointIn, type Frame } from './frame';

/** Both parts of a body cut along a line; edges in any order, steel to their left. */
export interface CutEdges {
	readonly below: Edge[];
	readonly above: Edge[];
}

/** What lies on one side, and where its boundary is open along the cut: +1 an end, −1 a beginning. */
interface Side {
	readonly edges: Edge[];
	readonly open: { along: number; sign: 1 | -1 }[];
}

interface Cut {
	readonly frame: Frame;
	readonly level: number;
	/** Nearer than this a point lies on the cut, mm. */
	readonly tolerance: number;
	readonly below: Side;
	readonly above: Side;
}

/**
 * Cuts a body along a line parallel to the frame's axis at a level (mm), exactly: straight edges stay
 * straight and arcs stay arcs. The edges need no order. Points within `tolerance` of the line are taken
 * as lying on it.
 */
export function cutAlong(
	edges: readonly Edge[],
	frame: Frame,
	level: number,
	tolerance: number
): CutEdges {
	let cut!: Cut;
	// an end that two edges see on either side of the tolerance leaves the boundary open: look wider
	for (let i = 0, wide = tolerance; i < 4; i++, wide *= 3) {
		cut = { frame, level, tolerance: wide, below: emptySide(), above: emptySide() };
		for (const edge of edges) {
			if (edge.kind === 'line') cutLine(cut, edge);
			else cutArc(cut, edge);
		}
		if (isBalanced(cut.below) && isBalanced(cut.above)) break;
	}
	closeSide(cut, cut.below);
	closeSide(cut, cut.above);
	return { below: cut.below.edges, above: cut.above.edges };
}

const emptySide = (): Side => ({ edges: [], open: [] });

const isBalanced = ({ open }: Side): boolean =>
	open.reduce((sum: number, { sign }) => sum + sign, 0) === 0;

/** Signed height above the cut, 0 on it. */
function heightOf({ level, tolerance }: Cut, across: number): number {
	const height = across - level;
	return Math.abs(height) <= tolerance ? 0 : height;
}

function cutLine(cut: Cut, edge: LineEdge): void {
	const a = heightOf(cut, acrossOf(cut.frame, edge.from));
	const b = heightOf(cut, acrossOf(cut.frame, edge.to));
	if (a === 0 && b === 0) return;
	if (a >= 0 && b >= 0) return put(cut, cut.above, edge, a === 0, b === 0);
	if (a <= 0 && b <= 0) return put(cut, cut.below, edge, a === 0, b === 0);
	const share = a / (a - b);
	const { from, to } = edge;
	const at = { y: from.y + share * (to.y - from.y), z: from.z + share * (to.z - from.z) };
	put(cut, a > 0 ? cut.above : cut.below, { kind: 'line', from, to: at }, false, true);
	put(cut, b > 0 ? cut.above : cut.below, { kind: 'line', from: at, to }, true, false);
}

function put({ frame }: Cut, side: Side, edge: Edge, fromCut: boolean, toCut: boolean): void {
	side.edges.push(edge);
	if (fromCut) side.open.push({ along: alongOf(frame, edgeStart(edge)), sign: -1 });
	if (toCut) side.open.push({ along: alongOf(frame, edgeEnd(edge)), sign: 1 });
}

function cutArc(cut: Cut, arc: ArcEdge): void {
	const turn = Math.atan2(cut.frame.sin, cut.frame.cos);
	const middle = acrossOf(cut.frame, arc.centre);
	const acrossAt = (angle: number) => middle + arc.radius * Math.sin(angle - turn);
	const inner = crossings(arc, turn, (cut.level - middle) / arc.radius);
	const last = arc.start + arc.sweep;
	let from = arc.start;
	let fromCut = heightOf(cut, acrossOf(cut.frame, edgeStart(arc))) === 0;
	for (const to of [...inner, last]) {
		const side = acrossAt((from + to) / 2) > cut.level ? cut.above : cut.below;
		const toCut = to !== last || heightOf(cut, acrossOf(cut.frame, edgeEnd(arc))) === 0;
		put(cut, side, { ...arc, start: from, sweep: to - from }, fromCut, toCut);
		[from, fromCut] = [to, true];
	}
}

/** Angles at which an arc passes a level given as a sine, in the order of its run, ends left out. */
function crossings({ start, sweep }: ArcEdge, turn: number, sine: number): number[] {
	if (!(Math.abs(sine) < 1)) return [];
	const [low, high] = sweep > 0 ? [start, start + sweep] : [start + sweep, start];
	const first = Math.asin(sine);
	const found = [first, Math.PI - first].flatMap((angle) => {
		const from = angle + turn + Math.ceil((low - angle - turn) / (2 * Math.PI)) * 2 * Math.PI;
		return [from, from + 2 * Math.PI].filter((at) => at > low && at < high);
	});
	return found.sort((a, b) => (sweep > 0 ? a - b : b - a));
}

/** Joins the open ends along the cut. */
function closeSide({ frame, level }: Cut, { edges, open }: Side): void {
	open.sort((a, b) => a.along - b.along);
	let running = 0;
	for (let i = 0; i + 1 < open.length; i++) {
		running += open[i]!.sign;
		const [left, right] = [open[i]!.along, open[i + 1]!.along];
		if (running === 0 || left === right) continue;
		const [from, to] = running > 0 ? [left, right] : [right, left];
		const edge: LineEdge = {
			kind: 'line',
			from: pointIn(frame, from, level),
			to: pointIn(frame, to, level)
		};
		for (let k = 0; k < Math.abs(running); k++) edges.push(edge);
	}
}
