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

/** What stands on a run at a hold: whether it comes back to the run elsewhere (a closed cell), and the plates of it. */
export interface Branch {
	readonly closed: boolean;
	readonly plates: readonly number[];
}

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

/** Everything that hangs together with a hold once the run itself is taken away. */
export function branchOf(
	runs: Runs,
	neighbours: readonly ReadonlySet<number>[],
	across: readonly Hold[],
	run: number,
	hold: Hold
): Branch {
	const roots = new Set(hold.by.map((plate) => runs.runOf[plate]!));
	const others = new Set(
		across.filter((one) => one !== hold).flatMap(({ by }) => by.map((plate) => runs.runOf[plate]!))
	);
	const reached = new Set(roots);
	const waiting = [...roots];
	for (let at = waiting.pop(); at !== undefined; at = waiting.pop())
		for (const next of neighbours[at]!) {
			if (next === run || reached.has(next)) continue;
			reached.add(next);
			waiting.push(next);
		}
	return {
		closed: [...others].some((other) => reached.has(other)),
		plates: [...reached].flatMap((one) => runs.runs[one]!.pieces.map(({ plate }) => plate))
	};
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
		const branch = branchOf(runs, neighbours, holds, run, hold);
		const between = i > 0 && i < holds.length - 1;
		const clear = widestBeside(wall, holds, i);
		const t = leastThickness(strips, wall);
		const factor = between ? leastRigidity.between : leastRigidity.edge;
		const about = strips[wall.pieces[0]!.plate]!;
		const stiff =
			branch.closed ||
			clear <= stocky * t ||
			secondMomentAbout(strips, about, branch.plates) >= factor * t ** 3 * clear;
		return { ...hold, stiff, stiffener: between && !branch.closed };
	});
}

const leastThickness = (strips: readonly Strip[], { pieces }: Run): number =>
	Math.min(...pieces.map(({ plate }) => 2 * strips[plate]!.halfThickness));

/** The wider of the clear widths on both sides of a hold, mm. */
function widestBeside({ from, to }: Run, holds: readonly Hold[], i: number): number {
	const before = holds[i]!.from - (holds[i - 1]?.to ?? from);
	const after = (holds[i + 1]?.from ?? to) - holds[i]!.to;
	return Math.max(before, after);
}
