import { fail, redirect } from '@sveltejs/kit';
import { signInForm } from '$lib/server/auth/account-forms';
import { formFields } from '$lib/server/auth/form-fields';
import { nextPage } from '$lib/server/auth/next-page';
import type { SignInFault } from '$lib/server/auth/sign-in';
import { signInOutside, signInWithPassword } from '$lib/server/auth/with-password';
import { config } from '$lib/server/config';
import { demoForSignIn } from '$lib/server/seed/demo-for-sign-in';
import type { Actions, PageServerLoad } from './$types';

const sentences: Record<SignInFault, string> = {
	no_fit: 'E-mail and password do not belong together.',
	too_many: 'Too many attempts. Wait a quarter of an hour, or ask for a new password.'
};

export const load: PageServerLoad = async ({ locals, url }) => {
	const next = url.searchParams.get('next');
	if (locals.person) redirect(303, nextPage(next));
	return {
		next: next ? nextPage(next) : '',
		passwordIsNew: url.searchParams.has('reset'),
		outsideFailed: url.searchParams.has('error'),
		hasOutside: config().oidc !== null,
		demo: await demoForSignIn()
	};
};

export const actions: Actions = {
	password: async (event) => {
		const form = await formFields(event.request, signInForm);
		if (!form.ok) return fail(400, { ...form.error, message: null });
		const { email, password, next } = form.value;
		const fault = await signInWithPassword(event, { email, password, next: nextPage(next) });
		const status = fault === 'too_many' ? 429 : 400;
		return fail(status, { faults: {}, given: { email }, message: sentences[fault] });
	},
	outside: async (event) => {
		await signInOutside(event, nextPage(event.url.searchParams.get('next')));
	}
};
