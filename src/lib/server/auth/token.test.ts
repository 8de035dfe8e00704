import { expect, it } from 'vitest';
import { newToken, tokenHash } from './token';

it('a token can be found again by its hash, which does not contain it', () => {
	const { token, hash } = newToken();
	expect(tokenHash(token)).toBe(hash);
	expect(hash).not.toContain(token);
	expect(hash).toMatch(/^[0-9a-f]{64}$/);
});

it('no two tokens are alike, and each fits into an address as it is', () => {
	const tokens = Array.from({ length: 1000 }, () => newToken().token);
	expect(new Set(tokens).size).toBe(1000);
	for (const token of tokens) expect(encodeURIComponent(token)).toBe(token);
});

it('SHA-256 of "abc" is the value given in FIPS 180-4', () => {
	expect(tokenHash('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
});
