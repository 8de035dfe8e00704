/** A point of a curve in its own plane, newton and N·mm. */
export interface PlanePoint {
	readonly a: number;
	readonly b: number;
}

/** A convex closed curve that can be entered between any two of its points. */
export interface ConvexCurve {
	/** At least three points of the curve, anticlockwise. */
	readonly start: readonly PlanePoint[];
	/** A point of the curve between two neighbours (anticlockwise). */
	between(from: PlanePoint, to: PlanePoint): PlanePoint;
}

/**
 * `count` points of a curve, anticlockwise and well spread: the longest chord is always the next to be
 * split. A generator, so that it can pause: it yields before every point.
 */
export function* spreadingPoints(
	{ start, between }: ConvexCurve,
	count: number
): Generator<void, PlanePoint[]> {
	const points = thinned(start, count);
	const distance = distanceIn(start);
	const next = (i: number) => points[(i + 1) % points.length]!;
	const chords = points.map((point, i) => distance(point, next(i)));
	while (points.length < count) {
		yield;
		const at = longest(chords);
		const [from, to] = [points[at]!, next(at)];
		const middle = between(from, to);
		points.splice(at + 1, 0, middle);
		chords.splice(at, 1, distance(from, middle), distance(middle, to));
	}
	return points;
}

/** Evenly taken where there are more than asked for. */
function thinned(points: readonly PlanePoint[], count: number): PlanePoint[] {
	if (points.length <= count) return [...points];
	return Array.from({ length: count }, (_, i) => points[Math.floor((i * points.length) / count)]!);
}

/** Distance in shares of the curve's own width and height. */
function distanceIn(points: readonly PlanePoint[]) {
	const range = (of: (point: PlanePoint) => number) => {
		const values = points.map(of);
		return Math.max(...values) - Math.min(...values);
	};
	const [width, height] = [range(({ a }) => a), range(({ b }) => b)];
	return (p: PlanePoint, q: PlanePoint) => Math.hypot((p.a - q.a) / width, (p.b - q.b) / height);
}

function longest(lengths: readonly number[]): number {
	let at = 0;
	for (let i = 1; i < lengths.length; i++) if (lengths[i]! > lengths[at]!) at = i;
	return at;
}
