import { preferencesCookie, preferencesFrom } from '$lib/units';
import type { LayoutServerLoad } from './$types';

/** Who is at the screen, and how they read figures, for the first paint of every page. */
export const load: LayoutServerLoad = ({ locals, cookies }) => ({
	person: locals.person ?? null,
	preferences: preferencesFrom(cookies.get(preferencesCookie))
});
