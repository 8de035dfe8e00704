import { setImmediate as nextTurn } from 'node:timers/promises';
import { fail, ok, type Result } from '../../../engine/result';
import type { Bending, Imposed } from '../../../engine/response/respond';
import type { ResponseState } from '../../../engine/response/state';
import { noState } from '../../../engine/response/state-report';
import type { Refusal } from '../refusal';
import { processorTime } from './processor-time';

/** Longest that other requests wait for a turn, ms. */
const turn = 25;
/** Longest work on one request, ms of processor time: far above what the limits on states allow on any usual machine. */
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

/** The states asked for, each computed when it is called for. */
export function* statesOf(bent: Bending, at: Imposed): Generator<ResponseState> {
	if ('curvature' in at) for (const value of at.curvature) yield bent.atCurvature(value);
	else if ('moment' in at) for (const value of at.moment) yield bent.atMoment(value);
	else if ('strainPlanes' in at) for (const plane of at.strainPlanes) yield bent.atPlane(plane);
	else {
		const unit = bent.firstYield.curvature;
		// no curvature is a multiple of none
		const at0 = (ratio: number) => (unit ? bent.atCurvature(ratio * unit) : noState);
		for (const ratio of at.curvatureRatio) yield at0(ratio);
	}
}

/** Takes the results of steps in order, for one request. */
export type InTurns = <T>(steps: Iterable<T>) => Promise<Result<T[], Refusal>>;

/**
 * Lets other requests in between steps, a few milliseconds at a time; stops when the whole request has
 * taken too long, or nobody waits any more.
 */
export const inTurns = (signal: AbortSignal | undefined): InTurns => {
	let [started, spent, worked] = [performance.now(), processorTime(), 0];
	return async (steps) => {
		const results = [];
		for (const step of steps) {
			results.push(step);
			if (performance.now() - started < turn) continue;
			worked += processorTime() - spent;
			if (worked > mostWork) return fail(tooMuchWork);
			await nextTurn();
			if (signal?.aborted) return fail(clientGone);
			[started, spent] = [performance.now(), processorTime()];
		}
		return ok(results);
	};
};
