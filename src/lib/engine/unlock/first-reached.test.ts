import { describe, expect, it } from 'vitest';
import { firstReached } from './first-reached';

describe('firstReached', () => {
	it('finds the first of every run of 40, from every start, with few looks', () => {
		for (let first = 0; first < 40; first++)
			for (const from of [0, Math.floor(first / 2), first]) {
				let looks = 0;
				const found = firstReached(40, from, (at) => (looks++, at >= first));
				expect([found, looks < 22]).toEqual([first, true]);
			}
	});

	it('finds a near one that is lost again', () => {
		expect(firstReached(40, 0, (at) => at === 5)).toBe(5);
	});

	it('gives nothing where none reaches', () => {
		expect(firstReached(40, 3, () => false)).toBeNull();
		expect(firstReached(0, 0, () => true)).toBeNull();
	});
});
