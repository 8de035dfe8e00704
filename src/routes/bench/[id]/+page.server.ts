import { error, redirect } from '@sveltejs/kit';
import { sectionOf } from '$lib/server/queries/sections';
import type { PageServerLoad } from './$types';

/** A section of the firm's Rack; another firm's is as good as none. */
export const load: PageServerLoad = async ({ params, locals, url }) => {
	const { person } = locals;
	if (!person) redirect(303, `/sign-in?next=${encodeURIComponent(url.pathname)}`);
	const record = person.firm ? await sectionOf(person.firm.id, params.id) : null;
	if (!record) error(404, 'There is no such section on your Rack.');
	return { record };
};
