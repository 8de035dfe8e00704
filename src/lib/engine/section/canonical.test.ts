import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson, inputHash } from './canonical';
import { sha256 } from './sha256';

describe('canonical inputs', () => {
	it('do not depend on the order of fields or on fields left open', () => {
		const a = { kind: 'flat', b: 10, h: 20, grade: { fy: 235, fu: undefined } };
		const b = { grade: { fy: 235 }, h: 20.0, b: 1e1, kind: 'flat' };
		expect(canonicalJson(a)).toBe(canonicalJson(b));
		expect(inputHash(a)).toBe(inputHash(b));
	});

	it('keep the order of lists, and take −0 as 0', () => {
		expect(inputHash([1, 2])).not.toBe(inputHash([2, 1]));
		expect(inputHash({ y: -0 })).toBe(inputHash({ y: 0 }));
	});

	it('tell sections apart by the last digit', () => {
		expect(inputHash({ h: 300 })).not.toBe(inputHash({ h: 300.00000000000006 }));
	});
});

describe('SHA-256', () => {
	it('gives the digests of the standard (FIPS 180-4 examples)', () => {
		expect(sha256('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
		expect(sha256('abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq')).toBe(
			'248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1'
		);
	});

	it('agrees with the platform on any text', () => {
		const platform = (text: string) => createHash('sha256').update(text, 'utf8').digest('hex');
		fc.assert(
			fc.property(
				fc.string({ unit: 'grapheme', maxLength: 300 }),
				(text) => sha256(text) === platform(text)
			)
		);
	});
});
