import type { RequestEvent } from '@sveltejs/kit';
import { CredentialsSignin, type SvelteKitAuthConfig } from '@auth/sveltekit';
import Credentials from '@auth/sveltekit/providers/credentials';
import { z } from 'zod';
import { config } from '../config';
import { log } from '../log';
import { standingOf, type Standing } from '../queries/people';
import { endSessions } from '../queries/sessions';
import { adapter } from './adapter';
import { checkCredentials } from './sign-in';

const sessionDays = 30;

/** The attempt limit was reached; told apart from a wrong password. */
export class TooManyAttempts extends CredentialsSignin {
	override code = 'too_many';
}

const credentials = z.object({ email: z.string().max(254), password: z.string().max(1000) });

const passwordProvider = (event: RequestEvent) =>
	Credentials({
		credentials: { email: { type: 'email' }, password: { type: 'password' } },
		authorize: async (given) => {
			const parsed = credentials.safeParse(given);
			if (!parsed.success) return null;
			const { email, password } = parsed.data;
			const found = await checkCredentials(email, password, event.getClientAddress());
			if (found.ok) return { id: found.value.id, name: found.value.name, email };
			if (found.error === 'too_many') throw new TooManyAttempts();
			return null;
		}
	});

/** Present only when OIDC_ISSUER and its companions are set. */
const outsideProvider = () => {
	const { oidc } = config();
	return oidc ? [{ id: 'oidc', name: 'your firm', type: 'oidc' as const, ...oidc }] : [];
};

/** What the signed cookie says; whether it still holds is asked of the database each time. */
const sessionToken = z.object({ sub: z.string(), epoch: z.number().default(-1) });

/** The person whom a token stands for, unless signed out, switched off or gone since. */
const standingBehind = async (token: unknown, isNew: boolean): Promise<Standing | null> => {
	const parsed = sessionToken.safeParse(token);
	if (!parsed.success) return null;
	const standing = await standingOf(parsed.data.sub);
	if (!standing?.active) return null;
	return isNew || parsed.data.epoch === standing.sessionEpoch ? standing : null;
};

/** A wrong password or a cookie that is none: anybody can send these, they are no fault of ours. */
const isTheVisitors = (error: Error) =>
	error instanceof CredentialsSignin || error.name === 'JWTSessionError';

/** The settings of Auth.js for one request; `found` is told who is behind a valid session. */
export const authConfig = (
	event: RequestEvent,
	found: (standing: Standing) => void = () => undefined
): SvelteKitAuthConfig => ({
	adapter: adapter(),
	providers: [passwordProvider(event), ...outsideProvider()],
	session: { strategy: 'jwt', maxAge: sessionDays * 24 * 60 * 60 },
	secret: config().authSecret,
	trustHost: true,
	useSecureCookies: config().origin.startsWith('https:'),
	pages: { signIn: '/sign-in', signOut: '/sign-out', error: '/sign-in' },
	callbacks: {
		jwt: async ({ token, user, trigger }) => {
			const isNew = trigger === 'signIn' || trigger === 'signUp';
			const sub = user?.id ?? token.sub;
			const standing = await standingBehind({ ...token, sub }, isNew);
			if (!standing) return null;
			found(standing);
			return { sub: standing.id, epoch: standing.sessionEpoch };
		},
		session: ({ session }) => ({ expires: session.expires })
	},
	events: {
		signOut: async (message) => {
			const token = sessionToken.safeParse('token' in message ? message.token : null);
			if (token.success) await endSessions(token.data.sub, token.data.epoch);
		}
	},
	logger: {
		error: (error) => {
			const level = isTheVisitors(error) ? 'debug' : 'error';
			log[level]({ err: error }, 'sign-in failed');
		},
		warn: (code) => log.debug({ code }, 'sign-in warning'),
		debug: () => undefined
	}
});
