import type { ArcEdge, Edge, LineEdge, Loop } from './boundary';
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

/** The flanks of a loop in a frame; stretches along the axis bound no area change and drop out. */
export function flanksOf(loop: Loop, frame: Frame): Flank[] {
	return loop.flatMap((edge) => edgeFlanks(edge, frame));
}

function edgeFlanks(edge: Edge, frame: Frame): Flank[] {
	return edge.kind === 'line' ? lineFlank(edge, frame) : arcFlanks(edge, frame);
}

function lineFlank({ from, to }: LineEdge, frame: Frame): LineFlank[] {
	const [a, b] = [acrossOf(frame, from), acrossOf(frame, to)];
	if (a === b) return [];
	const [along, alongEnd] = [alongOf(frame, from), alongOf(frame, to)];
	const slope = (alongEnd - along) / (b - a);
	if (Math.abs(slope) > steepest) return [];
	return a < b
		? [{ kind: 'line', sign: 1, low: a, high: b, start: along, slope }]
		: [{ kind: 'line', sign: -1, low: b, high: a, start: alongEnd, slope }];
}

/** A line flatter than this against the axis is taken as lying along it. */
const steepest = 1e13;

function arcFlanks({ centre, radius, start, sweep }: ArcEdge, frame: Frame): ArcFlank[] {
	if (radius === 0 || sweep === 0) return [];
	const turned = start - Math.atan2(frame.sin, frame.cos);
	const [along, across] = [alongOf(frame, centre), acrossOf(frame, centre)];
	const turns = turningAngles(turned, turned + sweep);
	return turns.slice(1).flatMap((to, i): ArcFlank[] => {
		const from = turns[i]!;
		const [a, b] = [across + radius * sine(from), across + radius * sine(to)];
		if (a === b) return [];
		const side = Math.cos((from + to) / 2) > 0 ? 1 : -1;
		const common = { kind: 'arc', along, across, radius, side } as const;
		return a < b
			? [{ ...common, sign: 1, low: a, high: b }]
			: [{ ...common, sign: -1, low: b, high: a }];
	});
}

/** Start, end and every angle between where the arc turns back (±90°). */
function turningAngles(from: number, to: number): number[] {
	const [low, high] = from < to ? [from, to] : [to, from];
	const half = Math.PI / 2;
	const between: number[] = [];
	for (let k = Math.ceil((low - half) / Math.PI); half + k * Math.PI < high; k++) {
		const turn = half + k * Math.PI;
		if (turn - low > 1e-14 && high - turn > 1e-14) between.push(turn);
	}
	return from < to ? [low, ...between, high] : [high, ...between.reverse(), low];
}

/** Sine, exact at quarter turns, so that a root fillet ends where its flange begins. */
function sine(angle: number): number {
	const quarter = angle / (Math.PI / 2);
	const whole = Math.round(quarter);
	if (Math.abs(quarter - whole) > 1e-14) return Math.sin(angle);
	return [0, 1, 0, -1][((whole % 4) + 4) % 4]!;
}
