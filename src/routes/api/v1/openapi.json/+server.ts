import { openApiDocument } from '$lib/api/openapi';
import { onlyMethods } from '$lib/server/http/handled';
import type { RequestHandler } from './$types';

let json: string | undefined;

export const GET: RequestHandler = () => {
	json ??= JSON.stringify(openApiDocument());
	return new Response(json, {
		headers: { 'content-type': 'application/json; charset=utf-8', 'cache-control': 'max-age=3600' }
	});
};
export const fallback = onlyMethods('GET');
