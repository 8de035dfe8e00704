import { char, datetime, index, int, mysqlTable } from 'drizzle-orm/mysql-core';

/**
 * Calls of one client in its current minute, shared by all instances. The key is a keyed hash of
 * the client's address: no address is stored, and a client has one row however long it stays.
 */
export const rateWindows = mysqlTable(
	'rate_windows',
	{
		clientKey: char('client_key', { length: 43 }).primaryKey(),
		startedAt: datetime('started_at', { fsp: 3, mode: 'date' }).notNull(),
		hits: int('hits', { unsigned: true }).notNull()
	},
	(table) => [index('rate_windows_started').on(table.startedAt)]
);
