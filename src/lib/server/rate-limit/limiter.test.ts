import { expect, test } from 'vitest';
import { createLimiter } from './limiter';
import type { CountCalls } from './window-store';

/** The shared store in a few lines: one window of a minute from the first call. */
const sharedStore = (clock: { now: number }) => {
	const windows = new Map<string, { hits: number; started: number }>();
	const asked = { times: 0 };
	const count: CountCalls = async (key, calls) => {
		asked.times += 1;
		const known = windows.get(key);
		const running = known && clock.now - known.started < 60_000;
		const window = running ? known : { hits: 0, started: clock.now };
		window.hits += calls;
		windows.set(key, window);
		return { hits: window.hits, millisecondsLeft: window.started + 60_000 - clock.now };
	};
	return { count, asked };
};

const set = (limit: number, instances = 1) => {
	const clock = { now: 1_000_000 };
	const { count, asked } = sharedStore(clock);
	const now = () => clock.now;
	const limiters = Array.from({ length: instances }, () => createLimiter({ count, limit, now }));
	const call = (at: number, key = 'client') =>
		limiters[at % instances]?.(key) ?? Promise.resolve(0);
	return { clock, asked, call };
};

const passed = async (calls: Promise<number>[]) =>
	(await Promise.all(calls)).filter((wait) => wait === 0).length;

test('lets exactly the limit through, in turn or all at once', async () => {
	const inTurn = set(120);
	let through = 0;
	for (let index = 0; index < 130; index += 1) if ((await inTurn.call(0)) === 0) through += 1;
	expect(through).toBe(120);
	const atOnce = set(120);
	expect(await passed(Array.from({ length: 130 }, () => atOnce.call(0)))).toBe(120);
});

test('instances share the limit: never more in all, and all of it when they take turns', async () => {
	const { call } = set(60, 3);
	let through = 0;
	for (let index = 0; index < 90; index += 1) if ((await call(index)) === 0) through += 1;
	expect(through).toBe(60);
});

test('says how long to wait, and lets through again when the minute is over', async () => {
	const { clock, call } = set(2);
	await call(0);
	clock.now += 10_000;
	await call(0);
	expect(await call(0)).toBe(50_000);
	clock.now += 50_000;
	expect(await call(0)).toBe(0);
});

test('clients do not use up one another', async () => {
	const { call } = set(1);
	expect(await call(0, 'one')).toBe(0);
	expect(await call(0, 'two')).toBe(0);
	expect(await call(0, 'one')).toBeGreaterThan(0);
});

test('asks the store far less than once a call, and not at all for a client over its limit', async () => {
	const { asked, call } = set(120);
	for (let index = 0; index < 120; index += 1) await call(0);
	expect(asked.times).toBeLessThan(40);
	const before = asked.times;
	for (let index = 0; index < 100; index += 1) await call(0);
	expect(asked.times - before).toBeLessThanOrEqual(1);
});

test('with the store away the limit still holds within the instance, and it is told once a minute', async () => {
	const told: unknown[] = [];
	const limiter = createLimiter({
		count: () => Promise.reject(new Error('away')),
		limit: 5,
		now: () => 0,
		onStoreAway: (error) => told.push(error)
	});
	expect(await passed(Array.from({ length: 9 }, () => limiter('client')))).toBe(5);
	expect(told).toHaveLength(1);
});
