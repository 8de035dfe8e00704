import { createPool, type Pool } from 'mysql2/promise';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { windowStore } from '../../src/lib/server/rate-limit/window-store';
import { startInstance, type Instance } from '../setup/instance';

const flat = { section: { kind: 'flat', b: 10, h: 100, grade: 'S355' } };

const analyse = ({ url }: Instance) =>
	fetch(`${url}/api/v1/analyse`, {
		method: 'POST',
		headers: { 'content-type': 'application/json' },
		body: JSON.stringify(flat)
	});

let pool: Pool;
let pair: Instance[] = [];

beforeAll(async () => {
	pool = createPool({ uri: inject('databaseUrl'), timezone: 'Z' });
	await pool.query('DELETE FROM rate_windows');
	const env = {
		COMPUTE_RATE_PER_MINUTE: '6',
		AUTH_SECRET: 'one secret for both, thirty-two or more'
	};
	pair = await Promise.all([startInstance(env), startInstance(env)]);
});

afterAll(async () => {
	await Promise.all(pair.map((instance) => instance.stop()));
	await pool.end();
});

test('two instances let through the limit between them, then answer 429 with Retry-After', async () => {
	const answers: Response[] = [];
	for (let index = 0; index < 9; index += 1) {
		const instance = pair[index % 2];
		if (instance) answers.push(await analyse(instance));
	}
	expect(answers.map(({ status }) => status)).toEqual([
		200, 200, 200, 200, 200, 200, 429, 429, 429
	]);
	const refused = answers.at(-1) ?? Response.error();
	const wait = Number(refused.headers.get('retry-after'));
	expect(wait).toBeGreaterThan(0);
	expect(wait).toBeLessThanOrEqual(60);
	const { error } = await refused.json();
	expect(error.code).toBe('too_many_requests');
	expect(error.message).toContain(`${wait} s`);
});

test('the shared store counts calls and starts anew when the minute is over', async () => {
	const count = windowStore(() => pool);
	expect(await count('a client', 3)).toMatchObject({ hits: 3 });
	const second = await count('a client', 2);
	expect(second.hits).toBe(5);
	expect(second.millisecondsLeft).toBeGreaterThan(50_000);
	await pool.query(
		"UPDATE rate_windows SET started_at = utc_timestamp(3) - INTERVAL 61 SECOND WHERE client_key = 'a client'"
	);
	const third = await count('a client', 1);
	expect(third.hits).toBe(1);
	expect(third.millisecondsLeft).toBeGreaterThan(59_000);
});
