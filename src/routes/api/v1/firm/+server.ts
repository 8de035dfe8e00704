import { firmSettingsRequest } from '$lib/api/firm-settings';
import { firmAnswer } from '$lib/server/firm/answers';
import { readFirm, updateFirm } from '$lib/server/firm/settings';
import { jsonBody } from '$lib/server/http/body';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { parsed } from '$lib/server/http/parse';
import { refused } from '$lib/server/http/refusal';
import { reader, writer } from '$lib/server/rights/signed-in';

export const GET = (event) =>
	handled(event, async () => {
		const person = reader(event);
		return person.ok ? firmAnswer(await readFirm(person.value)) : refused(person.error);
	});

/** Saves changes; 409 with both states when the settings have moved on since `version`. */
export const PATCH = (event) =>
	handled(event, async () => {
		const person = writer(event);
		if (!person.ok) return refused(person.error);
		const body = await jsonBody(event.request);
		if (!body.ok) return refused(body.error);
		const changes = parsed(firmSettingsRequest, body.value);
		if (!changes.ok) return refused(changes.error);
		return firmAnswer(await updateFirm(person.value, changes.value));
	});

export const fallback = onlyMethods('GET, PATCH');
