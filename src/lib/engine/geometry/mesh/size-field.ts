import type { Edge, Loop, Point } from '../boundary';
import { edgeDirection, edgePoint, edgeSpan } from './placed-loops';
import { wallThickness } from './wall-thickness';

/** A place that asks for elements of a size. */
interface Source extends Point {
	readonly size: number;
}

/** Element size wanted at a point of the boundary, and how fast elements may grow away from it. */
export interface SizeField {
	readonly at: (point: Point) => number;
	readonly growth: number;
}

/** Corners that turn less than this, radians, are a curve drawn with straight edges. */
const smoothTurn = 0.35;
/** Element size at corners as shares of the wall there; re-entrant ones carry the singularity. */
const cornerShare = { convex: 0.2, reentrant: 0.06 } as const;
const arcShare = 0.15;
/** An element covers no more of an arc than this, radians. */
export const arcTurn = Math.PI / 12;
/** How fast elements may grow away from the places that ask for small ones. */
const usualGrowth = 0.3;

/**
 * Small elements where the stress function bends: at corners and along arcs, in proportion to the
 * wall there; growing with the distance. Along plain walls it is a polynomial that quadratic
 * elements of any length carry exactly. `coarser` multiplies every size.
 */
export function sizeField(loops: readonly Loop[], coarser: number): SizeField {
	const edges = loops.flat();
	const sources = loops.flatMap((loop) => [
		...loop.flatMap((edge, i) => cornerSource(loop.at(i - 1)!, edge, edges)),
		...loop.flatMap((edge) => arcSource(edge, edges))
	]);
	const growth = usualGrowth * coarser;
	const at = ({ y, z }: Point) => {
		let size = 1;
		for (const source of sources) {
			const [dy, dz] = [source.y - y, source.z - z];
			const reach = (size - source.size * coarser) / growth;
			if (reach > 0 && dy * dy + dz * dz < reach * reach)
				size = source.size * coarser + growth * Math.sqrt(dy * dy + dz * dz);
		}
		return size;
	};
	return { at, growth };
}

/** Just beside a corner, where the wall of an edge is measured, as a share of the edge. */
const beside = 1e-3;

function cornerSource(before: Edge, after: Edge, edges: readonly Edge[]): Source[] {
	const [u, v] = [edgeDirection(before, 1), edgeDirection(after, 0)];
	const turn = Math.atan2(u.y * v.z - u.z * v.y, u.y * v.y + u.z * v.z);
	if (Math.abs(turn) < smoothTurn) return [];
	const wall = Math.min(
		edgeSpan(before),
		edgeSpan(after),
		wallThickness(before, 1 - beside, edges),
		wallThickness(after, beside, edges)
	);
	const share = turn > 0 ? cornerShare.convex : cornerShare.reentrant;
	return [{ ...edgePoint(after, 0), size: share * wall }];
}

function arcSource(edge: Edge, edges: readonly Edge[]): Source[] {
	if (edge.kind === 'line') return [];
	const size = Math.min(edge.radius * arcTurn, arcShare * wallThickness(edge, 0.5, edges));
	return [0, 0.5, 1].map((share) => ({ ...edgePoint(edge, share), size }));
}

/** An arc's piece bulges no more than this share of the wall, so that no element folds over. */
const bulge = 0.1;

/** Longest piece that may be cut from an edge. */
export function longestPiece(edge: Edge, edges: readonly Edge[]): number {
	if (edge.kind === 'line') return Infinity;
	const flat = Math.sqrt((8 * bulge * wallThickness(edge, 0.5, edges)) / edge.radius);
	return edge.radius * Math.min(arcTurn, flat);
}
