import { proofQuerySchema } from '$lib/api/proof';
import { answer } from '$lib/server/http/answer';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { parsed } from '$lib/server/http/parse';
import { refused } from '$lib/server/http/refusal';
import { listProof } from '$lib/server/proof/proof-list';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	handled(event, async () => {
		const query = parsed(proofQuerySchema, Object.fromEntries(event.url.searchParams));
		return query.ok ? answer(await listProof(query.value)) : refused(query.error);
	});
export const fallback = onlyMethods('GET');
