import { expect, it } from 'vitest';
import { examplesNotCovered } from './gaps';

it('every example that is not compared has its reason', () => {
	const gaps = examplesNotCovered();
	expect(gaps.filter(({ why }) => why === 'No reason is known.')).toEqual([]);
	expect(gaps.map(({ id }) => id)).toContain('AF01');
});
