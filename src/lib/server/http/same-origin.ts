import type { Handle, RequestEvent } from '@sveltejs/kit';
import { hasSessionCookie } from '../auth/session-cookie';
import { refused, type Refusal } from './refusal';
import { dropUnreadBody } from './unread-body';

const writes = new Set(['POST', 'PUT', 'PATCH', 'DELETE']);

/** What a page of another site can send without asking this one first. */
const formTypes = new Set([
	'application/x-www-form-urlencoded',
	'multipart/form-data',
	'text/plain',
	'application/x-sveltekit-formdata'
]);

const isForm = ({ headers }: Request) => {
	const [type = ''] = (headers.get('content-type') ?? '').split(';', 1);
	return formTypes.has(type.trim().toLowerCase());
};

const otherOrigin: Refusal = {
	status: 403,
	code: 'other_origin',
	message: 'Changes are taken from this site’s own pages only.'
};

type Asked = Pick<RequestEvent, 'request' | 'url' | 'route' | 'cookies'>;

/**
 * Whether a request may come from a page of another site that acts in a visitor's name: a form sent
 * to a page, or a write to the API that carries a session. The API without a session takes callers
 * from anywhere. Programs send no Origin; a form always must have the right one.
 */
export const isForeignWrite = (event: Asked): boolean => {
	const { request, url, route } = event;
	if (!writes.has(request.method)) return false;
	const origin = request.headers.get('origin');
	if (origin === url.origin) return false;
	const form = isForm(request);
	if (!route.id?.startsWith('/api/v1/')) return form;
	return hasSessionCookie(event) && (form || origin !== null);
};

/** Refuses foreign writes; stands in for the framework's own check, which knows no API. */
export const handleSameOrigin: Handle = async ({ event, resolve }) => {
	if (!isForeignWrite(event)) return resolve(event);
	await dropUnreadBody(event.request);
	return event.route.id?.startsWith('/api/v1/')
		? refused(otherOrigin)
		: new Response(otherOrigin.message, {
				status: 403,
				headers: { 'content-type': 'text/plain; charset=utf-8' }
			});
};
