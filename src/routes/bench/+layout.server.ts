import { firmInHand } from '$lib/server/firm/in-hand';
import { may } from '$lib/server/rights/may';
import type { LayoutServerLoad } from './$types';

/** What the Bench knows of the person's firm, and whether they may put what they make on its Rack. */
export const load: LayoutServerLoad = async ({ locals }) => ({
	mayCreate: may(locals.person, 'section.create'),
	firm: await firmInHand(locals.person)
});
