import { handled, onlyMethods } from '$lib/server/http/handled';
import { refused } from '$lib/server/http/refusal';
import { writer } from '$lib/server/rights/signed-in';
import { sectionAnswer } from '$lib/server/sections/answers';
import { restoreSection } from '$lib/server/sections/removing';

/** Puts a deleted section back on the Rack. */
export const POST = (event) =>
	handled(event, async () => {
		const person = writer(event);
		if (!person.ok) return refused(person.error);
		return sectionAnswer(await restoreSection(person.value, event.params.id));
	});

export const fallback = onlyMethods('POST');
