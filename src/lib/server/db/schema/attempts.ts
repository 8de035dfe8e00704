import { index, int, mysqlTable } from 'drizzle-orm/mysql-core';
import { instant, sha256 } from './columns';

/**
 * How often something guarded (signing in, asking for a new password) was tried in a window of
 * time. The key is a keyed hash of what was tried from where. `tries` stands before `startedAt` on
 * purpose: an update sets columns in this order, and `tries` looks at the old start.
 */
export const attempts = mysqlTable(
	'attempts',
	{
		key: sha256('attempt_key').primaryKey(),
		tries: int('tries').notNull(),
		startedAt: instant('started_at').notNull()
	},
	(table) => [index('attempts_started').on(table.startedAt)]
);
