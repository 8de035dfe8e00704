import { describe, expect, it, vi } from 'vitest';
import { jobsOver } from './jobs';
import type { FromWorker, JobHandlers, Port, ToWorker } from './protocol';
import { serveJobs } from './serve';

type Table = {
	double: { payload: number; value: number };
	count: { payload: { to: number }; value: number };
	fall: { payload: null; value: never };
};

/** Two ports joined back to back: what goes in at one comes out at the other a little later. */
const joinedPorts = () => {
	const sent: ToWorker<Table>[] = [];
	const listeners = { page: [], worker: [] } as {
		page: ((event: { data: FromWorker }) => void)[];
		worker: ((event: { data: ToWorker<Table> }) => void)[];
	};
	const page: Port<ToWorker<Table>, FromWorker> = {
		postMessage: (data) => {
			sent.push(data);
			setTimeout(() => listeners.worker.forEach((listen) => listen({ data })), 0);
		},
		addEventListener: (_, listener) => void listeners.page.push(listener)
	};
	const worker: Port<FromWorker, ToWorker<Table>> = {
		postMessage: (data) =>
			void setTimeout(() => listeners.page.forEach((listen) => listen({ data })), 0),
		addEventListener: (_, listener) => void listeners.worker.push(listener)
	};
	return { page, worker, sent };
};

const handlers: JobHandlers<Table> = {
	double: (payload) => payload * 2,
	count: async ({ to }, { progress, goOn }) => {
		let reached = 0;
		while (reached < to && (await goOn())) progress(++reached / to);
		return reached;
	},
	fall: () => {
		throw new Error('No such state.');
	}
};

const started = () => {
	const ports = joinedPorts();
	serveJobs(ports.worker, handlers);
	return { ...ports, jobs: jobsOver(ports.page) };
};

describe('jobs in a worker', () => {
	it('gives a job’s value', async () => {
		const { jobs } = started();
		expect(await jobs.start('double', 21).result).toEqual({ ok: true, value: 42 });
	});

	it('reports progress up to the whole', async () => {
		const onProgress = vi.fn();
		await started().jobs.start('count', { to: 4 }, { onProgress }).result;
		expect(onProgress.mock.calls.flat()).toEqual([0.25, 0.5, 0.75, 1]);
	});

	it('lets the latest of a kind win', async () => {
		const { jobs, sent } = started();
		const all = [1, 2, 3, 4].map((value) => jobs.start('double', value));
		const ends = await Promise.all(all.map((job) => job.result));
		expect(ends.slice(0, 3).map((end) => !end.ok && end.error.reason)).toEqual(
			Array(3).fill('superseded')
		);
		expect(ends[3]).toEqual({ ok: true, value: 8 });
		expect(sent.filter((message) => message.type === 'start')).toHaveLength(2);
	});

	it('keeps different kinds apart', async () => {
		const { jobs } = started();
		const [slow, quick] = [jobs.start('count', { to: 3 }), jobs.start('double', 1)];
		expect(await quick.result).toEqual({ ok: true, value: 2 });
		expect(await slow.result).toEqual({ ok: true, value: 3 });
	});

	it('stops a cancelled job, in the worker too, and runs the next', async () => {
		const { jobs } = started();
		const onProgress = vi.fn();
		const endless = jobs.start('count', { to: 1e9 }, { onProgress });
		await vi.waitUntil(() => onProgress.mock.calls.length > 2);
		endless.cancel();
		expect(await endless.result).toEqual({ ok: false, error: { reason: 'cancelled' } });
		const calls = onProgress.mock.calls.length;
		expect(await jobs.start('count', { to: 2 }).result).toEqual({ ok: true, value: 2 });
		expect(onProgress.mock.calls.length).toBe(calls);
	});

	it('never sends a job that was cancelled while it waited', async () => {
		const { jobs, sent } = started();
		jobs.start('count', { to: 50 });
		const waiting = jobs.start('count', { to: 1 });
		waiting.cancel();
		expect(await waiting.result).toEqual({ ok: false, error: { reason: 'cancelled' } });
		await new Promise((resolve) => setTimeout(resolve, 20));
		expect(sent.filter(({ id }) => id === waiting.id)).toEqual([]);
	});

	it('tells of a failure and goes on with the next job', async () => {
		const { jobs } = started();
		expect(await jobs.start('fall', null).result).toEqual({
			ok: false,
			error: { reason: 'failed', message: 'No such state.' }
		});
		expect(await jobs.start('double', 2).result).toEqual({ ok: true, value: 4 });
	});

	it('ends every job when the worker itself breaks', async () => {
		const { jobs } = started();
		const job = jobs.start('count', { to: 1e9 });
		jobs.abandon('The worker stopped.');
		expect(await job.result).toEqual({
			ok: false,
			error: { reason: 'failed', message: 'The worker stopped.' }
		});
		job.cancel();
	});
});
