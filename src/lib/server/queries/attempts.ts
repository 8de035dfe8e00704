import { eq, inArray, lt, sql } from 'drizzle-orm';
import { db } from '../db/connection';
import { withRetry } from '../db/retry';
import { attempts } from '../db/schema';

/** Counts one more try under the key and returns how many there were since the window opened. */
const countTry = async (key: string, now: Date, opened: Date): Promise<number> => {
	await db()
		.insert(attempts)
		.values({ key, tries: 1, startedAt: now })
		.onDuplicateKeyUpdate({
			set: {
				tries: sql`if(${attempts.startedAt} < ${opened}, 1, ${attempts.tries} + 1)`,
				startedAt: sql`if(${attempts.startedAt} < ${opened}, ${now}, ${attempts.startedAt})`
			}
		});
	const [row] = await db()
		.select({ tries: attempts.tries })
		.from(attempts)
		.where(eq(attempts.key, key))
		.limit(1);
	return row?.tries ?? 1;
};

/** Counts a try under the key; `windowMs` after the first one the count starts anew. */
export const tryUnder = (key: string, windowMs: number): Promise<number> => {
	const now = new Date();
	return withRetry(() => countTry(key, now, new Date(now.getTime() - windowMs)));
};

/** Forgets what was counted under these keys. */
export const forgetTries = async (keys: readonly string[]): Promise<void> => {
	await db()
		.delete(attempts)
		.where(inArray(attempts.key, [...keys]));
};

/** Throws away counts that no window reaches any more. */
export const forgetOldTries = async (before: Date): Promise<void> => {
	await db().delete(attempts).where(lt(attempts.startedAt, before));
};
