import { describe, expect, it } from 'vitest';
import { limits } from '../../api/limits';
import { jsonBody } from './body';

const request = (body: string, type: string | null = 'application/json') =>
	new Request('http://localhost/', {
		method: 'POST',
		body: new TextEncoder().encode(body),
		headers: type === null ? {} : { 'content-type': type }
	});
const statusOf = async (body: string, type?: string | null) => {
	const result = await jsonBody(request(body, type));
	return result.ok ? 200 : result.error.status;
};

describe('jsonBody', () => {
	it('reads JSON, with or without a charset', async () => {
		expect(await jsonBody(request('{"a":1}'))).toEqual({ ok: true, value: { a: 1 } });
		expect(await statusOf('{}', 'application/json; charset=utf-8')).toBe(200);
	});

	it('answers 415 to another type or none', async () => {
		expect(await statusOf('{}', 'text/plain')).toBe(415);
		expect(await statusOf('{}', 'application/jsonish')).toBe(415);
		expect(await statusOf('{}', null)).toBe(415);
	});

	it('answers 400 to what is not JSON', async () => {
		expect(await statusOf('{"a":')).toBe(400);
		expect(await statusOf('')).toBe(400);
	});

	it('answers 413 to a body that is too large, counted in bytes', async () => {
		expect(await statusOf(`"${'a'.repeat(limits.body)}"`)).toBe(413);
		expect(await statusOf(`"${'é'.repeat(limits.body / 2)}"`)).toBe(413);
		expect(await statusOf(`"${'a'.repeat(limits.body - 2)}"`)).toBe(200);
	});
});
