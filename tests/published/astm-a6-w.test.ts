import { expect, it } from 'vitest';
import { astmW } from '$lib/server/catalogues/definitions';
import { aisc } from './columns';
import { comparison } from './published-table';

/** W shapes (AISC Shapes Database v15.0); 2 % because the dimensions have three digits too. */
it('W shapes have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_astm_a6_w.csv',
		definition: astmW,
		columns: aisc,
		tolerance: 0.02
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(1033);
});
