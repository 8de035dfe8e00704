import { describe, expect, it } from 'vitest';
import { ignoredFields } from './ignored-fields';

const known = ['section', 'demand', 'demands'];
const messages = (body: unknown) => ignoredFields(body, known).map(({ message }) => message);

describe('ignoredFields', () => {
	it('finds nothing in a request that is all known', () => {
		expect(messages({ section: { x: 1 }, demand: { N: 1 }, demands: [{ N: 2 }, {}] })).toEqual([]);
	});

	it('tells of fields at the top, and of the one that was meant', () => {
		expect(messages({ demnd: {}, zzz: 1 })).toEqual([
			'"demnd" is not a field of this request and was ignored. Did you mean "demand"?',
			'"zzz" is not a field of this request and was ignored.'
		]);
	});

	it('is not taken in by names that every object inherits', () => {
		expect(messages({ constructor: 1, toString: 2 })).toHaveLength(2);
	});
});
