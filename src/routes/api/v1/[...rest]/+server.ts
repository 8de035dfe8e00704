import { handled } from '$lib/server/http/handled';
import { refused } from '$lib/server/http/refusal';
import type { RequestHandler } from './$types';

/** What no other route answers, in the same shape as every refusal. */
export const fallback: RequestHandler = (event) =>
	handled(event, () =>
		refused({
			status: 404,
			code: 'unknown_route',
			message: `There is no /api/v1/${event.params.rest}. What there is stands at /api.`
		})
	);
