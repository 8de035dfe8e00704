import { inStrip, pointOfStrip, type Strip } from './strips';

/** Where a contact lies on one plate: on a long face, on an end, or at a corner; `u` along the plate, mm. */
export interface ContactPlace {
	readonly edge: 'face' | 'end' | 'corner';
	readonly from: number;
	readonly to: number;
	/** Which face (+1: left of the direction of `u`) or end (+1: the far end). */
	readonly side: 1 | -1;
}

/** Two plates (indices) touching along a line or at a point. */
export interface Contact {
	readonly a: number;
	readonly b: number;
	readonly onA: ContactPlace;
	readonly onB: ContactPlace;
	/** Length of the line of contact, mm; 0 at a point. */
	readonly length: number;
}

interface Edge {
	readonly edge: 'face' | 'end';
	readonly side: 1 | -1;
	readonly from: UV;
	readonly to: UV;
}

type UV = { readonly u: number; readonly v: number };

/** How and where two touching plates meet. */
export function contactOf(strips: readonly Strip[], a: number, b: number, tolerance: number) {
	const [first, second] = [strips[a]!, strips[b]!];
	const own = edgesOf(first);
	const others = edgesOf(second).map((edge) => seenFrom(first, second, edge));
	for (const edge of own)
		for (const other of others) {
			const shared = sharedLine(edge, other, tolerance);
			if (shared) return lineContact(a, b, first, second, edge, other, shared);
		}
	return pointContact(a, b, first, second, others, tolerance);
}

function edgesOf({ half, halfThickness }: Strip): Edge[] {
	const corner = (u: number, v: number): UV => ({ u: u * half, v: v * halfThickness });
	return [
		{ edge: 'face', side: -1, from: corner(-1, -1), to: corner(1, -1) },
		{ edge: 'end', side: 1, from: corner(1, -1), to: corner(1, 1) },
		{ edge: 'face', side: 1, from: corner(1, 1), to: corner(-1, 1) },
		{ edge: 'end', side: -1, from: corner(-1, 1), to: corner(-1, -1) }
	];
}

function seenFrom(viewer: Strip, strip: Strip, edge: Edge): Edge {
	const seen = ({ u, v }: UV) => inStrip(viewer, pointOfStrip(strip, u, v));
	return { ...edge, from: seen(edge.from), to: seen(edge.to) };
}

/** Stretch of an edge along which another lies, as distances along the edge from its start; null when they share no length. */
function sharedLine({ from, to }: Edge, other: Edge, tolerance: number) {
	const length = Math.hypot(to.u - from.u, to.v - from.v);
	const [du, dv] = [(to.u - from.u) / length, (to.v - from.v) / length];
	const along = ({ u, v }: UV) => (u - from.u) * du + (v - from.v) * dv;
	const off = ({ u, v }: UV) => (v - from.v) * du - (u - from.u) * dv;
	const [p, q] = [along(other.from), along(other.to)];
	const [start, end] = [Math.max(Math.min(p, q), 0), Math.min(Math.max(p, q), length)];
	if (end - start <= 2 * tolerance) return null;
	const [offP, offQ] = [off(other.from), off(other.to)];
	const offAt = (s: number) => offP + ((s - p) / (q - p)) * (offQ - offP);
	if (Math.abs(offAt(start)) > 2 * tolerance || Math.abs(offAt(end)) > 2 * tolerance) return null;
	const at = (s: number): UV => ({ u: from.u + s * du, v: from.v + s * dv });
	return { length: end - start, ends: [at(start), at(end)] as const };
}

function lineContact(
	a: number,
	b: number,
	first: Strip,
	second: Strip,
	edge: Edge,
	other: Edge,
	{ length, ends }: { length: number; ends: readonly [UV, UV] }
): Contact {
	const onSecond = ends.map(({ u, v }) => inStrip(second, pointOfStrip(first, u, v)));
	return {
		a,
		b,
		onA: linePlace(edge, ends),
		onB: linePlace(other, [onSecond[0]!, onSecond[1]!]),
		length
	};
}

function linePlace({ edge, side }: Edge, [p, q]: readonly [UV, UV]): ContactPlace {
	return { edge, side, from: Math.min(p.u, q.u), to: Math.max(p.u, q.u) };
}

/** A corner on a face, an end or a corner: the corner of either plate that lies nearest to the other. */
function pointContact(
	a: number,
	b: number,
	first: Strip,
	second: Strip,
	others: readonly Edge[],
	tolerance: number
): Contact {
	const corners = [...others.map(({ from }) => from), ...edgesOf(first).map(({ from }) => from)];
	const depth = (point: UV) => Math.max(outside(first, point), outside(second, inOther(point)));
	const inOther = ({ u, v }: UV) => inStrip(second, pointOfStrip(first, u, v));
	const at = corners.reduce((best, point) => (depth(point) < depth(best) ? point : best));
	return {
		a,
		b,
		onA: pointPlace(first, at, tolerance),
		onB: pointPlace(second, inOther(at), tolerance),
		length: 0
	};
}

/** How far a point lies outside a strip, mm. */
const outside = ({ half, halfThickness }: Strip, { u, v }: UV): number =>
	Math.max(Math.abs(u) - half, Math.abs(v) - halfThickness, 0);

function pointPlace({ half, halfThickness }: Strip, { u, v }: UV, tolerance: number): ContactPlace {
	const atEnd = half - Math.abs(u) <= 2 * tolerance;
	const atFace = halfThickness - Math.abs(v) <= 2 * tolerance;
	const place = { from: u, to: u };
	if (atEnd) return { edge: atFace ? 'corner' : 'end', side: u < 0 ? -1 : 1, ...place };
	return { edge: 'face', side: v < 0 ? -1 : 1, ...place };
}
