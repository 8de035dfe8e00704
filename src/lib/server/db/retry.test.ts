import { expect, test } from 'vitest';
import { isPassingConflict, withRetry } from './retry';

const deadlock = () =>
	Object.assign(new Error('Failed query'), {
		cause: Object.assign(new Error('Deadlock found'), { errno: 1213, code: 'ER_LOCK_DEADLOCK' })
	});

const losing = (times: number, error: () => Error = deadlock) => {
	const tries = { count: 0 };
	const work = () => {
		tries.count += 1;
		return tries.count <= times ? Promise.reject(error()) : Promise.resolve('written');
	};
	return { tries, work };
};

test('a write that lost against another is run again', async () => {
	const { tries, work } = losing(3);
	expect(await withRetry(work, { firstWait: 1 })).toBe('written');
	expect(tries.count).toBe(4);
});

test('it gives up after the attempts it was given', async () => {
	const { tries, work } = losing(99);
	await expect(withRetry(work, { attempts: 4, firstWait: 1 })).rejects.toThrow('Failed query');
	expect(tries.count).toBe(4);
});

test('any other error is passed on at once', async () => {
	const { tries, work } = losing(1, () => new Error('syntax'));
	await expect(withRetry(work)).rejects.toThrow('syntax');
	expect(tries.count).toBe(1);
});

test('deadlock, lock wait and changed row are conflicts that pass; a duplicate key is not', () => {
	expect([1213, 1205, 1020].every((errno) => isPassingConflict({ errno }))).toBe(true);
	expect(isPassingConflict({ errno: 1062 })).toBe(false);
	expect(isPassingConflict(undefined)).toBe(false);
});
