import { isRedirect, redirect } from '@sveltejs/kit';
import { authJs } from '$lib/server/auth/auth-js';
import { forgetFirm } from '$lib/server/auth/current-firm';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals }) => {
	if (!locals.person) redirect(303, '/sign-in');
};

export const actions: Actions = {
	/** Ends every session of the person, so that a copied cookie is dead too. */
	default: async (event) => {
		forgetFirm(event.cookies);
		try {
			await authJs.signOut(event);
		} catch (error) {
			if (!isRedirect(error)) throw error;
		}
		redirect(303, '/bench');
	}
};
