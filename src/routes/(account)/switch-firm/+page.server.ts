import { fail, redirect } from '@sveltejs/kit';
import { switchFirmForm } from '$lib/server/auth/account-forms';
import { keepFirm } from '$lib/server/auth/current-firm';
import { formFields } from '$lib/server/auth/form-fields';
import { nextPage } from '$lib/server/auth/next-page';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = () => redirect(303, '/rack');

export const actions: Actions = {
	/** Takes another of the person's firms in hand. */
	default: async ({ request, locals, cookies }) => {
		const form = await formFields(request, switchFirmForm);
		if (!form.ok) return fail(400, form.error);
		const { firm, next } = form.value;
		const belongs = locals.person?.memberships.some((one) => one.firm.id === firm);
		if (belongs) keepFirm(cookies, firm);
		redirect(303, nextPage(next));
	}
};
