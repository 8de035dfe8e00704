import { error, text } from '@sveltejs/kit';
import { env } from '$env/dynamic/private';
import type { RequestHandler } from './$types';

const constants = new Map<number, string>();

function constantOf(size: number): string {
	const known = constants.get(size) ?? JSON.stringify({ constant: 'x'.repeat(size - 15) });
	constants.set(size, known);
	return known;
}

/**
 * For measuring only, and absent unless BENCH is 1: parses the body as every compute route must and
 * answers a constant of the asked size, so that what a computation adds can be told apart.
 */
export const POST: RequestHandler = async ({ request, url }) => {
	if (env.BENCH !== '1') error(404, 'Not found');
	await request.json();
	const size = Math.min(Math.max(Number(url.searchParams.get('size')) || 16, 16), 1_000_000);
	return text(constantOf(size), { headers: { 'content-type': 'application/json' } });
};
