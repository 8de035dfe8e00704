import type { FromWorker, JobContext, JobHandlers, JobTable, Port, ToWorker } from './protocol';

const nextTask = () => new Promise<void>((resolve) => setTimeout(resolve, 0));

const contextOf = (
	id: number,
	cancelled: ReadonlySet<number>,
	send: (message: FromWorker) => void
): JobContext => ({
	progress: (share) => {
		if (!cancelled.has(id)) send({ type: 'progress', id, share });
	},
	goOn: async () => {
		await nextTask();
		return !cancelled.has(id);
	}
});

const messageOf = (error: unknown) =>
	error instanceof Error ? error.message : 'The computation failed.';

/** Answers jobs that come in at `port`: worker side of the protocol. */
export function serveJobs<T extends JobTable>(
	port: Port<FromWorker, ToWorker<T>>,
	handlers: JobHandlers<T>
): void {
	const cancelled = new Set<number>();
	const running = new Set<number>();
	const send = (message: FromWorker) => port.postMessage(message);

	const run = async (id: number, kind: keyof T & string, payload: T[string]['payload']) => {
		running.add(id);
		try {
			const value = await handlers[kind](payload, contextOf(id, cancelled, send));
			send(cancelled.has(id) ? { type: 'cancelled', id } : { type: 'done', id, value });
		} catch (error) {
			send({ type: 'failed', id, message: messageOf(error) });
		}
		running.delete(id);
		cancelled.delete(id);
	};

	port.addEventListener('message', ({ data }) => {
		if (data.type === 'start') void run(data.id, data.kind, data.payload);
		else if (running.has(data.id)) cancelled.add(data.id);
	});
}
