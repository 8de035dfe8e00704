import { expect, it } from 'vitest';
import { counted, rackAddress } from './rack-address';

it('an address carries what is asked and nothing empty', () => {
	expect(rackAddress({ in: 'catalogues', q: '', page: 2 })).toBe('/rack?in=catalogues&page=2');
	expect(rackAddress({ q: '' })).toBe('/rack');
	expect(rackAddress({ q: 'a&b=c' })).toBe('/rack?q=a%26b%3Dc');
});

it('counts read as people say them', () => {
	expect(counted(1, 'section')).toBe('1 section');
	expect(counted(0, 'section')).toBe('0 sections');
	expect(counted(2300, 'shape')).toBe('2\u202f300 shapes');
});
