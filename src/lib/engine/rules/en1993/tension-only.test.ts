import { describe, expect, it } from 'vitest';
import { prepareSection } from '../../section/prepare';
import { analyse } from '../analyse';
import type { Demand } from '../result';

/** 10×300 of fy 355: 3000 mm², 1065 kN; b/t 30 is over 18ε = 14.6. */
function flat(...demands: Demand[]) {
	const section = prepareSection({ kind: 'flat', b: 10, h: 300, grade: 355 });
	if (!section.ok) throw new Error('not built');
	return analyse(section.value, { demands, code: { gammaM0: 1.1 }, explain: true });
}

describe('a slender flat in tension', () => {
	it('has 6.2.3, which needs no class: 3000 · 355/1.1 kN', () => {
		const { resistance, classification, explain } = flat();
		expect(classification).toBeNull();
		expect(resistance?.NtRd).toBeCloseTo(1065 / 1.1, 9);
		expect(resistance?.NRd).toBeNull();
		expect(explain?.['resistance.NtRd']?.result.value).toBeCloseTo(1065 / 1.1, 9);
	});

	it('is answered with the force that may be counted', () => {
		const { verdict, resistance } = flat({ N: 100 });
		expect(resistance?.utilisation?.value).toBeCloseTo(110 / 1065, 9);
		expect(verdict.countable.force).toBeCloseTo(1065 / 1.1, 9);
		expect(verdict.status).toBe('passes');
		expect(flat({ N: 1000 }).verdict.status).toBe('fails');
	});

	it('counts nothing where it is compressed, bent or sheared as well', () => {
		for (const demand of [{ N: -1 }, { N: 100, My: 1 }, { N: 100, Vz: 1 }, { My: 1 }]) {
			const { verdict, demands } = flat({ N: 100 }, demand);
			expect(demands).toEqual([]);
			expect(verdict.countable).toEqual({ moment: null, force: null, basis: null });
			expect(verdict.status).toBe('no-figure');
		}
	});
});

describe('the elastic check with shear along y', () => {
	it('has the peak of a bar, 1.5V/A, at its middle and the bending stress at its edges', () => {
		const section = prepareSection({ kind: 'flat', b: 100, h: 20, grade: 235 });
		if (!section.ok) throw new Error('not built');
		const elastic = (demand: Demand) =>
			analyse(section.value, { demands: [demand] }).demands[0]!.elastic;
		// √3 · 1.5 · 100e3/2000/235; edge 1 kNm over 20·100²/6 mm³
		expect(elastic({ Vy: 100 })?.value).toBeCloseTo((Math.sqrt(3) * 75) / 235, 9);
		expect(elastic({ Vy: 10, Mz: 5 })?.value).toBeCloseTo(5e6 / (2e5 / 6) / 235, 9);
		expect(elastic({ Vy: 10, Vz: 10 })).toBeNull();
	});
});
