import { error, redirect } from '@sveltejs/kit';
import { sectionOf } from '$lib/server/queries/sections';
import { may } from '$lib/server/rights/may';
import type { PageServerLoad } from './$types';

/** A section of the firm's Rack; another firm's is as good as none. */
export const load: PageServerLoad = async ({ params, locals, url }) => {
	const { person } = locals;
	if (!person) redirect(303, `/sign-in?next=${encodeURIComponent(url.pathname)}`);
	const { firm } = person;
	const record = firm ? await sectionOf(firm.id, params.id) : null;
	if (!firm || !record) error(404, 'There is no such section on your Rack.');
	const { createdBy, status } = record;
	const subject = { firmId: firm.id, createdBy: createdBy.id, status };
	return { record, mayChange: may(person, 'section.update', subject) };
};
