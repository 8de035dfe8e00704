import { desc } from 'drizzle-orm';
import { db } from '../db/connection';
import { localMail } from '../db/schema';

export interface LocalMail {
	id: string;
	recipient: string;
	subject: string;
	body: string;
	sentAt: Date;
}

export const keepLocalMail = async (
	mail: Pick<LocalMail, 'recipient' | 'subject' | 'body'>
): Promise<void> => {
	await db().insert(localMail).values(mail);
};

/** The newest hundred, newest first. */
export const recentLocalMail = (): Promise<LocalMail[]> =>
	db().select().from(localMail).orderBy(desc(localMail.id)).limit(100);
