import { expect, test } from 'vitest';
import { samePlaceAtOrigin } from './loopback';

const origin = 'http://localhost:3000';
const url = new URL(`${origin}/bench?s=abc`);

const asked = (host: string, { method = 'GET', accept = 'text/html,*/*' } = {}) =>
	samePlaceAtOrigin(new Request(url, { method, headers: { host, accept } }), url, origin);

test('a page asked for at 127.0.0.1 is found at the origin, path and query kept', () => {
	expect(asked('127.0.0.1:3000')).toBe('http://localhost:3000/bench?s=abc');
	expect(asked('[::1]:3000')).toBe('http://localhost:3000/bench?s=abc');
});

test('at the origin itself, at another port or another machine nothing happens', () => {
	for (const host of ['localhost:3000', '127.0.0.1:3001', '192.0.2.7:3000', 'sections.example'])
		expect(asked(host)).toBeNull();
});

test('calls that are no navigation are answered where they come in', () => {
	expect(asked('127.0.0.1:3000', { accept: 'application/json' })).toBeNull();
	expect(asked('127.0.0.1:3000', { method: 'POST' })).toBeNull();
});

test('an https origin is left to its proxy', () => {
	const request = new Request(url, { headers: { host: '127.0.0.1', accept: 'text/html' } });
	expect(samePlaceAtOrigin(request, url, 'https://localhost')).toBeNull();
});
