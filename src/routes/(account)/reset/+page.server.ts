import { fail, redirect } from '@sveltejs/kit';
import { resetForm } from '$lib/server/auth/account-forms';
import { resetStillWorks, setNewPassword } from '$lib/server/auth/forgotten';
import { formFields } from '$lib/server/auth/form-fields';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ url, setHeaders }) => {
	setHeaders({ 'referrer-policy': 'no-referrer', 'cache-control': 'no-store' });
	const token = url.searchParams.get('token') ?? '';
	return { token, works: await resetStillWorks(token) };
};

export const actions: Actions = {
	default: async (event) => {
		const form = await formFields(event.request, resetForm);
		if (!form.ok) return fail(400, { faults: form.error.faults });
		const { token, password } = form.value;
		if (!(await setNewPassword(token, password))) return fail(400, { faults: {} });
		redirect(303, '/sign-in?reset');
	}
};
