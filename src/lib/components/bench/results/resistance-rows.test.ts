import { expect, it } from 'vitest';
import type { DemandState, Resistance } from '$lib/engine/rules/result';
import { besideRows, resistanceRows } from './resistance-rows';

const si = { system: 'si', decimal: 'point' } as const;
const us = { system: 'us', decimal: 'comma' } as const;
const resistance = { MyRd: 135.5818, NRd: null, VzRd: 444.8222 } as unknown as Resistance;

it('gives moments and forces in the reader’s units: 1 kip·ft is 1.355818 kNm, 1 kip 4.448222 kN (NIST SP 811)', () => {
	const rows = resistanceRows(resistance, us);
	const at = (key: string) => rows.find((row) => row.key === key);
	expect(at('resistance.MyRd')).toMatchObject({ figure: '100,0', unit: 'kip·ft' });
	expect(at('resistance.VzRd')).toMatchObject({ figure: '100,0', unit: 'kip' });
});

it('shows a missing resistance as missing, never as a figure', () => {
	const row = resistanceRows(resistance, si).find(({ key }) => key === 'resistance.NRd');
	expect(row?.figure).not.toMatch(/\d/);
});

it('lists what is left beside other effects only where it applies', () => {
	const state = { demand: 'A', reduced: { MbRd: 80, chiLT: 0.59 } } as unknown as DemandState;
	expect(besideRows(state, si).map(({ key, figure, unit }) => [key, figure, unit])).toEqual([
		['reduced.A.chiLT', '0.590', ''],
		['reduced.A.MbRd', '80.00', 'kNm']
	]);
});
