import { fail } from '@sveltejs/kit';
import { forgotForm } from '$lib/server/auth/account-forms';
import { requestReset } from '$lib/server/auth/forgotten';
import { formFields } from '$lib/server/auth/form-fields';
import { config } from '$lib/server/config';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = () => ({ mailStaysHere: config().smtpUrl === null });

export const actions: Actions = {
	default: async (event) => {
		const form = await formFields(event.request, forgotForm);
		if (!form.ok) return fail(400, form.error);
		requestReset(form.value.email, event.getClientAddress());
		return { sentTo: form.value.email };
	}
};
