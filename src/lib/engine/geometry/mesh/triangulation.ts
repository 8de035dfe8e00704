import Delaunator from 'delaunator';
import type { Loop, Point } from '../boundary';
import { boundarySamples, halvedSegment, type Samples, type Segment } from './boundary-samples';
import { refined } from './refinement';
import type { SizeField } from './size-field';

/** Triangles of an area: three corners each, anticlockwise, with the neighbour across each side. */
export interface Triangulation {
	readonly points: readonly Point[];
	/** Boundary pieces that are sides of the triangles. */
	readonly segments: readonly Segment[];
	readonly corners: Uint32Array;
	/** Side k of triangle t runs from its corner k to the next: the same side seen from the other triangle, −1 at none. */
	readonly twins: Int32Array;
	/** 1 where the triangle lies within the area. */
	readonly inside: Uint8Array;
}

/** Rounds of refinement before giving up. */
const mostRounds = 60;

export type Refusal = 'too-many-points' | 'not-settled';

/**
 * Delaunay triangles of the area to the left of `loops`, sides no longer than the size field asks.
 * Boundary pieces that Delaunay's rule passes over are halved until it keeps them all; triangles too
 * large are given a point at their circumcentre. A generator: it pauses after every round.
 */
export function* triangulating(
	loops: readonly Loop[],
	sizes: SizeField,
	mostPoints: number
): Generator<void, Triangulation | Refusal> {
	const samples = boundarySamples(loops, sizes, mostPoints);
	yield;
	if (samples === null) return 'too-many-points';
	for (let round = 0; round < mostRounds; round++) {
		if (samples.points.length > mostPoints) return 'too-many-points';
		const mesh = delaunay(samples);
		yield;
		if (halvedMissing(samples, mesh)) continue;
		markInside(mesh, samples.segments);
		if (!refined(samples, mesh, sizes.growth)) return mesh;
	}
	return 'not-settled';
}

function delaunay({ points, segments }: Samples): Triangulation {
	const coordinates = new Float64Array(2 * points.length);
	points.forEach(({ y, z }, i) => {
		coordinates[2 * i] = y;
		// the library counts its second axis downwards when it says anticlockwise
		coordinates[2 * i + 1] = -z;
	});
	const { triangles: corners, halfedges: twins } = new Delaunator(coordinates);
	return { points, segments, corners, twins, inside: new Uint8Array(corners.length / 3) };
}

export const nextSide = (side: number): number => (side % 3 === 2 ? side - 2 : side + 1);

/** One number for a side, whichever way it runs. */
export const sideKey = (a: number, b: number): number =>
	a < b ? a * 0x400000 + b : b * 0x400000 + a;

function halvedMissing(samples: Samples, { corners }: Triangulation): boolean {
	const sides = new Set<number>();
	for (let side = 0; side < corners.length; side++)
		sides.add(sideKey(corners[side]!, corners[nextSide(side)]!));
	const missing = samples.segments.filter(({ from, to }) => !sides.has(sideKey(from, to)));
	if (missing.length === 0) return false;
	const gone = new Set(missing);
	samples.segments = [
		...samples.segments.filter((segment) => !gone.has(segment)),
		...missing.flatMap((segment) => halvedSegment(samples, segment))
	];
	return true;
}

export const wallKeys = (segments: readonly Segment[]): Set<number> =>
	new Set(segments.map(({ from, to }) => sideKey(from, to)));

/** Walks in from outside; every boundary piece crossed changes sides. */
function markInside({ corners, twins, inside }: Triangulation, segments: readonly Segment[]): void {
	const walls = wallKeys(segments);
	const crossed = (side: number) => walls.has(sideKey(corners[side]!, corners[nextSide(side)]!));
	const seen = new Uint8Array(inside.length);
	const waiting: number[] = [];
	const reach = (triangle: number, within: number) => {
		if (seen[triangle]) return;
		seen[triangle] = 1;
		inside[triangle] = within;
		waiting.push(triangle);
	};
	for (let side = 0; side < twins.length; side++)
		if (twins[side]! < 0) reach(Math.floor(side / 3), crossed(side) ? 1 : 0);
	for (let t = waiting.pop(); t !== undefined; t = waiting.pop()) {
		for (let side = 3 * t; side < 3 * t + 3; side++) {
			const twin = twins[side]!;
			if (twin >= 0) reach(Math.floor(twin / 3), crossed(side) ? 1 - inside[t]! : inside[t]!);
		}
	}
}
