import type { Point } from '../boundary';
import { addPoint, type Samples } from './boundary-samples';
import { nextSide, type Triangulation } from './triangulation';

/** A triangle is too large when the point it would be given is further from its corners than this many wanted sizes. */
const tooFar = 0.8;

/** A new point, how far it lies from the nearest corners, and the side it lies on, −1 for none. */
interface Candidate extends Point {
	readonly radius: number;
	readonly side: number;
}

/** Adds points to triangles that are too large, no two of them side by side; false when none is. */
export function refined(samples: Samples, mesh: Triangulation, growth: number): boolean {
	const { twins, inside, corners } = mesh;
	const blocked = new Uint8Array(inside.length);
	let added = false;
	for (let t = 0; t < inside.length; t++) {
		if (!inside[t] || blocked[t]) continue;
		const point = candidate(mesh, t);
		if (point.side >= 0 && !isInner(mesh, point.side)) continue;
		let near = Infinity;
		for (let side = 3 * t; side < 3 * t + 3; side++)
			near = Math.min(near, samples.sizes[corners[side]!]! + growth * point.radius);
		if (point.radius <= tooFar * near) continue;
		if (point.side >= 0 && blocked[Math.floor(twins[point.side]! / 3)]) continue;
		addPoint(samples, { y: point.y, z: point.z }, near);
		added = true;
		block(mesh, blocked, t);
		if (point.side >= 0) block(mesh, blocked, Math.floor(twins[point.side]! / 3));
	}
	return added;
}

const isInner = ({ twins, inside }: Triangulation, side: number): boolean =>
	twins[side]! >= 0 && inside[Math.floor(twins[side]! / 3)] === 1;

function block({ twins }: Triangulation, blocked: Uint8Array, t: number): void {
	blocked[t] = 1;
	for (let side = 3 * t; side < 3 * t + 3; side++)
		if (twins[side]! >= 0) blocked[Math.floor(twins[side]! / 3)] = 1;
}

/** The circumcentre where it lies within the triangle, else the middle of the longest side. */
function candidate({ points, corners }: Triangulation, t: number): Candidate {
	for (let side = 3 * t; side < 3 * t + 3; side++) {
		const opposite = corners[nextSide(nextSide(side))]!;
		const [a, b, c] = [
			points[corners[side]!]!,
			points[corners[nextSide(side)]!]!,
			points[opposite]!
		];
		const dot = (a.y - c.y) * (b.y - c.y) + (a.z - c.z) * (b.z - c.z);
		if (dot > 0) continue;
		const radius = Math.hypot(a.y - b.y, a.z - b.z) / 2;
		return { y: (a.y + b.y) / 2, z: (a.z + b.z) / 2, radius, side };
	}
	const [a, b, c] = [0, 1, 2].map((k) => points[corners[3 * t + k]!]!) as [Point, Point, Point];
	return circumcentre(a, b, c);
}

function circumcentre(a: Point, b: Point, c: Point): Candidate {
	const [by, bz, cy, cz] = [b.y - a.y, b.z - a.z, c.y - a.y, c.z - a.z];
	const [bb, cc] = [by * by + bz * bz, cy * cy + cz * cz];
	const twice = 2 * (by * cz - bz * cy);
	const y = (cz * bb - bz * cc) / twice;
	const z = (by * cc - cy * bb) / twice;
	return { y: a.y + y, z: a.z + z, radius: Math.hypot(y, z), side: -1 };
}
