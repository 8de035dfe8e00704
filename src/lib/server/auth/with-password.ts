import { isRedirect, redirect, type RequestEvent } from '@sveltejs/kit';
import { AuthError } from '@auth/sveltekit';
import { TooManyAttempts } from './auth-config';
import { authJs } from './auth-js';
import type { SignInFault } from './sign-in';

/** The request that Auth.js reads: the same headers, and these fields alone. */
const requestWith = ({ request }: RequestEvent, fields: Record<string, string>): Request => {
	const headers = new Headers(request.headers);
	headers.delete('content-length');
	headers.set('content-type', 'application/x-www-form-urlencoded');
	return new Request(request.url, { method: 'POST', headers, body: new URLSearchParams(fields) });
};

const signInBy = async (event: RequestEvent, fields: Record<string, string>): Promise<void> => {
	await authJs.signIn({ ...event, request: requestWith(event, fields) });
};

/** Signs in and redirects to `next`, or says why not. Throws the redirect, as Kit wants it. */
export const signInWithPassword = async (
	event: RequestEvent,
	{ email, password, next }: { email: string; password: string; next: string }
): Promise<SignInFault> => {
	try {
		await signInBy(event, { providerId: 'credentials', email, password, redirectTo: next });
	} catch (error) {
		if (isRedirect(error)) redirect(303, error.location);
		if (error instanceof TooManyAttempts) return 'too_many';
		if (error instanceof AuthError) return 'no_fit';
		throw error;
	}
	return 'no_fit';
};

/** Sends the browser to the firm's own sign-in provider. */
export const signInOutside = (event: RequestEvent, next: string): Promise<void> =>
	signInBy(event, { providerId: 'oidc', redirectTo: next });
