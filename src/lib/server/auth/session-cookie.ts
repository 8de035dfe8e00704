import type { RequestEvent } from '@sveltejs/kit';

/** Whether a request carries a session, good or bad. */
export const hasSessionCookie = ({ cookies }: Pick<RequestEvent, 'cookies'>): boolean =>
	cookies.getAll().some(({ name }) => name.includes('authjs.session-token'));
