import { connectedPieces } from '../../geometry/pieces';
import type { Contact } from './contacts';
import { inStrip, type Strip } from './strips';

/** One plate in a run; `from` and `to` along the run, mm. */
export interface RunPiece {
	readonly plate: number;
	readonly from: number;
	readonly to: number;
}

/** Plates that follow each other end to end in one line: one wall. */
export interface Run {
	/** In order along the run. */
	readonly pieces: readonly RunPiece[];
	readonly from: number;
	readonly to: number;
}

/** Runs, which run each plate is in, and how far a plate's own middle lies along it, mm. */
export interface Runs {
	readonly runs: readonly Run[];
	readonly runOf: readonly number[];
	readonly shift: readonly number[];
}

/** End to end is one wall when at least this share of the thinner end lies on the other. */
const sharedEnd = 0.5;

export function runsOf(strips: readonly Strip[], contacts: readonly Contact[]): Runs {
	const links = contacts.filter((contact) => isEndToEnd(strips, contact));
	const groups = connectedPieces(
		strips.length,
		links.map(({ a, b }) => [a, b] as const)
	);
	const runOf: number[] = [];
	const shift: number[] = [];
	const runs = groups.map((group, run): Run => {
		const origin = strips[group[0]!]!;
		for (const plate of group) {
			runOf[plate] = run;
			shift[plate] = inStrip(origin, strips[plate]!.centre).u;
		}
		return wallOf(strips, group, shift);
	});
	return { runs, runOf, shift };
}

/** The plates of one wall in order; where one ends the next begins, whatever rounding says. */
function wallOf(strips: readonly Strip[], group: readonly number[], shift: readonly number[]): Run {
	const order = [...group].sort((p, q) => shift[p]! - shift[q]!);
	const end = (plate: number) => shift[plate]! + strips[plate]!.half;
	const start = (plate: number) => shift[plate]! - strips[plate]!.half;
	const pieces = order.map((plate, i) => ({
		plate,
		from: i === 0 ? start(plate) : end(order[i - 1]!),
		to: end(plate)
	}));
	return { pieces, from: pieces[0]!.from, to: pieces.at(-1)!.to };
}

/** Whether two plates butt end to end, in one line and with enough of their ends on each other. */
export function isEndToEnd(strips: readonly Strip[], { a, b, onA, onB, length }: Contact): boolean {
	if (length === 0 || onA.edge !== 'end' || onB.edge !== 'end' || onA.side === onB.side)
		return false;
	const [p, q] = [strips[a]!, strips[b]!];
	return length >= sharedEnd * 2 * Math.min(p.halfThickness, q.halfThickness);
}

/** Plates of a run that lie between two places, in order, and the thinnest of them. */
export function thinnestBetween(strips: readonly Strip[], run: Run, from: number, to: number) {
	const pieces = run.pieces
		.filter((piece) => piece.to > from && piece.from < to)
		.map(({ plate }) => plate);
	const thinnest = pieces.reduce((thin, plate) =>
		strips[plate]!.halfThickness < strips[thin]!.halfThickness ? plate : thin
	);
	return { pieces, thinnest };
}
