import { expect, it } from 'vitest';
import { fullPlastic } from '$lib/engine/response/plastic';
import { astmWT } from '$lib/server/catalogues/definitions';
import { aisc } from './columns';
import { comparison } from './published-table';

/** WT shapes (AISC Shapes Database v15.0); 2 % because the dimensions have three digits too. */
it('WT shapes have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_astm_a6_wt.csv',
		definition: astmWT,
		columns: {
			...aisc,
			y: ({ bounds, gross }) => (bounds.top - gross.centroid.z) / 25.4,
			yp: (section) =>
				(section.bounds.top - (fullPlastic(section).plasticNeutralAxisZ ?? Number.NaN)) / 25.4
		},
		tolerance: 0.02
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(1127);
});
