import { holdsVersion } from '$lib/server/http/known-version';
import { handled, onlyMethods } from '$lib/server/http/handled';
import { shapeIndex } from '$lib/server/queries/shape-index';
import type { RequestHandler } from './$types';

/** Every shape in brief, for searching in the browser: rows as `ShapeIndexRow` has them. */
export const GET: RequestHandler = (event) =>
	handled(event, async () => {
		const { tag, json, gzipped } = await shapeIndex();
		const headers = {
			etag: `"${tag}"`,
			'cache-control': 'public, max-age=3600',
			vary: 'accept-encoding'
		};
		if (holdsVersion(event.request, tag)) return new Response(null, { status: 304, headers });
		const zipped = /\bgzip\b/.test(event.request.headers.get('accept-encoding') ?? '');
		return new Response(zipped ? gzipped : json, {
			headers: {
				...headers,
				'content-type': 'application/json; charset=utf-8',
				...(zipped ? { 'content-encoding': 'gzip' } : {})
			}
		});
	});
export const fallback = onlyMethods('GET');
