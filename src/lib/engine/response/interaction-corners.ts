import type { PlanePoint } from './interaction-spread';

const parallel = 1e-12;

/**
 * Corners of the convex polygon of all points with side·point ≤ 1 for every side, which holds the
 * origin. They answer to the edges of the convex hull of the sides (polar duality).
 */
export function convexCorners(sides: readonly PlanePoint[]): PlanePoint[] {
	const hull = convexHull(sides);
	return hull.flatMap((p, i) => {
		const q = hull[(i + 1) % hull.length]!;
		const cross = p.a * q.b - p.b * q.a;
		if (Math.abs(cross) <= parallel * Math.hypot(p.a, p.b) * Math.hypot(q.a, q.b)) return [];
		return [{ a: (q.b - p.b) / cross, b: (p.a - q.a) / cross }];
	});
}

/** Anticlockwise hull without points on its edges (monotone chain). */
function convexHull(points: readonly PlanePoint[]): PlanePoint[] {
	const sorted = [...points].sort((p, q) => p.a - q.a || p.b - q.b);
	return [...chain(sorted), ...chain(sorted.reverse())];
}

function chain(points: readonly PlanePoint[]): PlanePoint[] {
	const out: PlanePoint[] = [];
	for (const point of points) {
		while (out.length >= 2 && !turnsLeft(out[out.length - 2]!, out[out.length - 1]!, point))
			out.pop();
		out.push(point);
	}
	return out.slice(0, -1);
}

function turnsLeft(p: PlanePoint, q: PlanePoint, r: PlanePoint): boolean {
	const [ua, ub, va, vb] = [q.a - p.a, q.b - p.b, r.a - q.a, r.b - q.b];
	return ua * vb - ub * va > parallel * Math.hypot(ua, ub) * Math.hypot(va, vb);
}
