import { redirect } from '@sveltejs/kit';

/** The product opens on the Bench. */
export const load = () => redirect(307, '/bench');
