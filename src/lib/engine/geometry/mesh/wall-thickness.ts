import type { ArcEdge, Edge, Point } from '../boundary';
import { edgeDirection, edgePoint } from './placed-loops';

/** Hits nearer than this share of the section's size are the edge itself. */
const itself = 1e-9;

/** How far the material reaches inwards from a point of an edge, square to it (area on the left). */
export function wallThickness(edge: Edge, share: number, edges: readonly Edge[]): number {
	const at = edgePoint(edge, share);
	const along = edgeDirection(edge, share);
	const inward = { y: -along.z, z: along.y };
	let nearest = Infinity;
	for (const other of edges) {
		const hit =
			other.kind === 'line'
				? lineHit(at, inward, other.from, other.to)
				: arcHit(at, inward, other, nearest);
		if (hit > itself && hit < nearest) nearest = hit;
	}
	return nearest;
}

/** Distance along a ray to a segment; Infinity when it misses. */
function lineHit(at: Point, ray: Point, from: Point, to: Point): number {
	const [dy, dz] = [to.y - from.y, to.z - from.z];
	const cross = ray.y * dz - ray.z * dy;
	if (cross === 0) return Infinity;
	const [ey, ez] = [from.y - at.y, from.z - at.z];
	const share = (ey * ray.z - ez * ray.y) / cross;
	return share < -itself || share > 1 + itself ? Infinity : (ey * dz - ez * dy) / cross;
}

function arcHit(at: Point, ray: Point, arc: ArcEdge, best: number): number {
	const [ey, ez] = [at.y - arc.centre.y, at.z - arc.centre.z];
	const half = ey * ray.y + ez * ray.z;
	const root = half * half - (ey * ey + ez * ez - arc.radius * arc.radius);
	if (root < 0) return Infinity;
	let nearest = Infinity;
	for (const hit of [-half - Math.sqrt(root), -half + Math.sqrt(root)]) {
		if (hit <= itself || hit >= best || hit >= nearest) continue;
		if (isOnArc(arc, ey + hit * ray.y, ez + hit * ray.z)) nearest = hit;
	}
	return nearest;
}

function isOnArc({ start, sweep }: ArcEdge, y: number, z: number): boolean {
	const turned = (Math.atan2(z, y) - start) * Math.sign(sweep);
	const within = turned - 2 * Math.PI * Math.floor(turned / (2 * Math.PI));
	return within <= Math.abs(sweep) + itself || within >= 2 * Math.PI - itself;
}
