import { describe, expect, it } from 'vitest';
import { analyse } from '$lib/engine/rules/analyse';
import { prepareSection } from '$lib/engine/section/prepare';
import { openingStudy } from '../study';
import { checkRows, percent, uncheckedRows } from './check-rows';

const si = { system: 'si', decimal: 'point' } as const;
const us = { system: 'us', decimal: 'comma' } as const;
const check = { demand: 'A', clause: '6.2.5', utilisation: 0.573 };

describe('checks as printed', () => {
	it('gives moments in the reader’s units: 1 kip·ft is 1.355818 kNm (NIST SP 811)', () => {
		const row = { ...check, name: 'bending about y–y', value: 2400, limit: 4185 };
		expect(checkRows([row], [], si)[0]).toMatchObject({
			value: '2400',
			limit: '4185',
			unit: 'kNm'
		});
		expect(checkRows([row], [], us)[0]).toMatchObject({
			value: '1770',
			limit: '3087',
			unit: 'kip·ft',
			useText: '57,3 %',
			state: 'passes'
		});
	});

	it('gives forces in kip: 1 kip is 4.448222 kN (NIST SP 811)', () => {
		const row = { ...check, name: 'shear along z', value: 4448.222, limit: 8896.443 };
		expect(checkRows([row], [], us)[0]).toMatchObject({
			value: '1000',
			limit: '2000',
			unit: 'kip'
		});
	});

	it('gives stresses where a fibre decides: 1 ksi is 6.894757 N/mm² (NIST SP 811)', () => {
		const built = prepareSection(openingStudy.section);
		if (!built.ok) throw new Error('cannot be built');
		const demands = [
			{ name: 'a', My: 100, Mz: 5, Vz: 10, Vy: 10 },
			{ name: 'b', N: -100 },
			{ name: 'c', N: 100 },
			{ name: 'd', Mz: 5 },
			{ name: 'e', My: 100, N: -10 }
		];
		const { resistance, demands: states } = analyse(built.value, { demands });
		const rows = checkRows(resistance?.checks ?? [], states, us);
		const fibres = rows.filter(({ unit }) => unit === 'ksi');
		expect(
			fibres.map(({ demand, name, limit }) => `${demand}: ${name.split(',')[0]} ${limit}`)
		).toEqual(['a: bending about both axes 50,04', 'e: axial force with bending 50,04']);
		const plain = rows.filter(({ unit }) => unit === '');
		expect(new Set(plain.map(({ name }) => name))).toEqual(new Set(['flange-induced buckling']));
	});

	it('gives a moment beside N in moments, where a curve and no sum is used', () => {
		const built = prepareSection({
			kind: 'i',
			h: 300,
			b: 150,
			tw: 7.1,
			tf: 10.7,
			r: 15,
			fabrication: 'rolled',
			grade: 'S275'
		});
		if (!built.ok) throw new Error('cannot be built');
		const demands = [{ name: 'a', N: -500, My: 60 }];
		const { resistance, demands: states } = analyse(built.value, { demands });
		const [row] = checkRows(resistance?.checks ?? [], states, si).filter(({ name }) =>
			name.includes('with bending')
		);
		expect(row).toMatchObject({ value: '60.00', unit: 'kNm' });
	});

	it('tells a use just over its limit from the limit', () => {
		expect(percent(1.00001, si)).toBe('100.001 %');
		expect(percent(0.9999, si)).toBe('100 %');
	});
});

describe('checks that are not made', () => {
	const member = { code: 'ltb-not-checked', message: 'No length is given.' };
	const thrust = {
		code: 'member-buckling-not-checked',
		message: 'Case A: not built.',
		clause: '6.3'
	};
	const state = (missing: (typeof thrust)[]) =>
		({ missing, class: 1 }) as unknown as Parameters<typeof uncheckedRows>[0] & object;

	it('are those of the demand first, then those of the member, each once with its reason', () => {
		expect(uncheckedRows(state([thrust]), [], [member, thrust])).toEqual([
			{ title: 'Member buckling', reason: 'Case A: not built.', clause: '6.3' },
			{ title: 'Lateral–torsional buckling', reason: 'No length is given.', clause: '' }
		]);
	});

	it('leave out what only another demand misses', () => {
		const rows = uncheckedRows(state([]), [state([thrust])], [member, thrust]);
		expect(rows.map(({ title }) => title)).toEqual(['Lateral–torsional buckling']);
	});
});
