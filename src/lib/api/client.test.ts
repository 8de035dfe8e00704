import { describe, expect, it } from 'vitest';
import { get, post } from './client';

const answering =
	(status: number, body: string): typeof fetch =>
	() =>
		Promise.resolve(new Response(body, { status }));

describe('client', () => {
	it('gives the answer as a value', async () => {
		const result = await post<{ a: number }>('/x', {}, { fetch: answering(200, '{"a":1}') });
		expect(result).toEqual({ ok: true, value: { a: 1 } });
	});

	it('sends JSON and says so', async () => {
		const seen: RequestInit[] = [];
		const fetcher: typeof fetch = (_, init) => {
			seen.push(init ?? {});
			return Promise.resolve(Response.json({}));
		};
		await post('/x', { tw: 8 }, { fetch: fetcher });
		expect(seen[0]).toMatchObject({ method: 'POST', body: '{"tw":8}' });
		expect(seen[0]?.headers).toMatchObject({ 'content-type': 'application/json' });
	});

	it('passes on what the server refuses, with its status', async () => {
		const body = '{"error":{"code":"invalid_section","message":"No.","issues":[]}}';
		expect(await post('/x', {}, { fetch: answering(400, body) })).toEqual({
			ok: false,
			error: { status: 400, code: 'invalid_section', message: 'No.', issues: [] }
		});
	});

	it('has words for an answer that has none', async () => {
		const result = await get('/x', { fetch: answering(502, '<html>') });
		expect(!result.ok && result.error.message).toContain('502');
	});

	it('tells a call that was stopped from a server that is away', async () => {
		const away: typeof fetch = () => Promise.reject(new TypeError('fetch failed'));
		const unreachable = await get('/x', { fetch: away });
		expect(!unreachable.ok && unreachable.error.code).toBe('unreachable');
		const stop = new AbortController();
		stop.abort();
		const aborted = await get('/x', { fetch: away, signal: stop.signal });
		expect(!aborted.ok && aborted.error.code).toBe('aborted');
	});
});
