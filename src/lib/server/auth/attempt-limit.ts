import { createHmac } from 'node:crypto';
import { config } from '../config';
import { log } from '../log';
import { forgetOldTries, forgetTries, tryUnder } from '../queries/attempts';

/** How often something may be tried within a quarter of an hour. */
export const attemptWindow = 15 * 60_000;
const day = 24 * 60 * 60_000;

/** What is counted: the most tries, and what they are counted by. */
export interface Limit {
	most: number;
	by: readonly string[];
}

/** One address guessing at one account is stopped soon; many at one, or one at many, later. */
export const signInLimits = (email: string, client: string): Limit[] => [
	{ most: 10, by: ['sign-in', email, client] },
	{ most: 100, by: ['sign-in account', email] },
	{ most: 200, by: ['sign-in client', client] }
];

export const signUpLimits = (client: string): Limit[] => [{ most: 100, by: ['sign-up', client] }];

export const forgotLimits = (email: string, client: string): Limit[] => [
	{ most: 5, by: ['forgot', email] },
	{ most: 60, by: ['forgot client', client] }
];

/** Neither addresses nor e-mails are stored: the key is a hash under the app's secret. */
const keyOf = ({ by }: Limit) =>
	createHmac('sha256', config().authSecret).update(JSON.stringify(by)).digest('hex');

const tidyNowAndThen = () => {
	if (Math.random() > 0.01) return;
	forgetOldTries(new Date(Date.now() - day)).catch((error: unknown) =>
		log.warn({ err: error }, 'old attempts could not be removed')
	);
};

/** Counts one try under each limit; false when one of them is used up. */
export const mayTry = async (limits: readonly Limit[]): Promise<boolean> => {
	tidyNowAndThen();
	for (const limit of limits)
		if ((await tryUnder(keyOf(limit), attemptWindow)) > limit.most) return false;
	return true;
};

/** After a success the tries of that client at that account no longer count. */
export const forgiveTries = (limits: readonly Limit[]): Promise<void> =>
	forgetTries(limits.map(keyOf));
