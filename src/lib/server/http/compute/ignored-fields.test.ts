import { describe, expect, it } from 'vitest';
import { ignoredFields } from './ignored-fields';

const known = { self: { section: 0, demand: 0, demands: 0 }, demand: { N: 0 }, demands: { N: 0 } };
const paths = (body: unknown) =>
	ignoredFields(body, known).map(({ message }) => message.split('"')[1]);

describe('ignoredFields', () => {
	it('finds nothing in a request that is all known', () => {
		expect(paths({ section: { x: 1 }, demand: { N: 1 }, demands: [{ N: 2 }, {}] })).toEqual([]);
	});

	it('tells of fields at the top and inside a demand', () => {
		expect(paths({ code: {}, demand: { n: 1 }, demands: [{ N: 1 }, { Ned: 1 }] })).toEqual([
			'code',
			'demand.n',
			'demands.1.Ned'
		]);
	});
});
