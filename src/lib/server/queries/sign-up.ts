import { fail, ok, type Result } from '../../engine/result';
import { newId } from '../db/ids';
import { databaseFailure } from '../db/failure';
import { writeTransaction } from '../db/retry';
import { firms, memberships, users } from '../db/schema';
import { record } from './audit-log';

export interface NewPerson {
	name: string;
	/** Lower case. */
	email: string;
	passwordHash: string;
	firmName: string;
}

const insertPerson = (person: NewPerson, userId: string, firmId: string) =>
	writeTransaction(async (tx) => {
		const { name, email, passwordHash, firmName } = person;
		await tx.insert(users).values({ id: userId, name, email, passwordHash });
		await tx.insert(firms).values({ id: firmId, name: firmName });
		await tx.insert(memberships).values({ firmId, userId, role: 'owner' });
		const subject = { kind: 'firm', id: firmId };
		await record(tx, { firmId, userId, action: 'firm.create', subject });
	});

/** A new person and their firm, which they own; fails when the e-mail address is taken. */
export const signUp = async (person: NewPerson): Promise<Result<{ firmId: string }, 'taken'>> => {
	const firmId = newId();
	try {
		await insertPerson(person, newId(), firmId);
		return ok({ firmId });
	} catch (error) {
		if (databaseFailure(error)?.code === 'ER_DUP_ENTRY') return fail('taken');
		throw error;
	}
};
