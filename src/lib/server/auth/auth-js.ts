import { SvelteKitAuth } from '@auth/sveltekit';
import type { Standing } from '../queries/people';
import { authConfig } from './auth-config';

const found = new WeakMap<App.Locals, Standing>();

/** Auth.js, set up anew for each request. */
export const authJs = SvelteKitAuth((event) =>
	Promise.resolve(authConfig(event, (standing) => found.set(event.locals, standing)))
);

/** Who is behind the session of this request; known once `locals.auth()` has been awaited. */
export const foundStanding = (locals: App.Locals): Standing | undefined => found.get(locals);
