import type { Point } from '../../geometry/boundary';
import type { PlatesSection } from '../definition';
import { contactOf, type Contact, type ContactPlace } from '../plates/contacts';
import type { PlacedPlates } from '../plates/placing';
import { inStrip, pointOfStrip, stripOf, type Strip } from '../plates/strips';

/** A straight wall between two nodes, thickness in mm. */
export interface Wall {
	readonly from: number;
	readonly to: number;
	readonly thickness: number;
}

/** Mid-lines of thin plates, met where they are extended into each other. */
export interface MidLines {
	readonly nodes: readonly Point[];
	readonly walls: readonly Wall[];
	/** Thickness at each end that meets nothing, mm. */
	readonly freeEnds: readonly number[];
	/** Whether the walls are thin enough, and their corners plain enough, for warping and shear centre within 1 %. */
	readonly warps: boolean;
}

/** Plates stockier than this are no thin walls. */
const leastSlenderness = 5;
/** At this slenderness the warping of mid-lines is about 1 % off that of the solid walls (it grows with t²/b²). */
const leastWarpingSlenderness = 12;
/** A mid-line is extended no further than this many thicknesses of the thicker plate. */
const mostExtension = 1.5;
/** Nodes nearer than this share of the thinnest plate are one. */
const sameNode = 5e-3;

/**
 * Mid-lines of plates; null where thin-walled theory does not hold: a stocky plate, plates lying
 * face to face, or a contact whose mid-lines do not meet near by. Plates touch where the definition's
 * joins say, or wherever they touch when it names none.
 */
export function midLines(definition: PlatesSection, placed: PlacedPlates): MidLines | null {
	const strips = definition.plates.map(stripOf);
	if (strips.some(({ half, halfThickness }) => half < leastSlenderness * halfThickness))
		return null;
	const stops = strips.map(({ half }): Stop[] => [
		{ u: -half, free: true, step: 0, over: 0 },
		{ u: half, free: true, step: 0, over: 0 }
	]);
	for (const { a, b } of joinedPairs(definition, placed)) {
		const contact = contactOf(strips, a, b, placed.tolerance);
		const meeting = meetingOf(strips, contact);
		if (meeting === null) return null;
		const { step } = meeting;
		addStop(
			stops[a]!,
			{ u: meeting.uA, free: false, step, over: coverOf(contact.onA) },
			contact.onA
		);
		addStop(
			stops[b]!,
			{ u: meeting.uB, free: false, step, over: coverOf(contact.onB) },
			contact.onB
		);
	}
	const thin = strips.every(
		({ half, halfThickness }) => half >= leastWarpingSlenderness * halfThickness
	);
	const blunt = strips.some((strip, i) =>
		stubsOf(strip, stops[i]!).some((stub) => stub === 'blunt')
	);
	return { ...wallsOf(strips, stops), warps: thin && !blunt };
}

/** Length along a plate that another covers of its face, mm. */
const coverOf = ({ edge, from, to }: ContactPlace): number => (edge === 'face' ? to - from : 0);

/**
 * What stands out beyond the meeting at each end: nothing where the other plate comes flush with the
 * end (its own mid-line has that steel already), a `blunt` stub where it stands out by less than the
 * other is thick, which is neither corner nor wall.
 */
function stubsOf({ half }: Strip, stops: readonly Stop[]): ('flush' | 'blunt' | 'none')[] {
	return [-1, 1].map((side) => {
		if (!stops.some(({ free, u }) => free && Math.sign(u) === side)) return 'none';
		const outs = stops.filter(({ over }) => over > 0);
		const stub = outs.map(({ u, over }) => (half - side * u) / over);
		if (stub.some((length) => length <= flush)) return 'flush';
		return stub.some((length) => length < bluntEnd) ? 'blunt' : 'none';
	});
}

/** Half the thickness of the plate that meets here, and a little for rounding. */
const flush = 0.5 * (1 + 1e-3);
/** A stub is a wall of its own from here on, in thicknesses of the plate that meets here beyond its mid-line. */
const bluntEnd = 1.5;

