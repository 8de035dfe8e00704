import type { Contact, ContactPlace } from './contacts';
import type { Runs } from './runs';
import type { Strip } from './strips';

/** Where another plate holds a run, mm along the run: its own footprint with the welds beside it. */
export interface Hold {
	readonly from: number;
	readonly to: number;
	/** Plates that hold it here. */
	readonly by: readonly number[];
	/** A plate standing across the run, or one lapped on it and welded at its edge. */
	readonly kind: 'across' | 'lap';
}

/** A welded contact: the leg in mm and on which sides of it there is room for a fillet. */
export interface WeldedContact extends Contact {
	readonly leg: number;
	/** Toward lower and higher `u` of A and of B: whether a fillet there shortens the clear width. */
	readonly filletsOnA: readonly [boolean, boolean];
	readonly filletsOnB: readonly [boolean, boolean];
}

/** Holds of a plate standing across, by run. */
export function holdsAcross(
	strips: readonly Strip[],
	runs: Runs,
	contacts: readonly WeldedContact[]
): Hold[][] {
	const holds = runs.runs.map((): Hold[] => []);
	for (const contact of contacts) {
		if (!isAcross(strips, contact)) continue;
		const { a, b, onA, onB, filletsOnA, filletsOnB, leg } = contact;
		holds[runs.runOf[a]!]!.push(placeHeld(onA, filletsOnA, leg, runs.shift[a]!, b));
		holds[runs.runOf[b]!]!.push(placeHeld(onB, filletsOnB, leg, runs.shift[b]!, a));
	}
	return holds;
}

/** Below this sine plates run along each other and do not hold each other across. */
const alongEachOther = 0.1;

export function isAcross(strips: readonly Strip[], { a, b }: Contact): boolean {
	const [p, q] = [strips[a]!.along, strips[b]!.along];
	return Math.abs(p.y * q.z - p.z * q.y) > alongEachOther;
}

function placeHeld(
	{ from, to }: ContactPlace,
	[low, high]: readonly [boolean, boolean],
	leg: number,
	shift: number,
	by: number
): Hold {
	return {
		from: shift + from - (low ? leg : 0),
		to: shift + to + (high ? leg : 0),
		by: [by],
		kind: 'across'
	};
}

/** A stretch of face along which two runs lie on each other, mm along the first. */
interface Lap {
	readonly on: number;
	readonly from: number;
	readonly to: number;
	readonly by: readonly number[];
	readonly leg: number;
}

/**
 * Gives every run that nothing stands across, but that lies on a held one, its weld lines as holds:
 * both ends of the stretch along which they lie on each other. Cover plates upon cover plates follow
 * in turn. A run held by plates across it gains nothing from a lap.
 */
export function holdsWithLaps(
	runs: Runs,
	across: readonly Hold[][],
	contacts: readonly WeldedContact[]
): Hold[][] {
	const laps = lapsOf(runs, contacts);
	const holds = across.map((list) => [...list]);
	for (;;) {
		const held = new Set(holds.flatMap((list, run) => (list.length > 0 ? [run] : [])));
		const next = holds.flatMap((list, run) =>
			list.length > 0
				? []
				: [{ run, lines: weldLines(laps[run]!.filter(({ on }) => held.has(on))) }]
		);
		const gained = next.filter(({ lines }) => lines.length > 0);
		if (gained.length === 0) return holds;
		for (const { run, lines } of gained) holds[run]!.push(...lines);
	}
}

/** Face on face along a line. */
export const isLap = ({ onA, onB, length }: Contact): boolean =>
	length > 0 && onA.edge === 'face' && onB.edge === 'face';

function lapsOf({ runs, runOf, shift }: Runs, contacts: readonly WeldedContact[]): Lap[][] {
	const laps = runs.map((): Lap[] => []);
	for (const contact of contacts) {
		if (!isLap(contact)) continue;
		const { a, b, onA, onB, leg } = contact;
		const lap = (own: number, other: number, { from, to }: ContactPlace): void => {
			const along = shift[own]!;
			laps[runOf[own]!]!.push({
				on: runOf[other]!,
				from: from + along,
				to: to + along,
				by: [other],
				leg
			});
		};
		lap(a, b, onA);
		lap(b, a, onB);
	}
	return laps.map(joinedLaps);
}

/** Laps on one run that follow each other without a gap are one: where its plates meet there is no weld line. */
function joinedLaps(laps: readonly Lap[]): Lap[] {
	const joined: Lap[] = [];
	for (const lap of [...laps].sort((p, q) => p.on - q.on || p.from - q.from)) {
		const last = joined.at(-1);
		const slack = 1e-6 * (lap.to - lap.from);
		if (last?.on === lap.on && lap.from <= last.to + slack)
			joined[joined.length - 1] = {
				...last,
				to: Math.max(last.to, lap.to),
				by: [...last.by, ...lap.by],
				leg: Math.min(last.leg, lap.leg)
			};
		else joined.push(lap);
	}
	return joined;
}

/** The fillet stands outside the lap, so it shortens only what lies beyond. */
const weldLines = (laps: readonly Lap[]): Hold[] =>
	laps.flatMap(({ from, to, by, leg }): Hold[] => [
		{ from: from - leg, to: from, by: [by[0]!], kind: 'lap' },
		{ from: to, to: to + leg, by: [by.at(-1)!], kind: 'lap' }
	]);

/** Holds in order along a run, those that overlap as one. */
export function mergedHolds(holds: readonly Hold[]): Hold[] {
	const merged: Hold[] = [];
	for (const hold of [...holds].sort((p, q) => p.from - q.from || p.to - q.to)) {
		const last = merged.at(-1);
		if (last && hold.from <= last.to)
			merged[merged.length - 1] = {
				from: last.from,
				to: Math.max(last.to, hold.to),
				by: [...new Set([...last.by, ...hold.by])],
				kind: last.kind === 'across' ? 'across' : hold.kind
			};
		else merged.push(hold);
	}
	return merged;
}
