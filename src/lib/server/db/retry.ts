import { setTimeout as sleep } from 'node:timers/promises';
import { db, type Transaction } from './connection';
import { databaseFailure } from './failure';

/** Deadlock, lock wait timeout, row changed since it was read: the transaction may be run again. */
const passing = new Set([1213, 1205, 1020]);

export const isPassingConflict = (error: unknown): boolean =>
	passing.has(databaseFailure(error)?.errno ?? 0);

export interface RetryOptions {
	/** How often the work is run at most. */
	attempts?: number;
	/** Longest wait before the second attempt, in milliseconds; doubled for each later one. */
	firstWait?: number;
}

/**
 * Runs work again when it lost against another transaction, after a random wait that grows.
 * Any other error, and the last attempt's, is the caller's.
 */
export const withRetry = async <T>(
	work: () => Promise<T>,
	{ attempts = 6, firstWait = 25 }: RetryOptions = {}
): Promise<T> => {
	for (let attempt = 1; ; attempt += 1) {
		try {
			return await work();
		} catch (error) {
			if (attempt >= attempts || !isPassingConflict(error)) throw error;
			await sleep(Math.random() * firstWait * 2 ** (attempt - 1));
		}
	}
};

/**
 * Runs a write transaction, again if it lost a conflict; the work must do nothing outside the
 * transaction that may not be done twice.
 */
export const writeTransaction = <T>(
	work: (tx: Transaction) => Promise<T>,
	options?: RetryOptions
): Promise<T> => withRetry(() => db().transaction(work), options);
