import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { errorSchema } from '$lib/api/error';
import { limits } from '$lib/api/limits';
import { startInstance, type Instance } from '../setup/instance';
import { call, post } from './call';

const flat = { kind: 'flat', b: 20, h: 100, grade: 'S355' };
const json = { 'content-type': 'application/json' };
const raw = (body: string, headers: Record<string, string> = json) =>
	call('/api/v1/analyse', { method: 'POST', headers, body });
const refusal = (answer: { status: number; body: unknown }) => ({
	status: answer.status,
	...errorSchema.parse(answer.body).error
});

describe('refusals', () => {
	it('400: a body that is not JSON', async () => {
		expect(refusal(await raw('{"section":'))).toMatchObject({
			status: 400,
			code: 'malformed_json'
		});
		expect(refusal(await raw(''))).toMatchObject({ status: 400, code: 'malformed_json' });
	});

	it('400: a section with faults, each named by its path', async () => {
		const section = { ...flat, b: '20', hh: 1 };
		const error = refusal(await post('/api/v1/analyse', { section }));
		expect(error).toMatchObject({ status: 400, code: 'invalid_section' });
		expect(error.issues?.map(({ path }) => path).sort()).toEqual(['section.b', 'section.hh']);
	});

	it('400: a thickness of nought, in the words of the field', async () => {
		const section = { kind: 'i', h: 300, b: 150, tw: 0, tf: 10, fabrication: 'welded', grade: 355 };
		const error = refusal(await post('/api/v1/analyse', { section }));
		expect(error).toMatchObject({ status: 400, code: 'invalid_section' });
		expect(error.issues?.[0]).toMatchObject({ path: 'section.tw' });
		expect(error.message).toMatch(/web thickness/i);
	});

	it('400: a number beyond what a double can hold', async () => {
		const error = refusal(await raw('{"section":{"kind":"flat","b":1e999,"h":10,"grade":355}}'));
		expect(error.issues?.[0]?.path).toBe('section.b');
	});

	it('400: a grade that is not known', async () => {
		const error = refusal(await post('/api/v1/analyse', { section: { ...flat, grade: 'S1000' } }));
		expect(error.issues?.[0]?.path).toBe('section.grade');
		expect(error.message).toContain('S1000');
	});

	it('400: more states than the limit, which the message names', async () => {
		const at = { curvature: Array<number>(limits.states + 1).fill(0) };
		const error = refusal(await post('/api/v1/response', { section: flat, at }));
		expect(error).toMatchObject({ status: 400, code: 'invalid_request' });
		expect(error.message).toContain(String(limits.states));
	});

	it('404: a shape that is not there, or a route', async () => {
		expect(refusal(await post('/api/v1/analyse', { shapeId: 'none' }))).toMatchObject({
			status: 404,
			code: 'unknown_shape'
		});
		expect(refusal(await call('/api/v1/nothing/here'))).toMatchObject({
			status: 404,
			code: 'unknown_route'
		});
	});

	it('405: another method, with the one that is answered', async () => {
		const answer = await call('/api/v1/analyse');
		expect(refusal(answer)).toMatchObject({ status: 405, code: 'method_not_allowed' });
		expect(answer.headers.get('allow')).toBe('POST');
	});

	it('413: a body that is too large', async () => {
		const section = { ...flat, grade: 'x'.repeat(limits.body) };
		for (const path of ['/api/v1/analyse', '/api/v1/response'])
			expect(refusal(await post(path, { section }))).toMatchObject({ status: 413 });
		expect(await post('/api/v1/analyse', { section: flat })).toMatchObject({ status: 200 });
	});

	it('415: another content type', async () => {
		const answer = await raw(JSON.stringify({ section: flat }), { 'content-type': 'text/csv' });
		expect(refusal(answer)).toMatchObject({ status: 415, code: 'unsupported_media_type' });
	});

	it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x'])(
		'415: what a form sends, %s, from anywhere',
		async (type) => {
			for (const path of ['/api/v1/analyse', '/api/v1/response'])
				for (const origin of [undefined, 'https://elsewhere.example']) {
					const headers = { 'content-type': type, ...(origin === undefined ? {} : { origin }) };
					const answer = await call(path, { method: 'POST', headers, body: 'a=b' });
					expect(refusal(answer)).toMatchObject({ status: 415, code: 'unsupported_media_type' });
				}
		}
	);

	it('403: a form that another site sends to a page', async () => {
		const sent = (origin: Record<string, string>) =>
			fetch(`${inject('baseUrl')}/sign-in?/password`, {
				...{ method: 'POST', redirect: 'manual' },
				headers: { accept: 'text/html', ...origin },
				body: new URLSearchParams({ email: 'nobody@firm.example', password: 'not the one' })
			});
		for (const origin of ['https://elsewhere.example', 'null'])
			expect((await sent({ origin })).status).toBe(403);
		expect((await sent({})).status).toBe(403);
		expect((await sent({ origin: inject('baseUrl') })).status).not.toBe(403);
	});

	it('403: a write that another site sends with a session', async () => {
		const headers = {
			...json,
			origin: 'https://elsewhere.example',
			cookie: 'authjs.session-token=anything'
		};
		for (const path of ['/api/v1/sections', '/api/v1/analyse'])
			expect(refusal(await call(path, { method: 'POST', headers, body: '{}' }))).toMatchObject({
				status: 403,
				code: 'other_origin'
			});
	});

	it('400: numbers that no steel section has, at once', async () => {
		const section = { ...flat, grade: { fy: 355, E: 1e308 } };
		expect(refusal(await post('/api/v1/analyse', { section })).issues?.[0]?.path).toBe(
			'section.grade.E'
		);
		const at = { strainPlanes: [{ e0: 0, ky: 1e308, kz: 0 }] };
		expect(refusal(await post('/api/v1/response', { section: flat, at }))).toMatchObject({
			status: 400,
			issues: [{ path: 'at.strainPlanes.0.ky' }]
		});
	});

	it('leaves the connection good for the next call when a large body was not wanted', async () => {
		const body = ' '.repeat(limits.body / 2);
		expect((await raw(body, { 'content-type': 'text/csv' })).status).toBe(415);
		expect((await call('/api/v1/nothing', { method: 'POST', headers: json, body })).status).toBe(
			404
		);
		expect((await call('/api/v1/shapes', { method: 'PUT', headers: json, body })).status).toBe(405);
		expect((await post('/api/v1/analyse', { section: flat })).status).toBe(200);
	});

	it('422: a version that the shape does not have', async () => {
		const answer = await post('/api/v1/analyse', { shapeId: 'en10365-ipe-300', version: 99 });
		expect(refusal(answer)).toMatchObject({ status: 422, code: 'unknown_version' });
	});

	it('keeps prototypes out of the way', async () => {
		const answer = await raw(
			'{"section":{"kind":"flat","b":20,"h":100,"grade":355,"__proto__":{"x":1}}}'
		);
		expect(answer.status).toBeLessThan(500);
		const parts = { constructor: 'S355' };
		const other = await post('/api/v1/analyse', { section: { ...flat, partGrades: parts } });
		expect(refusal(other)).toMatchObject({ status: 400, code: 'invalid_section' });
	});
});

describe('the rate of anonymous calls', () => {
	let limited: Instance;
	beforeAll(async () => {
		limited = await startInstance({ COMPUTE_RATE_PER_MINUTE: '3' });
	});
	afterAll(() => limited.stop());

	it('429: says how long to wait once the minute is used up', async () => {
		const body = JSON.stringify({ section: flat });
		const statuses: number[] = [];
		for (let i = 0; i < 8; i++) {
			const response = await fetch(`${limited.url}/api/v1/analyse`, {
				...{ method: 'POST', headers: json, body }
			});
			statuses.push(response.status);
			if (response.status !== 429) continue;
			expect(Number(response.headers.get('retry-after'))).toBeGreaterThan(0);
			expect(errorSchema.parse(await response.json()).error.message).toContain('3 calculations');
		}
		expect(statuses[0]).toBe(200);
		expect(statuses.at(-1)).toBe(429);
		expect((await fetch(`${limited.url}/api/v1/shapes?pageSize=1`)).status).toBe(200);
	});
});
