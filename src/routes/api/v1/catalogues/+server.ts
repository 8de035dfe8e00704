import { answer } from '$lib/server/http/answer';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { listCatalogues } from '$lib/server/queries/catalogues';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	handled(event, async () => {
		const items = await listCatalogues();
		return answer({ items, total: items.length, page: 1, pageSize: items.length });
	});
export const fallback = onlyMethods('GET');
