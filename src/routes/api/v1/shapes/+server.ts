import { shapeQuerySchema } from '$lib/api/shapes';
import { answer } from '$lib/server/http/answer';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { parsed } from '$lib/server/http/parse';
import { refused } from '$lib/server/http/refusal';
import { listShapes } from '$lib/server/queries/shapes';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	handled(event, async () => {
		const query = parsed(shapeQuerySchema, Object.fromEntries(event.url.searchParams));
		return query.ok ? answer(await listShapes(query.value)) : refused(query.error);
	});
export const fallback = onlyMethods('GET');
