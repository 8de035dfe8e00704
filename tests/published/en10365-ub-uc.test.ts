import { expect, it } from 'vitest';
import { enI } from '$lib/server/catalogues/definitions';
import { en } from './columns';
import { comparison } from './published-table';

/**
 * UC of EN 10365 (SCI P363 tables as held by an open dataset). The warping constant of the smallest
 * sizes is printed in dm⁶ to three decimals.
 */
it('UK columns have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_en10365_ub_uc.csv',
		definition: enI,
		columns: en,
		tolerance: 0.005,
		lastDigit: { Iw: 1000 }
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(552);
});
