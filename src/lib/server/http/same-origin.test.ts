import { describe, expect, it } from 'vitest';
import { isForeignWrite } from './same-origin';

const here = 'https://sections.example';
const there = 'https://elsewhere.example';
const form = 'application/x-www-form-urlencoded';
const session = [{ name: '__Secure-authjs.session-token', value: 'x' }];

interface Sent {
	method?: string;
	origin?: string;
	type?: string;
	route?: string | null;
	cookies?: typeof session;
}
const foreign = ({ method = 'POST', origin, type, route = '/sign-in', cookies = [] }: Sent) =>
	isForeignWrite({
		request: new Request(here, {
			method,
			headers: {
				...(origin === undefined ? {} : { origin }),
				...(type === undefined ? {} : { 'content-type': type })
			}
		}),
		url: new URL(here),
		route: { id: route },
		cookies: { getAll: () => cookies }
	} as unknown as Parameters<typeof isForeignWrite>[0]);

describe('isForeignWrite', () => {
	it.each([form, `${form}; charset=utf-8`, 'Multipart/Form-Data; boundary=x', 'text/plain'])(
		'holds a form of another site off a page: %s',
		(type) => {
			expect(foreign({ type, origin: there })).toBe(true);
			expect(foreign({ type, origin: 'null' })).toBe(true);
			expect(foreign({ type })).toBe(true);
			expect(foreign({ type, origin: here })).toBe(false);
		}
	);

	it('takes an address that no route answers for a page', () => {
		expect(foreign({ type: form, origin: there, route: null })).toBe(true);
		expect(foreign({ type: form, origin: there, route: '/api' })).toBe(true);
	});

	it('lets everybody read, and compute without a session', () => {
		expect(foreign({ method: 'GET', origin: there, cookies: session })).toBe(false);
		const route = '/api/v1/analyse';
		expect(foreign({ route, origin: there, type: 'text/plain' })).toBe(false);
		expect(foreign({ route, origin: there, type: 'application/json' })).toBe(false);
	});

	it('holds another site off the API where a session goes with it', () => {
		const asked = { route: '/api/v1/sections', cookies: session };
		for (const method of ['POST', 'PUT', 'PATCH', 'DELETE'])
			expect(foreign({ ...asked, method, origin: there })).toBe(true);
		expect(foreign({ ...asked, type: form })).toBe(true);
		expect(foreign({ ...asked, type: 'application/json' })).toBe(false);
		expect(foreign({ ...asked, type: form, origin: here })).toBe(false);
	});
});
