import type { BendingPath, ResponseState } from '../state';
import { noState } from '../state-report';
import type { History } from './history';
import { bendingFrom, type ImposedOnce } from './history-bending';

/** Where a cycle turns: moments (kNm) or curvatures (1/m) about the axis, one after the other. */
export type Reversals = { moments: readonly number[] } | { curvatures: readonly number[] };

/**
 * States along a cycle of a section that has not been bent: from rest to each reversal in turn, `pointsPerLeg` evenly spaced
 * states a leg, the last of them the reversal itself. Returns the history that is left; null once a
 * reversal cannot be reached or its history has become too fine to follow, with no figures from there.
 */
export function* cycleStates(
	history: History,
	path: BendingPath,
	reversals: Reversals,
	pointsPerLeg: number
): Generator<ResponseState, History | null> {
	const byMoment = 'moments' in reversals;
	const imposed = (value: number): ImposedOnce =>
		byMoment ? { moment: value } : { curvature: value };
	let present: History | null = history;
	let from = 0;
	for (const to of byMoment ? reversals.moments : reversals.curvatures) {
		const bent: ReturnType<typeof bendingFrom> | null = present && bendingFrom(present, path);
		for (let i = 1; i <= pointsPerLeg; i++) {
			const value = i === pointsPerLeg ? to : from + ((to - from) * i) / pointsPerLeg;
			yield bent ? bent.at(imposed(value)) : noState;
		}
		present = bent ? bent.after(imposed(to)) : null;
		from = to;
	}
	return present;
}
