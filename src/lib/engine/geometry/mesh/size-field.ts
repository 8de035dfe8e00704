import type { Edge, Loop, Point } from '../boundary';
import { edgeDirection, edgePoint, edgeSpan } from './placed-loops';
import { wallThickness } from './wall-thickness';

/** A place that asks for elements of a size. */
export interface Source extends Point {
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
 * elements of any length carry exactly.
 */
export function sizeSources(loops: readonly Loop[]): Source[] {
	const edges = loops.flat();
	return loops.flatMap((loop) => [
		...loop.flatMap((edge, i) => cornerSource(loop.at(i - 1)!, edge, edges)),
		...loop.flatMap((edge) => arcSource(edge, edges))
	]);
}

/** The sizes that sources ask for around them; `coarser` multiplies every size. */
export function sizeField(sources: readonly Source[], coarser: number): SizeField {
	const growth = usualGrowth * coarser;
	return { at: sizeFrom(sources, coarser, growth), growth };
}

/** Asked for every piece of boundary, so that the sources stand in plain rows of numbers. */
function sizeFrom(sources: readonly Source[], coarser: number, growth: number): SizeField['at'] {
	const ys = Float64Array.from(sources, ({ y }) => y);
	const zs = Float64Array.from(sources, ({ z }) => z);
	const sizes = Float64Array.from(sources, ({ size }) => size * coarser);
	return ({ y, z }) => {
		let size = 1;
		for (let i = 0; i < sizes.length; i++) {
			const reach = (size - sizes[i]!) / growth;
			if (reach <= 0) continue;
			const dy = ys[i]! - y;
			const dz = zs[i]! - z;
			const square = dy * dy + dz * dz;
			if (square < reach * reach) size = sizes[i]! + growth * Math.sqrt(square);
		}
		return size;
	};
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
