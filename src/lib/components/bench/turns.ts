import type { History } from '$lib/engine/response/history/history';
import { bendingFrom, type HistoryBending } from '$lib/engine/response/history/history-bending';
import type { BendingPath } from '$lib/engine/response/state';

/** Where bending turned: at a curvature, in multiples of first yield free of stress, or let go to no moment. */
export type Turn = number | 'release';

/** More turns than this are not kept: each is followed again whenever the section changes. */
export const mostTurns = 40;

/** Bending from one turn to the next; ratios in multiples of the curvature at first yield. */
export interface Leg {
	readonly turn: Turn;
	readonly bending: HistoryBending;
	readonly from: number;
	readonly to: number;
	/** kNm at its end. */
	readonly moment: number;
}

/** A section that has been bent to and fro. */
export interface TurnedSection {
	readonly legs: readonly Leg[];
	/** What the last turn that was reached leaves. */
	readonly history: History;
	/** Ratio at which it stands. */
	readonly end: number;
	/** Number of the turn that could not be reached, from 1; null when all were. */
	readonly lost: number | null;
}

/** Follows the turns one by one along a path; `unit` is the curvature of ratio 1, in 1/m. */
export function turnedSection(
	start: History,
	path: BendingPath,
	unit: number,
	turns: readonly Turn[]
): TurnedSection {
	let history = start;
	let end = 0;
	const legs: Leg[] = [];
	for (const turn of turns) {
		const bending = bendingFrom(history, path);
		const imposed = turn === 'release' ? { moment: 0 } : { curvature: turn * unit };
		const state = bending.at(imposed);
		const after = state.curvature === null ? null : bending.after({ curvature: state.curvature });
		if (!after || state.curvature === null || state.moment === null)
			return { legs, history, end, lost: legs.length + 1 };
		const to = state.curvature / unit;
		const moment = turn === 'release' ? 0 : state.moment;
		legs.push({ turn, bending, from: end, to, moment });
		history = after;
		end = to;
	}
	return { legs, history, end, lost: null };
}

/** Turns of `cycles` whole cycles between a ratio and its opposite. */
export const cycleTurns = (ratio: number, opposite: number, cycles: number): Turn[] =>
	Array.from({ length: 2 * cycles }, (_, at) => (at % 2 === 0 ? ratio : opposite));
