import { boolean, int, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, exactText, id, instant } from './columns';

/** People. The first five columns carry the names that the sign-in adapter expects. */
export const users = mysqlTable('users', {
	id: id(),
	name: varchar('name', { length: 120 }),
	/** Lower case; compared exactly. */
	email: exactText('email', { length: 254 }).notNull().unique('users_email'),
	emailVerified: instant('email_verified'),
	image: varchar('image', { length: 500 }),
	/** argon2id; absent for people who only sign in through their firm's provider. */
	passwordHash: varchar('password_hash', { length: 255 }),
	/** A session made under an older epoch is dead. */
	sessionEpoch: int('session_epoch').notNull().default(0),
	active: boolean('active').notNull().default(true),
	createdAt: createdAt()
});
