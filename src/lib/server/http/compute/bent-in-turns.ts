import type { ResponseRequest } from '../../../api/response';
import { cycleStates, type Reversals } from '../../../engine/response/history/cycle';
import type { History } from '../../../engine/response/history/history';
import { bendingFrom, type ImposedOnce } from '../../../engine/response/history/history-bending';
import type { PathEnd } from '../../../engine/response/strain-limits';
import { bending, type Imposed } from '../../../engine/response/respond';
import type { BendingPath, FirstYield, ResponseState } from '../../../engine/response/state';
import { noState } from '../../../engine/response/state-report';
import { fail, ok, type Note, type Result } from '../../../engine/result';
import type { PreparedSection } from '../../../engine/section/prepared';
import type { Refusal } from '../refusal';
import { inTurns, statesOf, type InTurns } from './states-in-turns';
import { usualPointsPerLeg } from './work-limit';

/** What a request asks for, read: its path, and what is imposed. */
export interface Asked {
	readonly path: BendingPath;
	readonly at: Imposed;
	readonly unloadFrom?: ResponseRequest['unloadFrom'];
	readonly cycle?: ResponseRequest['cycle'];
}

export interface Bent {
	states: ResponseState[];
	legs?: { states: ResponseState[] }[];
	firstYield: FirstYield;
	plasticMoment: number | null;
	ended?: PathEnd;
	notes: Note[];
}

const lostNote: Note = {
	code: 'history-not-reached',
	message:
		'A state on the way (a reversal of the cycle, or unloadFrom) cannot exist, or has cut the section into more pieces than are followed: no state is given from there on.'
};

/** A bending that starts from rest, or from a history; others get their turn between states. */
export const bentInTurns = async (
	section: PreparedSection,
	{ path, at, unloadFrom, cycle }: Asked,
	history: History | null,
	signal?: AbortSignal
): Promise<Result<Bent, Refusal>> => {
	const take = inTurns(signal);
	const cycled = history && cycle ? await cycleInTurns(history, path, cycle, take) : null;
	if (cycled && !cycled.ok) return cycled;
	const loaded = cycled ? cycled.value.left : history;
	const left = loaded && unloadFrom ? loadedTo(loaded, path, unloadFrom) : loaded;
	const lost = history !== null && left === null;
	const bent = bending(section, path, left ?? history);
	const end = bent.ended?.();
	const states = await take(lost ? noStates(at) : statesOf(bent, at));
	if (!states.ok) return states;
	return ok({
		states: states.value,
		...(cycled ? { legs: cycled.value.legs } : {}),
		firstYield: bent.firstYield,
		plasticMoment: bent.plasticMoment,
		...(end ? { ended: end } : {}),
		notes: lost ? [lostNote] : []
	});
};

const noStates = (at: Imposed): ResponseState[] =>
	Object.values(at).flatMap((list: readonly unknown[]) => list.map(() => noState));

const cycleInTurns = async (
	history: History,
	path: BendingPath,
	{ moments = [], curvatures, pointsPerLeg = usualPointsPerLeg }: NonNullable<Asked['cycle']>,
	take: InTurns
) => {
	const reversals: Reversals = curvatures ? { curvatures } : { moments };
	let left: History | null = null;
	function* steps() {
		left = yield* cycleStates(history, path, reversals, pointsPerLeg);
	}
	const states = await take(steps());
	if (!states.ok) return fail(states.error);
	const legs = (curvatures ?? moments).map((_, i) => ({
		states: states.value.slice(i * pointsPerLeg, (i + 1) * pointsPerLeg)
	}));
	return ok({ legs, left: left as History | null });
};

/** The history once the section is loaded to the state to unload from, under that state's own N. */
const loadedTo = (
	history: History,
	path: BendingPath,
	{ N = path.N, ...from }: NonNullable<Asked['unloadFrom']>
): History | null => {
	const once = onceOf(from);
	return once && bendingFrom(history, { ...path, N }).after(once);
};

const onceOf = ({
	curvature,
	curvatureRatio,
	moment,
	strainPlanes
}: Omit<NonNullable<Asked['unloadFrom']>, 'N'>): ImposedOnce | null => {
	if (curvature?.length === 1) return { curvature: curvature[0]! };
	if (curvatureRatio?.length === 1) return { curvatureRatio: curvatureRatio[0]! };
	if (moment?.length === 1) return { moment: moment[0]! };
	if (strainPlanes?.length === 1) return { strainPlane: strainPlanes[0]! };
	return null;
};
