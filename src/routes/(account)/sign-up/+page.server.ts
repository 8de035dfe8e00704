import { fail, redirect } from '@sveltejs/kit';
import { signUpForm } from '$lib/server/auth/account-forms';
import { formFields } from '$lib/server/auth/form-fields';
import { nextPage } from '$lib/server/auth/next-page';
import { makeFirm } from '$lib/server/auth/make-firm';
import { signInWithPassword } from '$lib/server/auth/with-password';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals, url }) => {
	const next = url.searchParams.get('next');
	if (locals.person) redirect(303, nextPage(next));
	return { next: next ? nextPage(next) : '' };
};

export const actions: Actions = {
	default: async (event) => {
		const form = await formFields(event.request, signUpForm);
		if (!form.ok) return fail(400, { ...form.error, message: null });
		const { password: _password, ...given } = form.value;
		const made = await makeFirm(form.value, event.getClientAddress());
		if (!made.ok) return fail(made.error.status, { ...made.error, given });
		const { email, password, next } = form.value;
		await signInWithPassword(event, { email, password, next: nextPage(next) });
		redirect(303, '/sign-in');
	}
};
