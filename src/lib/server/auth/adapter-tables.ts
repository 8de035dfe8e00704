import { int, mysqlTable, primaryKey, text, timestamp, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, id } from '../db/schema/columns';

/*
 * The same tables as in the schema, with the column types that the sign-in adapter asks for.
 * They make no migrations: the schema decides what stands in the database.
 */

export const adapterUsers = mysqlTable('users', {
	id: id(),
	name: varchar('name', { length: 120 }),
	email: varchar('email', { length: 254 }).notNull(),
	emailVerified: timestamp('email_verified', { mode: 'date', fsp: 3 }),
	image: varchar('image', { length: 500 }),
	createdAt: createdAt()
});

export const adapterAccounts = mysqlTable(
	'accounts',
	{
		userId: varchar('user_id', { length: 36 }).notNull(),
		type: varchar('type', { length: 32 })
			.$type<'oauth' | 'oidc' | 'email' | 'webauthn'>()
			.notNull(),
		provider: varchar('provider', { length: 64 }).notNull(),
		providerAccountId: varchar('provider_account_id', { length: 255 }).notNull(),
		refresh_token: text('refresh_token'),
		access_token: text('access_token'),
		expires_at: int('expires_at'),
		token_type: varchar('token_type', { length: 64 }),
		scope: varchar('scope', { length: 500 }),
		id_token: text('id_token'),
		session_state: varchar('session_state', { length: 255 })
	},
	(table) => [primaryKey({ columns: [table.provider, table.providerAccountId] })]
);

export const adapterVerificationTokens = mysqlTable(
	'verification_tokens',
	{
		identifier: varchar('identifier', { length: 254 }).notNull(),
		token: varchar('token', { length: 255 }).notNull(),
		expires: timestamp('expires', { mode: 'date', fsp: 3 }).notNull()
	},
	(table) => [primaryKey({ columns: [table.identifier, table.token] })]
);
