import type { Bending } from '$lib/engine/response/respond';
import { curvePoints, type CurvePoint } from '../curve';
import type { Leg } from '../turns';

/** Where steel begins to yield on a leg. */
export interface YieldMark extends CurvePoint {
	/** Against the sense in which the section was bent first. */
	readonly reverse: boolean;
}

/** Share of the area that must yield before yielding counts as begun. */
const begun = 1e-6;
const samples = 24;

/** Evenly spaced ratios from one to another, both included. */
export const evenRatios = (from: number, to: number, pieces: number): number[] =>
	Array.from({ length: pieces + 1 }, (_, at) => from + ((to - from) * at) / pieces);

/** The curve that a leg ran along; its ends are those that were reached. */
export function legPoints({ bending, from, to, moment }: Leg, unit: number): CurvePoint[] {
	const points = curvePoints(bending, unit, evenRatios(from, to, samples));
	return [...points.slice(0, -1), { ratio: to, moment }];
}

/** The points of a curve between two ratios, with its ends put in. */
export function stretchOf(
	points: readonly CurvePoint[],
	from: CurvePoint,
	to: CurvePoint
): CurvePoint[] {
	const [low, high] = [Math.min(from.ratio, to.ratio), Math.max(from.ratio, to.ratio)];
	const inner = points.filter(({ ratio }) => ratio > low && ratio < high);
	return [from, ...(from.ratio < to.ratio ? inner : inner.reverse()), to];
}

/**
 * Where steel begins to yield between two ratios, from steel that has just turned; null where it does
 * not, or where some yields all the way.
 */
export function yieldBegins(
	bending: Bending,
	unit: number,
	from: number,
	to: number
): CurvePoint | null {
	const at = (ratio: number) => bending.atCurvature(ratio * unit);
	const yields = (ratio: number) => (at(ratio).yieldedShare ?? 0) > begun;
	const ratios = evenRatios(from, to, samples).slice(1);
	const first = ratios.findIndex(yields);
	if (first < 1) return null;
	let [low, high] = [ratios[first - 1]!, ratios[first]!];
	for (let round = 0; round < 18; round += 1) {
		const middle = (low + high) / 2;
		if (yields(middle)) high = middle;
		else low = middle;
	}
	const { moment } = at(high);
	return moment === null ? null : { ratio: high, moment };
}
