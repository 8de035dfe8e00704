import { fail, ok, type Result } from '$lib/engine/result';
import type { FromWorker, JobEnd, JobTable, Port, ToWorker } from './protocol';

export interface Job<Value> {
	readonly id: number;
	/** Resolves once, never rejects. */
	readonly result: Promise<Result<Value, JobEnd>>;
	cancel(): void;
}

export interface JobOptions {
	/** Called with 0 to 1 while the job runs. */
	onProgress?: (share: number) => void;
}

export interface Jobs<T extends JobTable> {
	/** Starts a job; an earlier one of the same kind ends as superseded. */
	start<K extends keyof T & string>(
		kind: K,
		payload: T[K]['payload'],
		options?: JobOptions
	): Job<T[K]['value']>;
	/** Ends every job as failed: the worker itself has broken. */
	abandon(message: string): void;
}

interface Pending {
	readonly id: number;
	readonly kind: string;
	readonly message: unknown;
	readonly settle: (result: Result<unknown, JobEnd>) => void;
	readonly onProgress: ((share: number) => void) | undefined;
}

/** One kind's place: what the worker has in hand, and the newest that waits behind it. */
interface Lane {
	inHand: Pending | null;
	waiting: Pending | null;
}

/**
 * Page side of the protocol. Latest wins: at most one job of a kind is with the worker and one
 * waits, so a fast hand never fills the queue; the one overtaken is told to stop.
 */
export function jobsOver<T extends JobTable>(port: Port<ToWorker<T>, FromWorker>): Jobs<T> {
	const lanes = new Map<string, Lane>();
	const laneOf = (kind: string) => {
		const lane = lanes.get(kind) ?? { inHand: null, waiting: null };
		lanes.set(kind, lane);
		return lane;
	};
	const cancelInWorker = (id: number) => port.postMessage({ type: 'cancel', id });

	const hand = (lane: Lane, pending: Pending) => {
		lane.inHand = pending;
		port.postMessage(pending.message as ToWorker<T>);
	};
	const supersede = (lane: Lane) => {
		lane.waiting?.settle(fail({ reason: 'superseded' }));
		lane.waiting = null;
		if (!lane.inHand) return;
		lane.inHand.settle(fail({ reason: 'superseded' }));
		cancelInWorker(lane.inHand.id);
	};
	const cancel = (lane: Lane, pending: Pending) => {
		if (lane.waiting === pending) lane.waiting = null;
		else if (lane.inHand === pending) cancelInWorker(pending.id);
		pending.settle(fail({ reason: 'cancelled' }));
	};
	const next = (lane: Lane) => {
		const { waiting } = lane;
		lane.inHand = lane.waiting = null;
		if (waiting) hand(lane, waiting);
	};

	port.addEventListener('message', ({ data }) => {
		const lane = [...lanes.values()].find(({ inHand }) => inHand?.id === data.id);
		if (!lane?.inHand) return;
		if (data.type === 'progress') return lane.inHand.onProgress?.(data.share);
		lane.inHand.settle(resultOf(data));
		next(lane);
	});

	const abandon = (message: string) => {
		for (const lane of lanes.values()) {
			lane.inHand?.settle(fail({ reason: 'failed', message }));
			lane.waiting?.settle(fail({ reason: 'failed', message }));
			lane.inHand = lane.waiting = null;
		}
	};

	let lastId = 0;
	return {
		abandon,
		start(kind, payload, { onProgress } = {}) {
			const id = ++lastId;
			const lane = laneOf(kind);
			supersede(lane);
			const message = { type: 'start', id, kind, payload };
			const { pending, result } = pendingJob(id, kind, message, onProgress);
			if (lane.inHand) lane.waiting = pending;
			else hand(lane, pending);
			return { id, result, cancel: () => cancel(lane, pending) } as Job<T[typeof kind]['value']>;
		}
	};
}

type Ending = Exclude<FromWorker, { type: 'progress' }>;

const resultOf = (ending: Ending): Result<unknown, JobEnd> => {
	switch (ending.type) {
		case 'done':
			return ok(ending.value);
		case 'cancelled':
			return fail({ reason: 'cancelled' });
		case 'failed':
			return fail({ reason: 'failed', message: ending.message });
	}
};

/** A job that settles once; progress after that is not passed on. */
function pendingJob(
	id: number,
	kind: string,
	message: unknown,
	onProgress: ((share: number) => void) | undefined
) {
	let settled = false;
	let resolve: (result: Result<unknown, JobEnd>) => void = () => {};
	const result = new Promise<Result<unknown, JobEnd>>((keep) => (resolve = keep));
	const settle = (end: Result<unknown, JobEnd>) => {
		settled = true;
		resolve(end);
	};
	const report = (share: number) => {
		if (!settled) onProgress?.(share);
	};
	return { pending: { id, kind, message, settle, onProgress: report } satisfies Pending, result };
}
