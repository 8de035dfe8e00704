import { expect, it } from 'vitest';
import { astmC } from '$lib/server/catalogues/definitions';
import { aisc } from './columns';
import { comparison } from './published-table';

/** C shapes (AISC Shapes Database v15.0); 2 % because toe radii are not published. */
it('C shapes have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_astm_a6_c.csv',
		definition: astmC,
		columns: {
			...aisc,
			x: ({ gross }) => gross.centroid.y / 25.4
		},
		tolerance: 0.02
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(110);
});
