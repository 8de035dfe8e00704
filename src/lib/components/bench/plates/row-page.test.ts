import { describe, expect, it } from 'vitest';
import { rowPage } from './row-page';

describe('a page of a long list', () => {
	it('shows so many rows at a time, and what is left on the last', () => {
		expect(rowPage(0, 45, 20)).toEqual({ page: 0, pages: 3, from: 0, to: 20 });
		expect(rowPage(2, 45, 20)).toEqual({ page: 2, pages: 3, from: 40, to: 45 });
	});

	it('falls back to the last page there is', () => {
		expect(rowPage(9, 45, 20).page).toBe(2);
		expect(rowPage(3, 0, 20)).toEqual({ page: 0, pages: 1, from: 0, to: 0 });
	});
});
