import { and, eq } from 'drizzle-orm';
import { db } from '../db/connection';
import { firms, memberships, users } from '../db/schema';
import type { Membership } from '../rights/person';

/** What signing in needs to know about a person. */
export interface Credentials {
	id: string;
	name: string;
	email: string;
	passwordHash: string | null;
	active: boolean;
}

/** The person with that e-mail address (compared in lower case), or null. */
export const credentialsOf = async (email: string): Promise<Credentials | null> => {
	const [row] = await db()
		.select({
			id: users.id,
			name: users.name,
			email: users.email,
			passwordHash: users.passwordHash,
			active: users.active
		})
		.from(users)
		.where(eq(users.email, email.toLowerCase()))
		.limit(1);
	return row ? { ...row, name: row.name ?? row.email } : null;
};

/** A person as they stand at this moment: epoch, active flag, firms and roles. */
export interface Standing {
	id: string;
	name: string;
	email: string;
	active: boolean;
	sessionEpoch: number;
	memberships: Membership[];
}

const standingRows = (userId: string) =>
	db()
		.select({ user: users, firm: firms, role: memberships.role })
		.from(users)
		.leftJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.active, true)))
		.leftJoin(firms, eq(firms.id, memberships.firmId))
		.where(eq(users.id, userId))
		.orderBy(memberships.createdAt, memberships.id);

/** One look-up per request: who this is, and what they may be; null when there is no such person. */
export const standingOf = async (userId: string): Promise<Standing | null> => {
	const rows = await standingRows(userId);
	const user = rows[0]?.user;
	if (!user) return null;
	return {
		id: user.id,
		name: user.name ?? user.email,
		email: user.email,
		active: user.active,
		sessionEpoch: user.sessionEpoch,
		memberships: rows.flatMap(({ firm, role }) =>
			firm && role ? [{ firm: { id: firm.id, name: firm.name, demo: firm.demo }, role }] : []
		)
	};
};
