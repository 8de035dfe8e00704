import { expect, test } from 'vitest';
import { isId, newId } from './ids';

test('an id is a version 7 UUID', () => {
	expect(isId(newId())).toBe(true);
	expect(isId('7f9d1c1e-0000-4000-8000-000000000000')).toBe(false);
});

test('ids grow, also thousands within one millisecond', () => {
	const ids = Array.from({ length: 20_000 }, () => newId());
	expect([...ids].sort()).toEqual(ids);
	expect(new Set(ids).size).toBe(ids.length);
});

test('ids grow when the clock is set back', () => {
	const later = newId(Date.now() + 60_000);
	expect(newId(0) > later).toBe(true);
});

test('an id begins with the millisecond of its making', () => {
	const time = Date.now() + 3_600_000;
	expect(parseInt(newId(time).replaceAll('-', '').slice(0, 12), 16)).toBe(time);
});
