import type { RowDataPacket } from 'mysql2/promise';
import { engineVersion } from '$lib/engine/version';
import { version } from '../../../package.json';
import { pool } from './db/connection';
import { migrationsFolder, readMigrations } from './db/migrations';
import { log } from './log';

export interface Health {
	status: 'ok' | 'degraded';
	version: string;
	engineVersion: string;
	/** Seconds since this process began. */
	uptime: number;
	database: { reachable: boolean; latencyMs: number | null };
	migration: { applied: string | null; latest: string | null };
}

interface TagRow extends RowDataPacket {
	tag: string;
}

let latest: Promise<string | null> | undefined;

const latestMigration = () => {
	latest ??= readMigrations(migrationsFolder()).then(
		(migrations) => migrations.at(-1)?.tag ?? null,
		() => null
	);
	return latest;
};

const appliedMigration = async (): Promise<string | null> => {
	const [rows] = await pool().query<TagRow[]>({
		sql: 'SELECT tag FROM schema_migrations WHERE finished = 1 ORDER BY tag DESC LIMIT 1',
		timeout: 1500
	});
	return rows[0]?.tag ?? null;
};

const databaseState = async () => {
	const started = performance.now();
	try {
		const applied = await appliedMigration();
		const latencyMs = Math.round((performance.now() - started) * 10) / 10;
		return { database: { reachable: true, latencyMs }, applied };
	} catch (error) {
		log.warn({ err: error }, 'health: database away');
		return { database: { reachable: false, latencyMs: null }, applied: null };
	}
};

/** How this instance is. Healthy means: the database answers and has this program's tables. */
export const health = async (): Promise<Health> => {
	const [{ database, applied }, newest] = await Promise.all([databaseState(), latestMigration()]);
	return {
		status: database.reachable && applied === newest ? 'ok' : 'degraded',
		version,
		engineVersion,
		uptime: Math.round(process.uptime()),
		database,
		migration: { applied, latest: newest }
	};
};
