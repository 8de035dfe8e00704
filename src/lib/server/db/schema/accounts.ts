import { index, int, mysqlTable, primaryKey, text, varchar } from 'drizzle-orm/mysql-core';
import { exactText, idOf } from './columns';
import { users } from './users';

/** Identities at outside sign-in providers; property names as the adapter expects them. */
export const accounts = mysqlTable(
	'accounts',
	{
		userId: idOf('user_id')
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		type: varchar('type', { length: 32 })
			.$type<'oauth' | 'oidc' | 'email' | 'credentials' | 'webauthn'>()
			.notNull(),
		provider: varchar('provider', { length: 64 }).notNull(),
		providerAccountId: exactText('provider_account_id', { length: 255 }).notNull(),
		refresh_token: text('refresh_token'),
		access_token: text('access_token'),
		expires_at: int('expires_at'),
		token_type: varchar('token_type', { length: 64 }),
		scope: varchar('scope', { length: 500 }),
		id_token: text('id_token'),
		session_state: varchar('session_state', { length: 255 })
	},
	(table) => [
		primaryKey({ columns: [table.provider, table.providerAccountId] }),
		index('accounts_user').on(table.userId)
	]
);