/** Pairs that touch and are joined. */
export function joinedPairs({ plates, joins }: PlatesSection, { touching }: PlacedPlates) {
	if (!joins) return touching;
	const key = (a: string, b: string) => JSON.stringify([a, b].sort());
	const joined = new Set(joins.map(({ a, b }) => key(a, b)));
	return touching.filter(({ a, b }) => joined.has(key(plates[a]!.name, plates[b]!.name)));
}

interface Stop {
	readonly u: number;
	/** An end that meets nothing. */
	readonly free: boolean;
	/** How far the other mid-line lies beside this one there, mm. */
	readonly step: number;
	/** Length along this mid-line that the other plate covers of the face, mm. */
	readonly over: number;
}

/** Replaces a free end by the place where it meets another mid-line, or adds a place between the ends. */
function addStop(stops: Stop[], stop: Stop, { edge, side }: ContactPlace): void {
	stops.push(stop);
	if (edge === 'face') return;
	const end = stops.findIndex(({ free, u }) => free && Math.sign(u) === side);
	if (end >= 0) stops.splice(end, 1);
}

/** Where two touching mid-lines meet, as places along both; null when they do not. */
function meetingOf(strips: readonly Strip[], contact: Contact) {
	const { a, b, onA, onB } = contact;
	if (onA.edge === 'face' && onB.edge === 'face') return null;
	const [p, q] = [strips[a]!, strips[b]!];
	const cross = p.along.y * q.along.z - p.along.z * q.along.y;
	const { u, v } = inStrip(p, q.centre);
	const meeting =
		Math.abs(cross) < parallel
			? buttOf(p, q, onA, onB)
			: {
					uA: u - (v * (p.along.y * q.along.y + p.along.z * q.along.z)) / cross,
					uB: -v / cross,
					step: 0
				};
	if (meeting === null) return null;
	const reach = 2 * mostExtension * Math.max(p.halfThickness, q.halfThickness);
	const near = (place: ContactPlace, strip: Strip, at: number) =>
		place.edge === 'face'
			? Math.abs(at) <= strip.half * (1 + sameNode)
			: Math.abs(at - place.side * strip.half) <= reach;
	return near(onA, p, meeting.uA) && near(onB, q, meeting.uB) ? meeting : null;
}

/** Mid-lines closer in direction than this, radians, are parallel. */
const parallel = 1e-6;

/** End to end in line: both mid-lines stop half-way, when they lie no further apart than half the thinner plate. */
function buttOf(p: Strip, q: Strip, onA: ContactPlace, onB: ContactPlace) {
	if (onA.edge === 'face' || onB.edge === 'face') return null;
	const { v } = inStrip(p, q.centre);
	if (Math.abs(v) > Math.min(p.halfThickness, q.halfThickness)) return null;
	return { uA: onA.side * p.half, uB: onB.side * q.half, step: Math.abs(v) };
}

function wallsOf(strips: readonly Strip[], stops: readonly (readonly Stop[])[]) {
	const nodes: Point[] = [];
	const walls: Wall[] = [];
	const near = sameNode * Math.min(...strips.map(({ halfThickness }) => halfThickness));
	strips.forEach((strip, i) => {
		const [left, right] = stubsOf(strip, stops[i]!);
		const along = stops[i]!.filter(
			({ free, u }) => !free || (u < 0 ? left : right) !== 'flush'
		).sort((p, q) => p.u - q.u);
		const ids = along.map(({ u, step }) => nodeAt(nodes, pointOfStrip(strip, u), near + step));
		for (let k = 1; k < ids.length; k++)
			if (ids[k] !== ids[k - 1])
				walls.push({ from: ids[k - 1]!, to: ids[k]!, thickness: 2 * strip.halfThickness });
	});
	const freeEnds = strips.flatMap(({ halfThickness }, i) =>
		stops[i]!.filter(({ free }) => free).map(() => 2 * halfThickness)
	);
	return { nodes, walls, freeEnds };
}

function nodeAt(nodes: Point[], point: Point, reach: number): number {
	const found = nodes.findIndex(
		({ y, z }) => Math.abs(y - point.y) <= reach && Math.hypot(y - point.y, z - point.z) <= reach
	);
	return found >= 0 ? found : nodes.push(point) - 1;
}
