import type { ArcEdge, LineEdge, Loop } from './boundary';
import { acrossOf, alongOf, type Frame } from './frame';

/**
 * A stretch of boundary along which `across` only rises or only falls. Steel lies to its left,
 * so a rising flank (sign +1) closes a slice on the far side and a falling one opens it.
 */
export type Flank = LineFlank | ArcFlank;

export interface LineFlank {
	readonly kind: 'line';
	readonly sign: 1 | -1;
	readonly low: number;
	readonly high: number;
	/** `along` at `low`, and its change per unit of `across`. */
	readonly start: number;
	readonly slope: number;
}

export interface ArcFlank {
	readonly kind: 'arc';
	readonly sign: 1 | -1;
	readonly low: number;
	readonly high: number;
	readonly along: number;
	readonly across: number;
	readonly radius: number;
	/** +1 on the far half of the circle, −1 on the near half. */
	readonly side: 1 | -1;
}

/** The flanks of loops in a frame; stretches along the axis bound no area change and drop out. */
export function flanksOf(loops: readonly Loop[], frame: Frame): Flank[] {
	const out: Flank[] = [];
	const turn = Math.atan2(frame.sin, frame.cos);
	for (const loop of loops) {
		for (const edge of loop) {
			if (edge.kind === 'line') addLineFlank(out, edge, frame);
			else addArcFlanks(out, edge, frame, turn);
		}
	}
	return out;
}

function addLineFlank(out: Flank[], { from, to }: LineEdge, frame: Frame): void {
	const a = acrossOf(frame, from);
	const b = acrossOf(frame, to);
	if (a === b) return;
	const start = alongOf(frame, from);
	const end = alongOf(frame, to);
	const slope = (end - start) / (b - a);
	if (Math.abs(slope) > steepest) return;
	if (a < b) out.push({ kind: 'line', sign: 1, low: a, high: b, start, slope });
	else out.push({ kind: 'line', sign: -1, low: b, high: a, start: end, slope });
}

/** A line flatter than this against the axis is taken as lying along it. */
const steepest = 1e13;

function addArcFlanks(out: Flank[], arc: ArcEdge, frame: Frame, turn: number): void {
	const { radius, sweep } = arc;
	if (radius === 0 || sweep === 0) return;
	const along = alongOf(frame, arc.centre);
	const across = acrossOf(frame, arc.centre);
	const last = arc.start - turn + sweep;
	let from = arc.start - turn;
	while (from !== last) {
		const to = nextTurn(from, last);
		const a = across + radius * sine(from);
		const b = across + radius * sine(to);
		const side = Math.cos((from + to) / 2) > 0 ? 1 : -1;
		if (a < b) out.push({ kind: 'arc', along, across, radius, side, sign: 1, low: a, high: b });
		else if (a > b)
			out.push({ kind: 'arc', along, across, radius, side, sign: -1, low: b, high: a });
		from = to;
	}
}

/** Where an arc next turns back (at ±90°) on its way from one angle to another, or its end. */
function nextTurn(from: number, to: number): number {
	const half = Math.PI / 2;
	const least = 1e-14;
	if (to > from) {
		const turn = half + Math.ceil((from + least - half) / Math.PI) * Math.PI;
		return turn - from > least && to - turn > least ? turn : afterTurn(turn, from, to);
	}
	const turn = half + Math.floor((from - least - half) / Math.PI) * Math.PI;
	return from - turn > least && turn - to > least ? turn : afterTurn(turn, from, to);
}

/** A turn at the very start of the arc is passed over. */
function afterTurn(turn: number, from: number, to: number): number {
	if (Math.abs(turn - from) > 1e-14) return to;
	const next = turn + Math.sign(to - from) * Math.PI;
	return (to - next) * Math.sign(to - from) > 1e-14 ? next : to;
}

/** Sine, exact at quarter turns, so that a root fillet ends where its flange begins. */
function sine(angle: number): number {
	const quarter = angle / (Math.PI / 2);
	const whole = Math.round(quarter);
	if (Math.abs(quarter - whole) > 1e-14) return Math.sin(angle);
	return quarterSines[((whole % 4) + 4) % 4]!;
}

const quarterSines = [0, 1, 0, -1] as const;
