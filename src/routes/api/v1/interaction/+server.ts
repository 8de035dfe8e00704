import { computeRoute } from '$lib/server/http/compute/compute-route';
import { interactionAnswer } from '$lib/server/http/compute/interaction-answer';
import { onlyMethods } from '$lib/server/http/handled';

export const POST = computeRoute(interactionAnswer);
export const fallback = onlyMethods('POST');
