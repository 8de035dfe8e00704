import { expect, it } from 'vitest';
import { enAngle } from '$lib/server/catalogues/definitions';
import { angleTangent, en } from './columns';
import { comparison } from './published-table';

/** Equal and unequal angles of EN 10056-1 (from memory, agreed by open datasets). */
it('angles have the published properties, principal axes included', () => {
	const { compared, faults } = comparison({
		file: 'check_en10056_angles.csv',
		definition: enAngle,
		columns: {
			...en,
			tan_alpha: angleTangent
		},
		tolerance: 0.005
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(568);
});
