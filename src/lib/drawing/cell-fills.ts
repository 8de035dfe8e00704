import { chainedLoops } from '$lib/engine/geometry/chained';
import { spreadOver, type Cell } from '$lib/engine/response/history/cell';
import { stressField } from '$lib/engine/response/history/cut-cells';
import type { History } from '$lib/engine/response/history/history';
import { yieldSense } from '$lib/engine/response/history/history-report';
import type { LinearField } from '$lib/engine/response/history/linear-field';
import { loopsPath } from './loop-path';
import type { TintStop } from './tint-stops';

/** Steel with a stress that is linear over it: its outline and its tint, mm from the centroid, z up. */
export interface CellFill {
	readonly path: string;
	/** Where the tint begins and ends. */
	readonly from: { readonly x: number; readonly y: number };
	readonly to: { readonly x: number; readonly y: number };
	readonly stops: readonly TintStop[];
	/** Sense in which all of it stands at its yield strength, if so. */
	readonly yielded: 'tension' | 'compression' | null;
}

const pale = 0.07;
const deep = 0.5;

/**
 * Every cell of a history as it is filled on the drawing; the tint is deepest at the strength of its
 * steel, or at the stress `deepest`, N/mm², where that is given.
 */
export const cellFills = (
	{ section, cells, layers, strain }: History,
	deepest?: number
): CellFill[] =>
	cells.map((cell) => {
		const own = layers[cell.part]!;
		const { fy, fyc } =
			deepest === undefined ? section.parts[cell.part]!.material : { fy: deepest, fyc: deepest };
		return {
			path: loopsPath(chainedLoops(cell.edges)),
			...tintOf(cell, stressField(cell, own, strain), { fy, fyc }),
			yielded: yieldSense(cell, own[0]!, strain)
		};
	});

function tintOf(cell: Cell, stress: LinearField, { fy, fyc }: { fy: number; fyc: number }) {
	const { least, most } = spreadOver(cell, stress);
	const size = Math.hypot(stress.y, stress.z);
	const place = (value: number) => {
		const along = size === 0 ? 0 : (value - stress.c) / size;
		return size === 0
			? { x: 0, y: 0 }
			: { x: (along * stress.y) / size, y: (-along * stress.z) / size };
	};
	const stop = (at: number, value: number, sense: TintStop['sense']): TintStop => ({
		...{ at, sense },
		opacity: pale + (deep - pale) * Math.min(1, Math.abs(value) / (sense === 'tension' ? fy : fyc))
	});
	const senseOf = (value: number) => (value < 0 ? 'compression' : 'tension');
	const ends = { from: place(least), to: place(most) };
	if (least >= 0 || most <= 0) {
		const sense = senseOf(least + most);
		return { ...ends, stops: [stop(0, least, sense), stop(1, most, sense)] };
	}
	const zero = -least / (most - least);
	return {
		...ends,
		stops: [
			stop(0, least, 'compression'),
			stop(zero, 0, 'compression'),
			stop(zero, 0, 'tension'),
			stop(1, most, 'tension')
		]
	};
}
