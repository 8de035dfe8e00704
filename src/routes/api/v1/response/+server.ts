import { computeRoute } from '$lib/server/http/compute/compute-route';
import { responseAnswer } from '$lib/server/http/compute/response-answer';
import { onlyMethods } from '$lib/server/http/handled';

export const POST = computeRoute(responseAnswer);
export const fallback = onlyMethods('POST');
