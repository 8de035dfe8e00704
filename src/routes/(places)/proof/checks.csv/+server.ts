import { handled, onlyMethods } from '$lib/server/http/handled';
import { proofCsv } from '$lib/server/proof/proof-csv';
import { proofAsked } from '$lib/server/proof/proof-view';
import type { RequestHandler } from './$types';

/** What the page shows under the same parameters, all pages of it. */
export const GET: RequestHandler = (event) =>
	handled(
		event,
		async () =>
			new Response(await proofCsv(proofAsked(event.url.searchParams)), {
				headers: {
					'content-type': 'text/csv; charset=utf-8',
					'content-disposition': 'attachment; filename="flangewright-proof.csv"'
				}
			})
	);
export const fallback = onlyMethods('GET');
