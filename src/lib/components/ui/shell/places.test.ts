import { expect, it } from 'vitest';
import { isWithin } from './places';

it('marks a place as current on its own page and under it only', () => {
	expect(isWithin('/bench', '/bench')).toBe(true);
	expect(isWithin('/bench/01HX', '/bench')).toBe(true);
	expect(isWithin('/benchmark', '/bench')).toBe(false);
	expect(isWithin('/', '/bench')).toBe(false);
});
