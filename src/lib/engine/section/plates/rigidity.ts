import type { Contact } from './contacts';
import type { Hold } from './holds';
import { mergedHolds } from './holds';
import type { Run, Runs } from './runs';
import { inStrip, type Strip } from './strips';

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
	runs: Runs,
	neighbours: readonly ReadonlySet<number>[],
	run: number,
	hold: Hold,
	holds: readonly Hold[]
): number[] | null {
	const seen = new Uint8Array(runs.runs.length);
	const other = new Uint8Array(runs.runs.length);
	for (const one of holds)
		if (one !== hold) for (const plate of one.by) other[runs.runOf[plate]!] = 1;
	const reached: number[] = [];
	const reach = (next: number) => {
		if (next === run || seen[next]) return;
		seen[next] = 1;
		reached.push(next);
	};
	for (const plate of hold.by) reach(runs.runOf[plate]!);
	for (let k = 0; k < reached.length; k++) {
		if (other[reached[k]!]) return null;
		neighbours[reached[k]!]!.forEach(reach);
	}
	return reached;
}

/** Second moment of plates about the mid-line of a strip, mm⁴. */
export function secondMomentAbout(
	strips: readonly Strip[],
	about: Strip,
	plates: readonly number[]
) {
	return plates.reduce((sum, plate) => {
		const strip = strips[plate]!;
		const [w, t] = [2 * strip.half, 2 * strip.halfThickness];
		const sine = strip.along.z * about.along.y - strip.along.y * about.along.z;
		const own = (w * w * sine * sine + t * t * (1 - sine * sine)) / 12;
		return sum + w * t * (own + inStrip(about, strip.centre).v ** 2);
	}, 0);
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
	return holds.map((hold, i) => {
		if (hold.kind === 'lap') return { ...hold, stiff: true, stiffener: false };
		const branch = openBranch(runs, neighbours, run, hold, holds);
		const between = i > 0 && i < holds.length - 1;
		const clear = widestBeside(wall, holds, i);
		const t = leastThickness(strips, wall);
		const factor = between ? leastRigidity.between : leastRigidity.edge;
		const about = strips[wall.pieces[0]!.plate]!;
		const stiff =
			branch === null ||
			clear <= stocky * t ||
			secondMomentAbout(strips, about, platesOf(runs, branch)) >= factor * t ** 3 * clear;
		return { ...hold, stiff, stiffener: between && branch !== null };
	});
}

const platesOf = ({ runs }: Runs, list: readonly number[]): number[] =>
	list.flatMap((run) => runs[run]!.pieces.map(({ plate }) => plate));

const leastThickness = (strips: readonly Strip[], { pieces }: Run): number =>
	Math.min(...pieces.map(({ plate }) => 2 * strips[plate]!.halfThickness));

/** The wider of the clear widths on both sides of a hold, mm. */
function widestBeside({ from, to }: Run, holds: readonly Hold[], i: number): number {
	const before = holds[i]!.from - (holds[i - 1]?.to ?? from);
	const after = (holds[i + 1]?.from ?? to) - holds[i]!.to;
	return Math.max(before, after);
}
