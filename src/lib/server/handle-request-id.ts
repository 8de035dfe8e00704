import type { Handle } from '@sveltejs/kit';
import { log } from './log';
import { requestIdOf, withRequestId } from './request-id';

const answerLine = (event: Parameters<Handle>[0]['event'], status: number, started: number) => {
	const line = {
		method: event.request.method,
		route: event.route.id,
		path: event.url.pathname,
		status,
		ms: Math.round((performance.now() - started) * 10) / 10
	};
	if (status >= 500) log.error(line, 'answered');
	else log.debug(line, 'answered');
};

/** Gives each request its id: in locals, in every log line and in the answer's header. */
export const handleRequestId: Handle = ({ event, resolve }) => {
	const started = performance.now();
	const id = requestIdOf(event.request.headers);
	event.locals.requestId = id;
	return withRequestId(id, async () => {
		const response = await resolve(event);
		response.headers.set('x-request-id', id);
		answerLine(event, response.status, started);
		return response;
	});
};
