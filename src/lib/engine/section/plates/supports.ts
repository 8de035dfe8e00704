import { holdsAcross, holdsWithLaps, mergedHolds, type Hold, type WeldedContact } from './holds';
import { neighboursOf, weighedHolds, type WeighedHold } from './rigidity';
import type { Runs } from './runs';
import type { Strip } from './strips';

/** What holds a run, in order along it. */
export interface Supports {
	readonly holds: readonly Hold[];
	/** Plates that are longitudinal stiffeners of it. */
	readonly stiffeners: readonly number[];
	/** Plates that stand on it and are too weak to hold it. */
	readonly weak: readonly number[];
}

/** Supports of every run: plates across it that are stiff enough, or else the weld lines of a lap. */
export function supportsOf(
	strips: readonly Strip[],
	runs: Runs,
	welded: readonly WeldedContact[]
): Supports[] {
	const neighbours = neighboursOf(runs, welded);
	const across = holdsAcross(strips, runs, welded).map((holds, run) =>
		stiffOnes(holds, (left) => weighedHolds(strips, runs, neighbours, run, left))
	);
	const holds = holdsWithLaps(
		runs,
		across.map(({ stiff }) => stiff),
		welded
	);
	return across.map(({ stiff, weak }, run) => ({
		holds: mergedHolds(holds[run]!),
		stiffeners: stiff.flatMap(({ stiffener, by }) => (stiffener ? by : [])),
		weak
	}));
}

/** Leaves out what is too weak; each time the panels beside it grow, so the rest is weighed again. */
function stiffOnes(given: readonly Hold[], weigh: (left: readonly Hold[]) => WeighedHold[]) {
	const weak: number[] = [];
	let holds = weigh(given);
	while (holds.some(({ stiff }) => !stiff)) {
		weak.push(...holds.flatMap(({ stiff, by }) => (stiff ? [] : by)));
		holds = weigh(holds.filter(({ stiff }) => stiff));
	}
	return { stiff: holds, weak };
}
