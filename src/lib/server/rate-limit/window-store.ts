import type { Pool, RowDataPacket } from 'mysql2/promise';

/** Calls counted for a client, own ones included, and what is left of its minute. */
export interface WindowState {
	hits: number;
	millisecondsLeft: number;
}

/** Counts calls in a store that all instances share. */
export type CountCalls = (key: string, calls: number) => Promise<WindowState>;

interface WindowRow extends RowDataPacket {
	hits: number;
	left_ms: number;
}

/**
 * One statement: a new client or an ended minute starts a window, else the calls are added. The
 * database's clock rules; `hits` is set first, while `started_at` still has its old value.
 */
const countSql = `INSERT INTO rate_windows (client_key, started_at, hits)
	VALUES (?, utc_timestamp(3), ?)
	ON DUPLICATE KEY UPDATE
		hits = if(started_at <= utc_timestamp(3) - INTERVAL 1 MINUTE, values(hits), hits + values(hits)),
		started_at = if(started_at <= utc_timestamp(3) - INTERVAL 1 MINUTE, values(started_at), started_at)
	RETURNING hits,
		timestampdiff(MICROSECOND, utc_timestamp(3), started_at + INTERVAL 1 MINUTE) DIV 1000 AS left_ms`;

const sweepSql =
	'DELETE FROM rate_windows WHERE started_at < utc_timestamp(3) - INTERVAL 5 MINUTE LIMIT 1000';

const sweepShare = 1 / 200;

/** The shared store in MariaDB; now and then a count also clears windows long over. */
export const windowStore =
	(pool: () => Pool): CountCalls =>
	async (key, calls) => {
		const [rows] = await pool().query<WindowRow[]>({
			sql: countSql,
			values: [key, calls],
			timeout: 1000
		});
		const row = rows[0];
		if (!row) throw new Error('rate_windows returned no row');
		if (Math.random() < sweepShare)
			void pool()
				.query(sweepSql)
				.catch(() => undefined);
		return { hits: row.hits, millisecondsLeft: Math.max(1, row.left_ms) };
	};
