import { createConnection, type Connection, type RowDataPacket } from 'mysql2/promise';
import { connectionOptions } from './connection';
import { databaseFailure } from './failure';
import type { Migration } from './migrations';

interface AppliedRow extends RowDataPacket {
	tag: string;
	hash: string;
	statements_done: number;
	finished: 0 | 1;
}

const ledger = `CREATE TABLE IF NOT EXISTS schema_migrations (
	tag varchar(120) NOT NULL PRIMARY KEY,
	hash char(64) NOT NULL,
	statements_done int NOT NULL DEFAULT 0,
	finished tinyint NOT NULL DEFAULT 0,
	applied_at datetime(3) NOT NULL DEFAULT current_timestamp(3)
) ENGINE=InnoDB`;

/** Table, column, index or foreign key there already: the statement was done, its tick was not. */
const doneBefore = new Set([1050, 1060, 1061, 1826, 121]);

const appliedRow = async (connection: Connection, tag: string): Promise<AppliedRow | undefined> => {
	const [rows] = await connection.query<AppliedRow[]>(
		'SELECT tag, hash, statements_done, finished FROM schema_migrations WHERE tag = ?',
		[tag]
	);
	return rows[0];
};

const runStatement = async (connection: Connection, statement: string, isRepeat: boolean) => {
	try {
		await connection.query(statement);
	} catch (error) {
		const { errno = 0 } = databaseFailure(error) ?? {};
		if (!(isRepeat && doneBefore.has(errno))) throw error;
	}
};

const changed = (tag: string) =>
	`migration ${tag} is not the one that was applied to this database. Migrations are added, never edited; a database that holds nothing of worth can be dropped and made anew.`;

/** MariaDB commits each change of a table by itself, so progress is kept statement by statement. */
const apply = async (connection: Connection, { tag, hash, statements }: Migration) => {
	const before = await appliedRow(connection, tag);
	if (before && before.hash !== hash) throw new Error(changed(tag));
	if (before?.finished) return false;
	if (!before)
		await connection.query('INSERT INTO schema_migrations (tag, hash) VALUES (?, ?)', [tag, hash]);
	const first = before?.statements_done ?? 0;
	for (const [index, statement] of statements.entries()) {
		if (index < first) continue;
		await runStatement(connection, statement, before !== undefined && index === first);
		await connection.query('UPDATE schema_migrations SET statements_done = ? WHERE tag = ?', [
			index + 1,
			tag
		]);
	}
	await connection.query('UPDATE schema_migrations SET finished = 1 WHERE tag = ?', [tag]);
	return true;
};

const lockName = async (connection: Connection) => {
	const [rows] = await connection.query<RowDataPacket[]>('SELECT database() AS name');
	return `migrate:${String(rows[0]?.name)}`.slice(0, 64);
};

/** Does work on a connection of its own while no other instance does the same. */
export const underDatabaseLock = async <T>(
	databaseUrl: string,
	work: (connection: Connection) => Promise<T>
): Promise<T> => {
	const connection = await createConnection(connectionOptions(databaseUrl));
	try {
		const name = await lockName(connection);
		const [rows] = await connection.query<RowDataPacket[]>('SELECT get_lock(?, 300) AS held', [
			name
		]);
		if (rows[0]?.held !== 1) throw new Error('Another instance holds the migration lock.');
		return await work(connection);
	} finally {
		await connection.end();
	}
};

/**
 * Brings the database to the level of these migrations. Safe to run from several instances at
 * once and to run again after it was cut off; returns the tags applied now.
 */
export const migrate = (databaseUrl: string, migrations: readonly Migration[]): Promise<string[]> =>
	underDatabaseLock(databaseUrl, async (connection) => {
		await connection.query(ledger);
		const applied: string[] = [];
		for (const migration of migrations)
			if (await apply(connection, migration)) applied.push(migration.tag);
		return applied;
	});
