import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { openPassingDatabase } from '../../scripts/lib/passing-database.js';
import { startInstanceOf, type Instance } from '../setup/instance';
import { runSql } from '../setup/test-database';

let database: Awaited<ReturnType<typeof openPassingDatabase>>;
let instance: Instance;

beforeAll(async () => {
	database = await openPassingDatabase();
	await runSql(database.url, 'SET GLOBAL innodb_flush_log_at_trx_commit = 1');
	const env = { DATABASE_URL: database.url, COMPUTE_RATE_PER_MINUTE: '1000', LOG_LEVEL: 'warn' };
	instance = await startInstanceOf(inject('buildFolder'), env);
});

afterAll(async () => {
	await instance?.stop();
	await database?.release();
});

const status = async (path: string, init?: RequestInit) => {
	const answer = await fetch(instance.url + path, { ...init, signal: AbortSignal.timeout(15_000) });
	await answer.arrayBuffer();
	return answer.status;
};

const analyse = () =>
	status('/api/v1/analyse', {
		method: 'POST',
		headers: { 'content-type': 'application/json' },
		body: JSON.stringify({ section: { kind: 'round', d: 20, grade: 'S235' } })
	});

const page = { accept: 'text/html' };

/** The session cookie of someone of the demo firm. */
const signedIn = async () => {
	const answer = await fetch(`${instance.url}/sign-in?/password`, {
		method: 'POST',
		redirect: 'manual',
		headers: { ...page, origin: instance.url },
		body: new URLSearchParams({ email: 'maya@tarnbridge.example', password: 'tarn-bridge-demo' })
	});
	expect(answer.status).toBe(303);
	return answer.headers
		.getSetCookie()
		.map((cookie) => cookie.split(';')[0])
		.join('; ');
};

test('with its database killed the app serves the Bench and calculates, and recovers by itself', async () => {
	expect(await status('/api/v1/health')).toBe(200);
	const cookie = await signedIn();
	await database.kill();
	expect(await status('/api/v1/health')).toBe(503);
	expect(await status('/bench', { headers: page })).toBe(200);
	expect(await analyse()).toBe(200);
	const asPerson = await fetch(`${instance.url}/bench`, { headers: { ...page, cookie } });
	expect(asPerson.status).toBe(200);
	await database.revive();
	await expect.poll(() => status('/api/v1/health'), { timeout: 20_000 }).toBe(200);
	expect(await status('/api/v1/shapes?q=ipe+300')).toBe(200);
	expect(await status('/api/v1/sections', { headers: { cookie } })).toBe(200);
});
