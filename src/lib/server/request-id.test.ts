import { expect, test } from 'vitest';
import { isId } from './db/ids';
import { currentRequestId, requestIdOf, withRequestId } from './request-id';

const idFor = (sent: string) => requestIdOf(new Headers({ 'x-request-id': sent }));

test('a sane id that came along is kept', () => {
	expect(idFor('gateway-7f3a.19')).toBe('gateway-7f3a.19');
});

test('an id that is too short, too long or not plain is replaced', () => {
	for (const sent of ['a', 'x'.repeat(65), 'abc def ghi', '<script>alert'])
		expect(isId(idFor(sent))).toBe(true);
});

test('the id is known to everything that runs in the request, and to nothing outside', async () => {
	const later = () => Promise.resolve().then(currentRequestId);
	const [one, two] = await Promise.all([
		withRequestId('first-request', later),
		withRequestId('second-request', later)
	]);
	expect([one, two, currentRequestId()]).toEqual(['first-request', 'second-request', undefined]);
});
