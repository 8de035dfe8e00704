import { analyseAnswer } from '$lib/server/http/compute/analyse-answer';
import { computeRoute } from '$lib/server/http/compute/compute-route';
import { onlyMethods } from '$lib/server/http/handled';

export const POST = computeRoute(analyseAnswer);
export const fallback = onlyMethods('POST');
