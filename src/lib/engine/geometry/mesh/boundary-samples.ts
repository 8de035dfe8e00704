import type { ArcEdge, Edge, Loop, Point } from '../boundary';
import { edgePoint, edgeSpan } from './placed-loops';
import { longestPiece, type SizeField } from './size-field';

/** Piece of the boundary between two points, area on its left. */
export interface Segment {
	readonly from: number;
	readonly to: number;
	readonly arc: ArcEdge | null;
}

/** Points with the element size wanted at each, and the boundary pieces between them. */
export interface Samples {
	readonly points: Point[];
	readonly sizes: number[];
	segments: Segment[];
}

/**
 * Boundary points as close as the size field asks; loops that touch share the point. Null as soon as
 * there are more than `most`.
 */
export function boundarySamples(
	loops: readonly Loop[],
	{ at }: SizeField,
	most: number
): Samples | null {
	const samples: Samples = { points: [], sizes: [], segments: [] };
	const edges = loops.flat();
	const known = new Map<string, number>();
	const node = (point: Point): number => {
		const key = `${point.y},${point.z}`;
		const found = known.get(key);
		if (found !== undefined) return found;
		known.set(key, samples.points.length);
		return addPoint(samples, point, at(point));
	};
	for (const loop of loops) {
		const starts = loop.map((edge) => node(edgePoint(edge, 0)));
		for (const [i, edge] of loop.entries()) {
			const inside = edgeStops(edge, at, longestPiece(edge, edges), most);
			const stops = [
				starts[i]!,
				...inside.map((share) => node(edgePoint(edge, share))),
				starts[(i + 1) % loop.length]!
			];
			if (samples.points.length > most) return null;
			for (let k = 1; k < stops.length; k++) addSegment(samples, stops[k - 1]!, stops[k]!, edge);
		}
	}
	return samples;
}

export function addPoint({ points, sizes }: Samples, point: Point, size: number): number {
	sizes.push(size);
	return points.push(point) - 1;
}

function addSegment({ points, sizes, segments }: Samples, from: number, to: number, edge: Edge) {
	const [a, b] = [points[from]!, points[to]!];
	const length = Math.hypot(a.y - b.y, a.z - b.z);
	for (const node of [from, to]) sizes[node] = Math.min(sizes[node]!, length);
	segments.push({ from, to, arc: edge.kind === 'arc' ? edge : null });
}

/** Shares of an edge at which it is cut: halved until each piece is as short as wanted, or there are more than `most`. */
function edgeStops(edge: Edge, sizeAt: SizeField['at'], longest: number, most: number): number[] {
	const length = edgeSpan(edge);
	const stops: number[] = [];
	const halve = (from: number, to: number): void => {
		if (stops.length > most) return;
		const middle = (from + to) / 2;
		const piece = (to - from) * length;
		if (piece <= longest && piece <= sizeAt(edgePoint(edge, middle))) return;
		halve(from, middle);
		stops.push(middle);
		halve(middle, to);
	};
	halve(0, 1);
	return stops;
}

/** A segment cut in two at its middle, on the arc where it belongs to one. */
export function halvedSegment(samples: Samples, { from, to, arc }: Segment): Segment[] {
	const middle = middleOf(samples.points[from]!, samples.points[to]!, arc);
	const size = Math.min(samples.sizes[from]!, samples.sizes[to]!) / 2;
	const node = addPoint(samples, middle, size);
	return [
		{ from, to: node, arc },
		{ from: node, to, arc }
	];
}

/** Middle between two points of a line or an arc. */
export function middleOf(a: Point, b: Point, arc: ArcEdge | null): Point {
	const middle = { y: (a.y + b.y) / 2, z: (a.z + b.z) / 2 };
	if (arc === null) return middle;
	const [dy, dz] = [middle.y - arc.centre.y, middle.z - arc.centre.z];
	const stretch = arc.radius / Math.hypot(dy, dz);
	return { y: arc.centre.y + dy * stretch, z: arc.centre.z + dz * stretch };
}
