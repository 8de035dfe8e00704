import { setImmediate as nextTurn } from 'node:timers/promises';
import { fail, ok, type Result } from '../../../engine/result';
import {
	bending,
	type Bending,
	type Imposed,
	type Response
} from '../../../engine/response/respond';
import type { BendingPath, ResponseState } from '../../../engine/response/state';
import { noState } from '../../../engine/response/state-report';
import type { PreparedSection } from '../../../engine/section/prepared';
import type { Refusal } from '../refusal';

/** Longest that other requests wait for a turn, ms. */
const turn = 25;
/** Longest work on one request, ms: far above what the limits on states allow on any usual machine. */
const mostWork = 10_000;

const clientGone: Refusal = {
	status: 499,
	code: 'client_gone',
	message: 'The caller did not wait for the answer.'
};

const tooMuchWork: Refusal = {
	status: 422,
	code: 'too_much_work',
	message: `These states take more than ${mostWork / 1000} s to compute. Send fewer at a time.`
};

const stepsOf = (bent: Bending, at: Imposed): (() => ResponseState)[] => {
	if ('curvature' in at) return at.curvature.map((value) => () => bent.atCurvature(value));
	if ('moment' in at) return at.moment.map((value) => () => bent.atMoment(value));
	if ('strainPlanes' in at) return at.strainPlanes.map((plane) => () => bent.atPlane(plane));
	const unit = bent.firstYield.curvature;
	return at.curvatureRatio.map(
		(ratio) => () => (unit === null ? noState : bent.atCurvature(ratio * unit))
	);
};

/** Runs the steps in order, letting other requests in between; stops when nobody waits any more. */
const inTurns = async <T>(
	steps: readonly (() => T)[],
	signal: AbortSignal | undefined
): Promise<Result<T[], Refusal>> => {
	const results: T[] = [];
	let [started, worked] = [performance.now(), 0];
	for (const step of steps) {
		results.push(step());
		const now = performance.now();
		if (now - started < turn) continue;
		worked += now - started;
		if (worked > mostWork) return fail(tooMuchWork);
		await nextTurn();
		if (signal?.aborted) return fail(clientGone);
		started = performance.now();
	}
	return ok(results);
};

/** The engine's `respond`, a few milliseconds at a time; the figures are the same. */
export const respondInTurns = async (
	section: PreparedSection,
	path: BendingPath,
	at: Imposed,
	signal?: AbortSignal
): Promise<Result<Response, Refusal>> => {
	const bent = bending(section, path);
	const states = await inTurns(stepsOf(bent, at), signal);
	if (!states.ok) return states;
	const { firstYield, plasticMoment } = bent;
	return ok({ states: states.value, firstYield, plasticMoment });
};
