import type { Handle } from '@sveltejs/kit';
import { config } from './config';

const names = new Set(['localhost', '127.0.0.1', '[::1]']);

const isNavigation = ({ method, headers }: Request) =>
	method === 'GET' && (headers.get('accept') ?? '').includes('text/html');

/**
 * Where a page asked for under another name of this machine belongs, or null. Forms and sign-in
 * hold only under the origin, so a person who typed 127.0.0.1 for localhost is sent there.
 */
export const samePlaceAtOrigin = (request: Request, url: URL, origin: string): string | null => {
	const host = request.headers.get('host');
	const asked = host && URL.parse(`http://${host}`);
	const home = new URL(origin);
	if (!asked || !isNavigation(request) || asked.host === home.host) return null;
	if (home.protocol !== 'http:' || asked.port !== home.port) return null;
	if (!names.has(asked.hostname) || !names.has(home.hostname)) return null;
	return `${origin}${url.pathname}${url.search}`;
};

export const handleLoopback: Handle = ({ event, resolve }) => {
	const place = samePlaceAtOrigin(event.request, event.url, config().origin);
	return place
		? new Response(null, { status: 307, headers: { location: place, 'cache-control': 'no-store' } })
		: resolve(event);
};
