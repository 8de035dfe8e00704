import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { openPassingDatabase } from '../../scripts/lib/passing-database.js';
import { startInstanceOf, type Instance } from '../setup/instance';

let database: Awaited<ReturnType<typeof openPassingDatabase>>;
let instance: Instance;

beforeAll(async () => {
	database = await openPassingDatabase();
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

const visitor = () => status('/bench', { headers: { accept: 'text/html' } });

test('with its database killed the app serves the Bench and calculates, and recovers by itself', async () => {
	expect(await status('/api/v1/health')).toBe(200);
	await database.kill();
	expect(await status('/api/v1/health')).toBe(503);
	expect(await visitor()).toBe(200);
	expect(await analyse()).toBe(200);
	await database.revive();
	await expect.poll(() => status('/api/v1/health'), { timeout: 20_000 }).toBe(200);
	expect(await status('/api/v1/shapes?q=ipe+300')).toBe(200);
});
