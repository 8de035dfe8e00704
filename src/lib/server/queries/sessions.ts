import { and, eq, sql } from 'drizzle-orm';
import { db } from '../db/connection';
import { users } from '../db/schema';

/**
 * Ends every session that the person has, copied cookies included. A cookie that is dead already
 * (made under another epoch) ends nothing.
 */
export const endSessions = async (userId: string, epoch: number): Promise<void> => {
	await db()
		.update(users)
		.set({ sessionEpoch: sql`${users.sessionEpoch} + 1` })
		.where(and(eq(users.id, userId), eq(users.sessionEpoch, epoch)));
};
