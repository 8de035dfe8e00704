import { edgeStart } from '../../geometry/bounds';
import type { Loop, Point } from '../../geometry/boundary';
import { ringArea } from '../../geometry/rings';
import type { Contact, ContactPlace } from './contacts';
import { pointOfStrip, type Strip } from './strips';

/** A place in a corner is looked at this share of the thinner plate's thickness away from it. */
const besideCorner = 1e-2;

/**
 * On which sides of a contact a fillet shortens the clear width. On the face of a plate: where the
 * other plate ends within the face and the corner is open (fillets within a closed cell are not
 * counted: nobody can lay the last of them). At its end: only when both corners are open.
 */
export function filletsOf(
	strips: readonly Strip[],
	contact: Contact,
	cells: readonly (readonly Point[])[]
) {
	const { a, b, onA, onB } = contact;
	const [p, q] = [strips[a]!, strips[b]!];
	const step = besideCorner * Math.min(p.halfThickness, q.halfThickness);
	const open = (strip: Strip, place: ContactPlace) => openSides(strip, place, step, cells);
	return {
		filletsOnA: fillets(onA, open(p, onA), open(q, onB)),
		filletsOnB: fillets(onB, open(q, onB), open(p, onA))
	};
}

type Sides = readonly [boolean, boolean];

function fillets(own: ContactPlace, open: Sides, otherOpen: Sides): Sides {
	if (own.edge === 'face') return open;
	// seen from the end of a plate, both corners lie on the other plate's face
	const both = otherOpen[0] && otherOpen[1];
	return [own.side > 0 && both, own.side < 0 && both];
}

/** Whether there is a free corner on the face at the lower and the higher end of the contact. */
function openSides(
	strip: Strip,
	place: ContactPlace,
	step: number,
	cells: readonly (readonly Point[])[]
): Sides {
	if (place.edge !== 'face') return [false, false];
	const beside = (u: number): boolean =>
		Math.abs(u) < strip.half &&
		!cells.some((cell) =>
			isInside(cell, pointOfStrip(strip, u, place.side * (strip.halfThickness + step)))
		);
	return [beside(place.from - step), beside(place.to + step)];
}

/** Holes of merged outlines: the closed cells. */
export const closedCells = (contours: readonly Loop[]): Point[][] =>
	contours.map((loop) => loop.map(edgeStart)).filter((points) => ringArea(points) < 0);

function isInside(ring: readonly Point[], { y, z }: Point): boolean {
	let inside = false;
	ring.forEach((p, i) => {
		const q = ring[(i + 1) % ring.length]!;
		if (p.z > z !== q.z > z && y < p.y + ((z - p.z) / (q.z - p.z)) * (q.y - p.y)) inside = !inside;
	});
	return inside;
}
