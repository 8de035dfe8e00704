/** Messages between a page and a worker. One id is one job; nothing else ties them together. */

/** What a job takes and gives, by kind. */
export type JobTable = Record<string, { payload: unknown; value: unknown }>;

export type ToWorker<T extends JobTable> =
	| {
			[K in keyof T & string]: { type: 'start'; id: number; kind: K; payload: T[K]['payload'] };
	  }[keyof T & string]
	| { type: 'cancel'; id: number };

/** `share` from 0 to 1; `message` is safe to show. Exactly one of the last three ends a job. */
export type FromWorker =
	| { type: 'progress'; id: number; share: number }
	| { type: 'done'; id: number; value: unknown }
	| { type: 'failed'; id: number; message: string }
	| { type: 'cancelled'; id: number };

/** The little of `Worker` and `DedicatedWorkerGlobalScope` that is used; easy to put a fake in its place. */
export interface Port<Out, In> {
	postMessage(message: Out): void;
	addEventListener(type: 'message', listener: (event: { data: In }) => void): void;
}

/** What a running job may do besides computing. */
export interface JobContext {
	/** Reports how far it is, 0 to 1. */
	progress(share: number): void;
	/**
	 * Lets messages in. Resolves to false once the job has been cancelled: it should then end.
	 * Long jobs call it every few milliseconds.
	 */
	goOn(): Promise<boolean>;
}

/** One handler for each kind; it may answer at once or later. */
export type JobHandlers<T extends JobTable> = {
	[K in keyof T & string]: (
		payload: T[K]['payload'],
		context: JobContext
	) => T[K]['value'] | Promise<T[K]['value']>;
};

/** Why a job gave no value. */
export type JobEnd =
	{ reason: 'superseded' } | { reason: 'cancelled' } | { reason: 'failed'; message: string };
