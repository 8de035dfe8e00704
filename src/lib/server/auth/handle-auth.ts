import type { Handle, RequestEvent } from '@sveltejs/kit';
import { config } from '../config';
import { authJs, foundStanding } from './auth-js';
import { personIn, wishedFirm } from './current-firm';
import { hasSessionCookie } from './session-cookie';

const personBehind = async (event: RequestEvent): Promise<App.Locals['person']> => {
	const session = await event.locals.auth();
	const standing = session ? foundStanding(event.locals) : undefined;
	return standing ? personIn(standing, wishedFirm(event.cookies)) : null;
};

/** A form that ends at the outside provider needs its origin allowed, on the sign-in page only. */
const allowIssuer = (response: Response): Response => {
	const { oidc } = config();
	const policy = response.headers.get('content-security-policy');
	if (oidc && policy)
		response.headers.set(
			'content-security-policy',
			policy.replace("form-action 'self'", `form-action 'self' ${new URL(oidc.issuer).origin}`)
		);
	return response;
};

const asVisitor: Handle = ({ event, resolve }) => {
	event.locals.auth = () => Promise.resolve(null);
	return resolve(event);
};

const asPerson: Handle = ({ event, resolve }) =>
	authJs.handle({
		event,
		resolve: async (same, options) => {
			same.locals.person = await personBehind(same);
			return resolve(same, options);
		}
	});

/**
 * Fills `locals.person` from the database and answers the sign-in routes under /auth. Requests
 * without a session cookie cost nothing.
 */
export const handleAuth: Handle = async (input) => {
	const { event } = input;
	event.locals.person = null;
	const isSignInRoute = event.url.pathname.startsWith('/auth/');
	const answer = await (hasSessionCookie(event) || isSignInRoute ? asPerson : asVisitor)(input);
	return event.url.pathname === '/sign-in' ? allowIssuer(answer) : answer;
};
