import { expect, it } from 'vitest';
import { astmL } from '$lib/server/catalogues/definitions';
import { aisc, angleTangent } from './columns';
import { comparison } from './published-table';

/** L shapes (AISC Shapes Database v15.0); 2 % because toe radii are not published. Z is the minor principal axis. */
it('L shapes have the published properties, minor principal axis included', () => {
	const { compared, faults } = comparison({
		file: 'check_astm_a6_l.csv',
		definition: astmL,
		columns: {
			...aisc,
			x: ({ gross }) => gross.centroid.y / 25.4,
			y: ({ gross }) => gross.centroid.z / 25.4,
			Iz: ({ gross }) => gross.secondMomentV / 25.4 ** 4,
			rz: ({ gross }) => Math.sqrt(gross.secondMomentV / gross.area) / 25.4,
			'tan(a)': angleTangent
		},
		tolerance: 0.02
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(603);
});
