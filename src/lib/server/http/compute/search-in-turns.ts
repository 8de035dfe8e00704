import { setImmediate as nextTurn } from 'node:timers/promises';
import { fail, ok, type Result } from '../../../engine/result';
import type { Refusal } from '../refusal';
import { processorTime } from './processor-time';

/** Longest that other requests wait for a turn, ms. */
const turn = 25;
/** Longest work on one search, ms of processor time. */
const mostWork = 10_000;

const clientGone: Refusal = {
	status: 499,
	code: 'client_gone',
	message: 'The caller did not wait for the answer.'
};

const tooMuchWork: Refusal = {
	status: 422,
	code: 'too_much_work',
	message: `This takes more than ${mostWork / 1000} s to compute. Ask for less at a time.`
};

/** Runs a search that can pause to its end, letting other requests in between; `most`: its longest work, ms of processor time. */
export const searchInTurns = async <T>(
	search: Generator<unknown, T>,
	signal?: AbortSignal,
	most = mostWork
): Promise<Result<T, Refusal>> => {
	let [started, spent, worked] = [performance.now(), processorTime(), 0];
	for (;;) {
		const { done, value } = search.next();
		if (done) return ok(value);
		if (performance.now() - started < turn) continue;
		worked += processorTime() - spent;
		if (worked > most) return fail(tooMuchWork);
		await nextTurn();
		if (signal?.aborted) return fail(clientGone);
		[started, spent] = [performance.now(), processorTime()];
	}
};
