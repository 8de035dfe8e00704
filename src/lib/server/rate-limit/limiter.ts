import type { CountCalls } from './window-store';

/** What this instance knows of one client: calls it may still let through, and until when. */
interface Lease {
	calls: number;
	until: number;
	asking: Promise<void> | null;
	/** Calls left in the shared window when it was last asked. */
	left: number;
}

export interface LimiterOptions {
	count: CountCalls;
	/** Calls a minute and client. */
	limit: number;
	now?: () => number;
	/** Told when the store cannot be reached; the limit then holds for each instance alone. */
	onStoreAway?: (error: unknown) => void;
}

const mostClients = 20_000;
const minute = 60_000;

/** An eighth of what is left: few questions for busy clients, exact near the end. */
const leaseSize = (left: number) => Math.max(1, Math.floor(left / 8));

/**
 * Limits calls per client over all instances that share a store. Calls are leased from the store a
 * few at a time, so that most need no question to the database, and a client over its limit none.
 * Returns 0 when the call may go on, else the milliseconds to wait.
 */
export const createLimiter = ({
	count,
	limit,
	now = Date.now,
	onStoreAway
}: LimiterOptions): ((key: string) => Promise<number>) => {
	const leases = new Map<string, Lease>();

	const forgetOld = () => {
		for (const [key, lease] of leases) if (lease.until <= now()) leases.delete(key);
		for (const key of leases.keys()) {
			if (leases.size < mostClients) break;
			leases.delete(key);
		}
	};

	const leaseOf = (key: string): Lease => {
		const known = leases.get(key);
		if (known) return known;
		if (leases.size >= mostClients) forgetOld();
		const fresh: Lease = { calls: 0, until: 0, asking: null, left: limit };
		leases.set(key, fresh);
		return fresh;
	};

	const ask = async (key: string, lease: Lease) => {
		const wanted = leaseSize(lease.left);
		try {
			const { hits, millisecondsLeft } = await count(key, wanted);
			lease.calls = Math.min(wanted, Math.max(0, limit - hits + wanted));
			lease.left = Math.max(0, limit - hits);
			lease.until = now() + millisecondsLeft;
		} catch (error) {
			onStoreAway?.(error);
			Object.assign(lease, { calls: limit, left: 0, until: now() + minute });
		}
	};

	const isSpent = (lease: Lease) => lease.calls === 0 && lease.left === 0;

	return async (key) => {
		const lease = leaseOf(key);
		for (;;) {
			if (lease.until <= now()) Object.assign(lease, { calls: 0, left: limit });
			if (lease.calls > 0) {
				lease.calls -= 1;
				return 0;
			}
			if (isSpent(lease)) return lease.until - now();
			lease.asking ??= ask(key, lease).finally(() => (lease.asking = null));
			await lease.asking;
		}
	};
};
