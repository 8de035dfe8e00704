import { expect, it } from 'vitest';
import { enHollow } from '$lib/server/catalogues/definitions';
import { en } from './columns';
import { comparison } from './published-table';

/** RHS, SHS and CHS of EN 10210-2 (SCI P363 tables as held by an open dataset). */
it('hot-finished hollow sections have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_en10210_hollow.csv',
		definition: enHollow,
		columns: en,
		tolerance: 0.005
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(1958);
});
