import { drizzle, type MySql2Database } from 'drizzle-orm/mysql2';
import { createPool, type Pool, type PoolOptions } from 'mysql2/promise';
import { config } from '../config';
import * as schema from './schema';

export type Database = MySql2Database<typeof schema>;
/** What a transaction hands to its work; queries take either this or the database. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
/** Either of the two, for queries that may be part of a larger transaction. */
export type Writer = Database | Transaction;

/** How this program talks to MariaDB: UTC, short waits for a server that is away. */
export const connectionOptions = (databaseUrl: string) =>
	({
		uri: databaseUrl.replace(/^mariadb:/, 'mysql:'),
		timezone: 'Z',
		charset: 'utf8mb4',
		supportBigNumbers: true,
		connectTimeout: 2000
	}) satisfies PoolOptions;

let opened: { pool: Pool; database: Database } | undefined;

const open = () => {
	const pool = createPool({
		...connectionOptions(config().databaseUrl),
		connectionLimit: 10,
		maxIdle: 4,
		idleTimeout: 60_000,
		queueLimit: 500,
		enableKeepAlive: true
	});
	opened = { pool, database: drizzle(pool, { schema, mode: 'default' }) };
	return opened;
};

/** The pool of this process, for statements that Drizzle does not write. */
export const pool = (): Pool => (opened ?? open()).pool;

/** The database of this process. Opened on first use; nothing connects before a query. */
export const db = (): Database => (opened ?? open()).database;

/** Closes every connection once what runs has ended; the next use would open anew. */
export const closeDatabase = async (): Promise<void> => {
	const closing = opened?.pool;
	opened = undefined;
	await closing?.end();
};
