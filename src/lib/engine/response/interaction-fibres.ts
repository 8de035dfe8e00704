import type { ArcEdge, Point } from '../geometry/boundary';
import { edgeEnd, edgeStart } from '../geometry/bounds';
import type { LawGroup, Mechanics } from './law-groups';

/** Strain e0 − ky·z + kz·y from the centroid; curvatures in 1/mm. */
export interface Plane {
	readonly e0: number;
	readonly ky: number;
	readonly kz: number;
}

export const strainAt = ({ e0, ky, kz }: Plane, { y, z }: Point): number => e0 - ky * z + kz * y;

/** The fibres of one body that can be the first to yield, from the centroid, and what they bear. */
export interface BodyFibres {
	readonly corners: readonly Point[];
	/** Arcs that bulge outwards; only these can bear an extreme between their ends. */
	readonly arcs: readonly ArcEdge[];
	/** Strains at first yield, both positive. */
	readonly tension: number;
	readonly compression: number;
}

export const fibresOf = ({ groups, centroid }: Mechanics): BodyFibres[] =>
	groups.map((group) => bodyFibres(group, centroid));

function bodyFibres({ loops, law }: LawGroup, centroid: Point): BodyFibres {
	const local = ({ y, z }: Point): Point => ({ y: y - centroid.y, z: z - centroid.z });
	const corners: Point[] = [];
	const arcs: ArcEdge[] = [];
	for (const edge of loops.flat()) {
		corners.push(local(edgeStart(edge)));
		if (edge.kind === 'line' || edge.sweep < 0) continue;
		corners.push(local(edgeEnd(edge)));
		arcs.push({ ...edge, centre: local(edge.centre) });
	}
	return { corners, arcs, tension: law.yieldTension, compression: law.yieldCompression };
}

/** How far a plane uses the section: 1 at first yield; and how fast the use grows with a second plane. */
export interface FibreUse {
	readonly use: number;
	readonly rate: number;
}

/** Greatest use over all fibres of `plane`, with its rate along `along` at the fibre that decides. */
export function fibreUse(bodies: readonly BodyFibres[], plane: Plane, along: Plane): FibreUse {
	let [use, rate] = [-Infinity, 0];
	const size = Math.hypot(plane.ky, plane.kz);
	const visit = (point: Point, { tension, compression }: BodyFibres) => {
		const strain = strainAt(plane, point);
		const bears = strain > 0 ? tension : -compression;
		if (strain / bears <= use) return;
		use = strain / bears;
		rate = strainAt(along, point) / bears;
	};
	for (const body of bodies) {
		for (const corner of body.corners) visit(corner, body);
		if (size === 0) continue;
		for (const { centre, radius, start, sweep } of body.arcs) {
			for (const sign of [1, -1]) {
				const [y, z] = [(sign * plane.kz) / size, (-sign * plane.ky) / size];
				if (!isOnArc(Math.atan2(z, y), start, sweep)) continue;
				visit({ y: centre.y + radius * y, z: centre.z + radius * z }, body);
			}
		}
	}
	return { use, rate };
}

function isOnArc(angle: number, start: number, sweep: number): boolean {
	const turn = 2 * Math.PI;
	const from = (((angle - start) % turn) + turn) % turn;
	return from <= sweep;
}
