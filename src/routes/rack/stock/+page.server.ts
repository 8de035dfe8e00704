import { firmInHand } from '$lib/server/firm/in-hand';
import type { PageServerLoad } from './$types';

/** The plate stock that proposals use: the firm's own, or the one shipped with the program. */
export const load: PageServerLoad = async ({ locals }) => ({
	firm: await firmInHand(locals.person)
});
