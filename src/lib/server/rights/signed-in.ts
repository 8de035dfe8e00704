import type { RequestEvent } from '@sveltejs/kit';
import { fail, ok, type Result } from '../../engine/result';
import type { Refusal } from '../http/refusal';
import type { Person } from './person';

const notSignedIn: Refusal = {
	status: 401,
	code: 'not_signed_in',
	message: 'Sign in to use your firm’s Rack. Computing needs no account.'
};

const otherOrigin: Refusal = {
	status: 403,
	code: 'other_origin',
	message: 'Changes are taken from this site’s own pages only.'
};

const isOwnOrigin = ({ request, url }: RequestEvent) => {
	const origin = request.headers.get('origin');
	return origin === null || origin === url.origin;
};

/** Who asks, for routes that only read. */
export const reader = (event: RequestEvent): Result<Person, Refusal> =>
	event.locals.person ? ok(event.locals.person) : fail(notSignedIn);

/** Who asks, for routes that change something: from this site's own pages, or no page at all. */
export const writer = (event: RequestEvent): Result<Person, Refusal> =>
	isOwnOrigin(event) ? reader(event) : fail(otherOrigin);
