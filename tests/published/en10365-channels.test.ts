import { expect, it } from 'vitest';
import { enChannel } from '$lib/server/catalogues/definitions';
import { en } from './columns';
import { comparison } from './published-table';

/** UPE, UPN and PFC of EN 10365 (from memory, agreed by open datasets; PFC: SCI P363 tables as held by one). */
it('channels have the published properties', () => {
	const { compared, faults } = comparison({
		file: 'check_en10365_channels.csv',
		definition: enChannel,
		columns: en,
		tolerance: 0.005
	});
	expect(faults).toEqual([]);
	expect(compared).toBe(148);
});
