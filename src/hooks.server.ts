import { sequence } from '@sveltejs/kit/hooks';
import type { Handle, HandleServerError, ServerInit } from '@sveltejs/kit';
import { handleAuth } from '$lib/server/auth';
import { startUp } from '$lib/server/start-up';
import { handleRequestId } from '$lib/server/handle-request-id';
import { handleSameOrigin } from '$lib/server/http/same-origin';
import { handleLoopback } from '$lib/server/loopback';
import { log } from '$lib/server/log';

export const init: ServerInit = startUp;

export const handle: Handle = sequence(
	handleRequestId,
	handleSameOrigin,
	handleLoopback,
	handleAuth
);

export const handleError: HandleServerError = ({ error, event, status, message }) => {
	const id = event.locals.requestId;
	if (status !== 404)
		log.error({ err: error, status, method: event.request.method, route: event.route.id }, message);
	return { message, id };
};
