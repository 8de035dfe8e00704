import { createSectionRequest, sectionListQuery } from '$lib/api/sections';
import { jsonBody } from '$lib/server/http/body';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { parsed } from '$lib/server/http/parse';
import { refused } from '$lib/server/http/refusal';
import { listSections } from '$lib/server/queries/sections';
import { may } from '$lib/server/rights/may';
import { reader, writer } from '$lib/server/rights/signed-in';
import { privateAnswer, sectionAnswer } from '$lib/server/sections/answers';
import { notAllowed } from '$lib/server/sections/refusals';
import { createSection } from '$lib/server/sections/saving';

/** The sections on the Rack of the firm in hand. */
export const GET = (event) =>
	handled(event, async () => {
		const person = reader(event);
		if (!person.ok) return refused(person.error);
		const { firm, role } = person.value;
		if (!firm || !may(person.value, 'rack.read')) return refused(notAllowed('section.read', role));
		const query = parsed(sectionListQuery, Object.fromEntries(event.url.searchParams));
		if (!query.ok) return refused(query.error);
		return privateAnswer(await listSections(firm.id, query.value));
	});

/** Puts a section on the Rack. */
export const POST = (event) =>
	handled(event, async () => {
		const person = writer(event);
		if (!person.ok) return refused(person.error);
		const body = await jsonBody(event.request);
		if (!body.ok) return refused(body.error);
		const section = parsed(createSectionRequest, body.value);
		if (!section.ok) return refused(section.error);
		return sectionAnswer(await createSection(person.value, section.value), 201);
	});

export const fallback = onlyMethods('GET, POST');
