import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import { analysed, figure, rolledI, workedExample } from './en1993-example';

const relative = (value: number | null | undefined, expected: number) =>
	Math.abs((value ?? 0) / expected - 1);

describe('what follows from the figures of published examples', () => {
	const mv01 = workedExample('MV01');
	it('MV01: the moment beside high shear is what may be counted', () => {
		const eta = figure(mv01.inputs, 'eta');
		const demand = { name: 'A', Vz: figure(mv01.inputs, 'VEd_kN'), My: 100 };
		const analysis = analysed(rolledI(mv01), { code: { eta }, demands: [demand] });
		expect(analysis.demands[0]?.countable).toBe(analysis.resistance?.MyVRd);
	});

	it.each([
		['SH01', undefined, 1197],
		['SH02', { spacing: 1500, endPost: 'non-rigid' }, 1583]
	] as const)('%s: a buckling web decides Vz,Rd, within 0.2 %%', (id, stiffeners, Vbw) => {
		const { inputs, expected } = workedExample(id);
		const [hw, tw] = [figure(inputs, 'hw'), figure(inputs, 'tw')];
		const girder: SectionDefinition = {
			kind: 'i',
			fabrication: 'welded',
			h: hw + 40,
			b: 400,
			tw,
			tf: 20,
			grade: figure(inputs, 'fyw')
		};
		expect(Vbw).toBe(figure(expected, 'Vbw_Rd_kN'));
		const { resistance } = analysed(girder, { stiffeners });
		expect(relative(resistance?.VzRd, Vbw)).toBeLessThan(0.002);
	});

	it('EF02: iterating the neutral axis to convergence gives about 1 % less, as its note says', () => {
		const of = (name: string) => figure(workedExample('EF02').inputs, name);
		const { effective } = analysed({
			kind: 'i',
			fabrication: 'welded',
			h: of('hw') + 2 * of('tf'),
			b: of('b'),
			tw: of('tw'),
			tf: of('tf'),
			weldLeg: of('weld'),
			grade: of('fy')
		});
		const once = effective?.elasticModulusYTop ?? 0;
		const converged = effective?.converged.elasticModulusYTop ?? 0;
		expect(converged / once).toBeGreaterThan(0.985);
		expect(converged / once).toBeLessThan(0.995);
	});

	it.each(['NM02', 'NM03', 'NM04'])('%s: the printed area and moduli are ours, rounded', (id) => {
		const { inputs } = workedExample(id);
		const of = (name: string) => figure(inputs, name);
		const tube = id === 'NM04';
		const { gross } = analysed(
			tube
				? {
						...{ kind: 'rectangular-hollow', fabrication: 'hot-finished', grade: of('fy') },
						...{ h: of('h'), b: of('b'), t: of('t') }
					}
				: rolledI(workedExample('CL08'))
		);
		const moduli = { Wply_cm3: gross.plasticModulusY, Wplz_cm3: gross.plasticModulusZ };
		expect(relative(of('A'), gross.area)).toBeLessThan(0.005);
		for (const [name, own] of Object.entries(moduli))
			if (name in inputs) expect(relative(of(name), own * 1e-3), name).toBeLessThan(0.005);
	});

	const pt10 = workedExample('PT10');
	it('PT10: the full plastic moment of a compact shape is its resistance', () => {
		const of = (name: string) => figure(pt10.inputs, name);
		const [inch, ksi] = [25.4, 6.894_757_293];
		const { moment, resistance } = analysed({
			kind: 'i',
			fabrication: 'welded',
			h: (of('hw') + 2 * of('tf')) * inch,
			b: of('b') * inch,
			tw: of('tw') * inch,
			tf: of('tf') * inch,
			grade: of('fy_ksi') * ksi
		});
		expect(resistance).toMatchObject({ basis: 'plastic', MyRd: moment.plasticY });
	});
});
