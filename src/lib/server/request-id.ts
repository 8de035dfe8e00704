import { AsyncLocalStorage } from 'node:async_hooks';
import { newId } from './db/ids';

const running = new AsyncLocalStorage<string>();

/** Id of the request being answered, if any. */
export const currentRequestId = (): string | undefined => running.getStore();

/** Runs work as part of the request of that id. */
export const withRequestId = <T>(id: string, work: () => T): T => running.run(id, work);

const sane = /^[\w.:-]{8,64}$/;

/** The id a caller sent along, when it is short and plain; else a new one. */
export const requestIdOf = (headers: Headers): string => {
	const sent = headers.get('x-request-id');
	return sent && sane.test(sent) ? sent : newId();
};
