import { refused } from '$lib/server/http/refusal';
import type { RequestHandler } from './$types';

/** What no other route answers, in the same shape as every refusal. */
export const fallback: RequestHandler = ({ params }) =>
	refused({
		status: 404,
		code: 'unknown_route',
		message: `There is no /api/v1/${params.rest}. What there is stands at /api.`
	});
