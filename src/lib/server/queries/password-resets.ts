import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import { db, type Writer } from '../db/connection';
import { writeTransaction } from '../db/retry';
import { passwordResets, users } from '../db/schema';
import { record } from './audit-log';

const usable = (hash: string, now: Date) =>
	and(
		eq(passwordResets.tokenHash, hash),
		isNull(passwordResets.usedAt),
		gt(passwordResets.expiresAt, now)
	);

/** Keeps a mailed token's hash until `expiresAt`. */
export const keepReset = async (userId: string, hash: string, expiresAt: Date): Promise<void> => {
	await db().insert(passwordResets).values({ userId, tokenHash: hash, expiresAt });
};

/** Whether a link with this hash would still work. */
export const resetIsUsable = async (hash: string): Promise<boolean> => {
	const rows = await db()
		.select({ id: passwordResets.id })
		.from(passwordResets)
		.where(usable(hash, new Date()))
		.limit(1);
	return rows.length > 0;
};

const useUp = async (tx: Writer, hash: string): Promise<string | null> => {
	const [row] = await tx
		.select({ userId: passwordResets.userId })
		.from(passwordResets)
		.where(usable(hash, new Date()))
		.limit(1)
		.for('update');
	if (!row) return null;
	await tx
		.update(passwordResets)
		.set({ usedAt: new Date() })
		.where(and(eq(passwordResets.userId, row.userId), isNull(passwordResets.usedAt)));
	return row.userId;
};

/**
 * Sets the new password, uses up every open link of that person and ends all their sessions.
 * False when the link is unknown, used or too old.
 */
export const resetPassword = (hash: string, newHash: string): Promise<boolean> =>
	writeTransaction(async (tx) => {
		const userId = await useUp(tx, hash);
		if (!userId) return false;
		await tx
			.update(users)
			.set({ passwordHash: newHash, sessionEpoch: sql`${users.sessionEpoch} + 1` })
			.where(eq(users.id, userId));
		await record(tx, {
			firmId: null,
			userId,
			action: 'password.reset',
			subject: { kind: 'person', id: userId }
		});
		return true;
	});
