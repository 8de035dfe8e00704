import { unlockAnswer } from '$lib/server/http/compute/unlock-answer';
import { computeRoute } from '$lib/server/http/compute/compute-route';
import { onlyMethods } from '$lib/server/http/handled';

export const POST = computeRoute(unlockAnswer);
export const fallback = onlyMethods('POST');
