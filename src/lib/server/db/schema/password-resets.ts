import { index, mysqlTable } from 'drizzle-orm/mysql-core';
import { createdAt, id, idOf, instant, sha256 } from './columns';
import { users } from './users';

/** Mailed links to a new password. Only the token's hash is kept; each works once, for an hour. */
export const passwordResets = mysqlTable(
	'password_resets',
	{
		id: id(),
		userId: idOf('user_id')
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		tokenHash: sha256('token_hash').notNull().unique('password_resets_token'),
		expiresAt: instant('expires_at').notNull(),
		usedAt: instant('used_at'),
		createdAt: createdAt()
	},
	(table) => [index('password_resets_user').on(table.userId)]
);
