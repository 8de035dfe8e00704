import { updateSectionRequest } from '$lib/api/sections';
import { jsonBody } from '$lib/server/http/body';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { parsed } from '$lib/server/http/parse';
import { refused } from '$lib/server/http/refusal';
import { reader, writer } from '$lib/server/rights/signed-in';
import { sectionAnswer } from '$lib/server/sections/answers';
import { updateSection } from '$lib/server/sections/changing';
import { readSection } from '$lib/server/sections/reading';
import { deleteSection } from '$lib/server/sections/removing';

export const GET = (event) =>
	handled(event, async () => {
		const person = reader(event);
		if (!person.ok) return refused(person.error);
		return sectionAnswer(await readSection(person.value, event.params.id));
	});

/** Saves changes; 409 with both states when the section has moved on since `version`. */
export const PATCH = (event) =>
	handled(event, async () => {
		const person = writer(event);
		if (!person.ok) return refused(person.error);
		const body = await jsonBody(event.request);
		if (!body.ok) return refused(body.error);
		const changes = parsed(updateSectionRequest, body.value);
		if (!changes.ok) return refused(changes.error);
		return sectionAnswer(await updateSection(person.value, event.params.id, changes.value));
	});

/** Takes the section off the Rack; POST to its `restore` brings it back. */
export const DELETE = (event) =>
	handled(event, async () => {
		const person = writer(event);
		if (!person.ok) return refused(person.error);
		return sectionAnswer(await deleteSection(person.value, event.params.id));
	});

export const fallback = onlyMethods('GET, PATCH, DELETE');
