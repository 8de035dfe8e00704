import { randomBytes } from 'node:crypto';
import { createConnection } from 'mysql2/promise';
import { openPassingDatabase } from '../../scripts/lib/passing-database.js';
import { ensureSystem, mariadb } from '../../scripts/lib/system-packages.js';

/** Runs one statement on a server. */
export const runSql = async (url: string, sql: string): Promise<void> => {
	const connection = await createConnection({ uri: url, multipleStatements: false });
	try {
		await connection.query(sql);
	} finally {
		await connection.end();
	}
};

/** The same server, another database. */
export const withDatabase = (url: string, name: string): string => {
	const other = new URL(url);
	other.pathname = `/${name}`;
	return other.href;
};

/** A database that nobody else uses, on a server where this account may make databases. */
export const openFreshDatabase = async (serverUrl: string) => {
	const name = `flangewright_test_${randomBytes(5).toString('hex')}`;
	await runSql(
		serverUrl,
		`CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`
	);
	return {
		url: withDatabase(serverUrl, name),
		release: () => runSql(serverUrl, `DROP DATABASE IF EXISTS ${name}`)
	};
};

const explain = (error: unknown): never => {
	const reason = error instanceof Error ? error.message : String(error);
	throw new Error(
		`The tests need a database of their own on the server of DATABASE_URL and cannot make one (${reason}). Unset DATABASE_URL, or give an account that may create databases.`
	);
};

/** The database of a test run: a private server, or a fresh database on that of DATABASE_URL. */
export const openTestDatabase = async () => {
	const given = process.env.DATABASE_URL;
	if (given) return openFreshDatabase(given).catch(explain);
	await ensureSystem(mariadb);
	return openPassingDatabase();
};
