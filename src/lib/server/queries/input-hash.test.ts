import { expect, it } from 'vitest';
import { inputHash } from './input-hash';

it('the order of fields does not change the hash, the order of a list does', () => {
	expect(inputHash({ a: 1, b: { c: 2, d: 3 } })).toBe(inputHash({ b: { d: 3, c: 2 }, a: 1 }));
	expect(inputHash({ a: [1, 2] })).not.toBe(inputHash({ a: [2, 1] }));
});

it('a field that is absent and a field that is undefined are the same input', () => {
	expect(inputHash({ a: 1, b: undefined })).toBe(inputHash({ a: 1 }));
});

it('any changed figure changes the hash', () => {
	expect(inputHash({ tw: 14 })).not.toBe(inputHash({ tw: 14.000001 }));
});
