import { isHttpError, isRedirect, type RequestEvent } from '@sveltejs/kit';
import { isDatabaseAway } from '../db/failure';
import { log } from '../log';
import { refused, type Refusal } from './refusal';
import { dropUnreadBody } from './unread-body';

const broken = (error: unknown, id: string) => {
	log.error({ err: error }, 'An API call failed');
	const message = `Something went wrong on our side. It is kept in the log under ${id}.`;
	return Response.json({ error: { code: 'internal', message, id } }, { status: 500 });
};

const databaseAway = (error: unknown, id: string) => {
	log.error({ err: error }, 'The database is away');
	const message =
		'The shapes cannot be reached at the moment. Try again soon; calculations with a section of your own still work.';
	return Response.json({ error: { code: 'database_away', message, id } }, { status: 503 });
};

/**
 * Runs the work of an API route. Whatever it throws by mistake is logged and answered as 500 with
 * the id of the request and nothing internal.
 */
export const handled = async (
	event: RequestEvent,
	work: () => Promise<Response> | Response
): Promise<Response> => {
	try {
		return await work();
	} catch (error) {
		if (isRedirect(error)) throw error;
		if (isHttpError(error) && error.status < 500)
			return Response.json(
				{ error: { code: `http_${error.status}`, message: error.body.message } },
				{ status: error.status }
			);
		if (isDatabaseAway(error)) return databaseAway(error, event.locals.requestId);
		return broken(error, event.locals.requestId);
	} finally {
		await dropUnreadBody(event.request);
	}
};

const notAllowed = (method: string, allowed: string): Refusal => ({
	status: 405,
	code: 'method_not_allowed',
	message: `${method} is not answered here; use ${allowed}.`,
	headers: { allow: allowed }
});

/** For the `fallback` of a route: 405 that says what is answered. */
export const onlyMethods = (allowed: string) => (event: RequestEvent) =>
	handled(event, () => refused(notAllowed(event.request.method, allowed)));
