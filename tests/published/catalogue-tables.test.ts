import { describe, expect, it } from 'vitest';
import { tableChecks } from '../../src/lib/server/proof/registry';
import { publishedTables } from '../../src/lib/server/proof/tables/list';

/** Values printed in each table; a value that falls out of the comparison is a fault too. */
const printed: Readonly<Record<string, number>> = {
	'check_en10365_i.csv': 432,
	'check_en10365_ub_uc.csv': 552,
	'check_en10365_channels.csv': 148,
	'check_en10056_angles.csv': 568,
	'check_en10210_hollow.csv': 1958,
	'check_astm_a6_w.csv': 1033,
	'check_astm_a6_wt.csv': 1127,
	'check_astm_a6_c.csv': 110,
	'check_astm_a6_l.csv': 603,
	'check_astm_a500_hss_rect.csv': 1249,
	'check_astm_a500_hss_round.csv': 430
};

describe('sections have the properties that published tables print', () => {
	it('compares every table', () =>
		expect(publishedTables.map(({ file }) => file).sort()).toEqual(Object.keys(printed).sort()));

	it.each(publishedTables)('$title ($file)', (table) => {
		const checks = [...tableChecks(table)].flat();
		const faults = checks.filter(({ pass }) => !pass);
		expect(
			faults.map(({ id, ours, printed }) => `${id}: printed ${printed}, ours ${ours}`)
		).toEqual([]);
		expect(checks).toHaveLength(printed[table.file]!);
	});
});
