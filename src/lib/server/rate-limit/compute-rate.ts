import { json, type RequestEvent } from '@sveltejs/kit';
import { config } from '../config';
import { pool } from '../db/connection';
import { log } from '../log';
import { clientKey } from './client-key';
import { createLimiter } from './limiter';
import { windowStore } from './window-store';

let limiter: ReturnType<typeof createLimiter> | undefined;
let warnedAt = 0;

/** At most one line in ten seconds, however many clients ask. */
const warn = (error: unknown) => {
	if (Date.now() - warnedAt < 10_000) return;
	warnedAt = Date.now();
	log.warn({ err: error }, 'rate limit kept by this instance alone: database away');
};

const computeLimiter = () => {
	limiter ??= createLimiter({
		count: windowStore(pool),
		limit: config().computeRatePerMinute,
		onStoreAway: warn
	});
	return limiter;
};

const tooMany = (wait: number): Response => {
	const seconds = Math.max(1, Math.ceil(wait / 1000));
	const limit = config().computeRatePerMinute;
	const message = `More than ${limit} calculations in a minute without signing in. Try again in ${seconds} s, or sign in.`;
	return json(
		{ error: { code: 'too_many_requests', message } },
		{ status: 429, headers: { 'retry-after': String(seconds) } }
	);
};

type Caller = Pick<RequestEvent, 'getClientAddress'> & {
	locals: { person?: unknown };
};

/**
 * Null when an anonymous compute call may go on, else the 429 to answer with. People who are
 * signed in are not limited. With the database away each instance keeps the limit by itself.
 */
export const enforceComputeRate = async (event: Caller): Promise<Response | null> => {
	if (config().computeRatePerMinute === 0 || event.locals.person) return null;
	const wait = await computeLimiter()(clientKey(event.getClientAddress(), config().authSecret));
	return wait === 0 ? null : tooMany(wait);
};
