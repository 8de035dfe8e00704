import { describe, expect, it } from 'vitest';
import { finiteJson, nonFinitePath } from './answer';

describe('finiteJson', () => {
	it('writes what is finite as JSON', () => {
		expect(finiteJson({ a: [1, null, 'NaN', true], b: { c: -2.5 } })).toBe(
			'{"a":[1,null,"NaN",true],"b":{"c":-2.5}}'
		);
	});

	it('throws and names the place of a number that is not', () => {
		expect(() => finiteJson({ gross: { area: NaN } })).toThrow('.gross.area');
		expect(() => finiteJson({ states: [{ e0: 0 }, { e0: -Infinity }] })).toThrow('.states.1.e0');
	});

	it('finds nothing wrong with null or undefined figures', () => {
		expect(nonFinitePath({ a: null, b: undefined })).toBeNull();
	});
});
