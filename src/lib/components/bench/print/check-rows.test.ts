import { describe, expect, it } from 'vitest';
import { analyse } from '$lib/engine/rules/analyse';
import { prepareSection } from '$lib/engine/section/prepare';
import { openingStudy } from '../study';
import { checkRows } from './check-rows';

const si = { system: 'si', decimal: 'point' } as const;
const us = { system: 'us', decimal: 'comma' } as const;
const check = { demand: 'A', clause: '6.2.5', utilisation: 0.573 };

describe('checks as printed', () => {
	it('gives moments in the reader’s units: 1 kip·ft is 1.355818 kNm (NIST SP 811)', () => {
		const row = { ...check, name: 'bending about y–y', value: 2400, limit: 4185 };
		expect(checkRows([row], si)[0]).toMatchObject({ value: '2400', limit: '4185', unit: 'kNm' });
		expect(checkRows([row], us)[0]).toMatchObject({
			value: '1770',
			limit: '3087',
			unit: 'kip·ft',
			use: '0,573'
		});
	});

	it('gives forces in kip: 1 kip is 4.448222 kN (NIST SP 811)', () => {
		const row = { ...check, name: 'shear along z', value: 4448.222, limit: 8896.443 };
		expect(checkRows([row], us)[0]).toMatchObject({ value: '1000', limit: '2000', unit: 'kip' });
	});

	it('never converts shares of 1, and leaves no other check of the engine a share', () => {
		const built = prepareSection(openingStudy.section);
		if (!built.ok) throw new Error('cannot be built');
		const demands = [
			{ name: 'a', My: 100, Mz: 5, Vz: 10, Vy: 10 },
			{ name: 'b', N: -100 },
			{ name: 'c', N: 100 },
			{ name: 'd', Mz: 5 },
			{ name: 'e', My: 100, N: -10 }
		];
		const checks = analyse(built.value, { demands }).resistance?.checks ?? [];
		const shares = checkRows(checks, us).filter(({ unit }) => unit === 'share');
		expect(shares.map(({ name }) => name.split(',')[0])).toEqual([
			'a: bending about both axes',
			'e: axial force with bending'
		]);
	});
});
