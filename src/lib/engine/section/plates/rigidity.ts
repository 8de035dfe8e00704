import type { Contact } from './contacts';
import type { Hold } from './holds';
import { mergedHolds } from './holds';
import type { Run, Runs } from './runs';
import { inStrip, pointOfStrip, type Strip } from './strips';

/**
 * Least second moment of what holds a plate's edge, about the mid-plane of that plate, as a multiple
 * of t³·c; twice that between two panels. Practice for edge and intermediate stiffeners of
 * cold-formed steel, its relief for strength left out; from memory, no clause of EN 1993.
 */
export const leastRigidity = { edge: 1.83, between: 3.66 } as const;

/** Up to this c/t a plate needs no stiff support: an outstand of it is of class 1 in any steel up to 700 N/mm². */
export const stocky = 5;

/** Neighbours of every run: runs that are welded to it in whatever way. */
export function neighboursOf({ runs, runOf }: Runs, contacts: readonly Contact[]): Set<number>[] {
	const neighbours = runs.map(() => new Set<number>());
	for (const { a, b } of contacts) {
		const [p, q] = [runOf[a]!, runOf[b]!];
		if (p === q) continue;
		neighbours[p]!.add(q);
		neighbours[q]!.add(p);
	}
	return neighbours;
}

/**
 * Runs that hang together with a hold once the run itself is taken away; null when they come back to
 * the run at another hold and so close a cell.
 */
function openBranch(
	{ runs, runOf }: Runs,
	neighbours: readonly ReadonlySet<number>[],
	run: number,
	hold: Hold,
	holds: readonly Hold[]
): number[] | null {
	const seen = new Uint8Array(runs.length);
	const other = new Uint8Array(runs.length);
	for (const one of holds) if (one !== hold) for (const plate of one.by) other[runOf[plate]!] = 1;
	const reached: number[] = [];
	const reach = (next: number) => {
		if (next === run || seen[next]) return;
		seen[next] = 1;
		reached.push(next);
	};
	for (const plate of hold.by) reach(runOf[plate]!);
	// grows while it is walked
	for (const at of reached) {
		if (other[at]) return null;
		neighbours[at]!.forEach(reach);
	}
	return reached;
}

/** Whether the plates of some runs have at least a second moment (mm⁴) about the mid-line of a strip. */
function isStiff(
	strips: readonly Strip[],
	{ runs }: Runs,
	about: Strip,
	branch: readonly number[],
	least: number
): boolean {
	let sum = 0;
	for (const run of branch)
		for (const { plate } of runs[run]!.pieces) {
			sum += secondMomentAbout(about, strips[plate]!);
			if (sum >= least) return true;
		}
	return false;
}

function secondMomentAbout(about: Strip, { centre, along, half, halfThickness }: Strip): number {
	const sine = along.z * about.along.y - along.y * about.along.z;
	const own = (half * half * sine * sine + halfThickness * halfThickness * (1 - sine * sine)) / 3;
	return 4 * half * halfThickness * (own + inStrip(about, centre).v ** 2);
}

/** A hold of a run and whether what stands there is stiff enough to hold it. */
export interface WeighedHold extends Hold {
	readonly stiff: boolean;
	/** It splits a panel that would be internal without it, and comes back nowhere: a longitudinal stiffener. */
	readonly stiffener: boolean;
}

export function weighedHolds(
	strips: readonly Strip[],
	runs: Runs,
	neighbours: readonly ReadonlySet<number>[],
	run: number,
	given: readonly Hold[]
): WeighedHold[] {
	const holds = mergedHolds(given);
	const wall = runs.runs[run]!;
	const t = 2 * Math.min(...wall.pieces.map(({ plate }) => strips[plate]!.halfThickness));
	const about = strips[wall.pieces[0]!.plate]!;
	return holds.map((hold, i) => {
		const between = i > 0 && i < holds.length - 1;
		const clear = widestBeside(wall, holds, i);
		if (!between && clear <= stocky * t) return { ...hold, stiff: true, stiffener: false };
		if (holds.length === 1 && isWithin(wall, hold, about))
			return { ...hold, stiff: true, stiffener: false };
		if (!between && isFlange(strips, runs, wall, about, hold))
			return { ...hold, stiff: true, stiffener: false };
		const branch = openBranch(runs, neighbours, run, hold, holds);
		if (branch === null) return { ...hold, stiff: true, stiffener: false };
		const least = (between ? leastRigidity.between : leastRigidity.edge) * t ** 3 * clear;
		const stiff = clear <= stocky * t || isStiff(strips, runs, about, branch, least);
		return { ...hold, stiff, stiffener: between };
	});
}

/** Share of a wall's thickness that is rounding. */
const rounding = 1e-6;

/**
 * Whether the wall goes on beyond a hold on both sides. The only one of a wall then needs no stiffness: the
 * wall on both sides of it can but twist about it, which is how an outstand on a hinge buckles (kσ 0.43);
 * that the line itself stays straight is the member's own buckling.
 */
function isWithin({ from, to }: Run, hold: Hold, { halfThickness }: Strip): boolean {
	const slack = rounding * halfThickness;
	return hold.from > from + slack && hold.to < to - slack;
}

/**
 * Whether the wall ends on a plate that reaches beyond both its faces: a flange, which holds its web
 * whatever its stiffness, as in a section given as an I. A lip stands on one side alone.
 */
function isFlange(
	strips: readonly Strip[],
	{ runs, runOf }: Runs,
	wall: Run,
	about: Strip,
	hold: Hold
): boolean {
	if (isWithin(wall, hold, about)) return false;
	const reach = about.halfThickness * (1 + rounding);
	return hold.by.some((plate) => {
		const ends = runs[runOf[plate]!]!.pieces.flatMap(({ plate: one }) => {
			const strip = strips[one]!;
			return [-strip.half, strip.half].map((u) => inStrip(about, pointOfStrip(strip, u)).v);
		});
		return Math.min(...ends) < -reach && Math.max(...ends) > reach;
	});
}

/** The wider of the clear widths on both sides of a hold, mm. */
function widestBeside({ from, to }: Run, holds: readonly Hold[], i: number): number {
	const before = holds[i]!.from - (holds[i - 1]?.to ?? from);
	const after = (holds[i + 1]?.from ?? to) - holds[i]!.to;
	return Math.max(before, after);
}
