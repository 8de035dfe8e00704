import { building } from '$app/environment';
import { setTimeout as sleep } from 'node:timers/promises';
import { readConfig, type Config } from './config';
import { closeDatabase } from './db/connection';
import { databaseFailure, isDatabaseAway } from './db/failure';
import { migrate } from './db/migrate';
import { migrationsFolder, readMigrations } from './db/migrations';
import { log } from './log';
import { seed } from './seed';

/** Ends the process with sentences that a person can act on. */
const refuse = (sentences: readonly string[]): never => {
	for (const sentence of sentences) process.stderr.write(`${sentence}\n`);
	process.exit(1);
};

const checkedConfig = (): Config => {
	const result = readConfig(process.env);
	return result.ok ? result.value : refuse(result.error);
};

const patience = 15_000;

/** Migrates, and waits a little for a database that is still starting. */
const migrateWithPatience = async (databaseUrl: string): Promise<string[]> => {
	const migrations = await readMigrations(migrationsFolder());
	const deadline = Date.now() + patience;
	for (;;) {
		try {
			return await migrate(databaseUrl, migrations);
		} catch (error) {
			if (!isDatabaseAway(error) || Date.now() > deadline) throw error;
			await sleep(300);
		}
	}
};

const refusals: Readonly<Record<string, string>> = {
	ER_ACCESS_DENIED_ERROR: 'DATABASE_URL names a user or password that the server refuses.',
	ER_DBACCESS_DENIED_ERROR: 'DATABASE_URL names a user who may not use that database.',
	ER_BAD_DB_ERROR: 'DATABASE_URL names a database that the server does not have; create it first.',
	ENOTFOUND: 'DATABASE_URL names a host that cannot be found.'
};

/** What went wrong at the bottom, without the statement and its values. */
const rootMessage = (error: unknown): string => {
	if (!(error instanceof Error)) return String(error);
	return error.cause ? rootMessage(error.cause) : error.message;
};

const explain = (error: unknown): string => {
	const known = refusals[databaseFailure(error)?.code ?? ''];
	if (known) return known;
	if (isDatabaseAway(error)) return 'DATABASE_URL names a server that does not answer.';
	const reason = rootMessage(error).split('\n')[0];
	return `The database could not be brought up to date: ${reason}`;
};

/** Once per process, before the first request: settings, database level and contents, orderly end. */
export const startUp = async (): Promise<void> => {
	if (building) return;
	const { databaseUrl } = checkedConfig();
	process.on('sveltekit:shutdown', () => void closeDatabase());
	try {
		const applied = await migrateWithPatience(databaseUrl);
		if (applied.length > 0) log.info({ applied }, 'database brought up to date');
		await seed();
	} catch (error) {
		log.fatal({ err: error }, 'start-up failed');
		refuse([explain(error)]);
	}
};
