import { expect, it } from 'vitest';
import { nextPage } from './next-page';

it('a path of this site is kept with its query', () => {
	expect(nextPage('/bench?kind=i&h=300')).toBe('/bench?kind=i&h=300');
});

it.each([
	'https://elsewhere.example',
	'//elsewhere.example',
	'/\\elsewhere.example',
	'rack',
	'',
	null
])('%s leads to the Rack instead', (wish) => expect(nextPage(wish)).toBe('/rack'));

it('a path that climbs or hides a tab stays on this site', () => {
	expect(nextPage('/../rack')).toBe('/rack');
	expect(nextPage('/\t/elsewhere.example')).not.toContain('//');
});
