import { may } from '$lib/server/rights/may';
import type { LayoutServerLoad } from './$types';

/** Whether the person may put what they make here on their firm's Rack. */
export const load: LayoutServerLoad = ({ locals }) => ({
	mayCreate: may(locals.person, 'section.create')
});
