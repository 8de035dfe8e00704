import type { ArcEdge, Edge, Point } from '../../../geometry/boundary';
import type { Part } from '../../../section/prepared';
import { inStrip, stripCorners, type Strip } from './strip';

/**
 * Greatest value of y·dy + z·dz over the steel that remains of some parts, exactly: the corners and arcs
 * of the parts outside the strips, and the edges that the strips leave.
 */
export function farthestFibre(
	parts: readonly Part[],
	strips: readonly Strip[],
	dy: number,
	dz: number
): number {
	let most = -Infinity;
	const offer = (point: Point, own?: Strip) => {
		const value = point.y * dy + point.z * dz;
		if (value > most && !strips.some((strip) => strip !== own && inStrip(strip, point)))
			most = value;
	};
	for (const { region } of parts)
		for (const loop of region.loops) for (const edge of loop) offerEdge(edge, dy, dz, offer);
	for (const strip of strips) for (const corner of keptCorners(strip)) offer(corner, strip);
	return most;
}

function offerEdge(edge: Edge, dy: number, dz: number, offer: (point: Point) => void): void {
	if (edge.kind === 'line') {
		offer(edge.from);
		return;
	}
	offer(arcPoint(edge, 0));
	const turn = sweptTo(edge, Math.atan2(dz, dy));
	if (turn < Math.abs(edge.sweep)) offer(arcPoint(edge, Math.sign(edge.sweep) * turn));
}

const arcPoint = ({ centre, radius, start }: ArcEdge, turn: number): Point => ({
	y: centre.y + radius * Math.cos(start + turn),
	z: centre.z + radius * Math.sin(start + turn)
});

/** How far along an arc's own sense a direction lies from its start, in [0, 2π). */
function sweptTo({ start, sweep }: ArcEdge, direction: number): number {
	const turn = (Math.sign(sweep) * (direction - start)) % (2 * Math.PI);
	return turn < 0 ? turn + 2 * Math.PI : turn;
}

/** Edges of a strip beyond which steel remains: not the free tip of an outstand. */
function keptCorners(strip: Strip): Point[] {
	const corners = stripCorners(strip);
	const { type, c } = strip.element;
	return type === 'outstand' && strip.end >= c * (1 - 1e-12) ? corners.slice(0, 2) : corners;
}
