import { mysqlTable, primaryKey } from 'drizzle-orm/mysql-core';
import { exactText, instant } from './columns';

/** One-time tokens of mailed sign-in links, as the adapter expects them. */
export const verificationTokens = mysqlTable(
	'verification_tokens',
	{
		identifier: exactText('identifier', { length: 254 }).notNull(),
		token: exactText('token', { length: 255 }).notNull(),
		expires: instant('expires').notNull()
	},
	(table) => [primaryKey({ columns: [table.identifier, table.token] })]
);
