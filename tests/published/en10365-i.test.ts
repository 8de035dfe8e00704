import { expect, it } from 'vitest';
import type { ISection } from '$lib/engine/section/definition';
import { iSizes } from '$lib/engine/section/kinds/i';
import { continentalITorsion } from '$lib/engine/section/torsion/i';
import { enI } from '$lib/server/catalogues/definitions';
import { en } from './columns';
import { comparison } from './published-table';

/**
 * IPE and HE of EN 10365 (values from memory, agreed by open datasets). Their torsion constant is
 * printed by the continental formula; their warping constant in thousands of cm⁶ to two decimals.
 */
it('IPE and HE sections have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_en10365_i.csv',
		definition: enI,
		columns: {
			...en,
			It: ({ definition }) => continentalITorsion(iSizes(definition as ISection)) / 1e4
		},
		tolerance: 0.005,
		lastDigit: { Iw: 10 }
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(432);
});
