import { expect, it } from 'vitest';
import { astmRoundHss } from '$lib/server/catalogues/definitions';
import { aisc } from './columns';
import { comparison } from './published-table';

/** Round HSS at the design wall (AISC Shapes Database v15.0). */
it('round HSS have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_astm_a500_hss_round.csv',
		definition: astmRoundHss,
		columns: aisc,
		tolerance: 0.005
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(430);
});
