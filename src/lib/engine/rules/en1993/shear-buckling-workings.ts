import { workingKey } from '../../explain/keys';
import type { Working, WorkingInput } from '../../explain/working';
import type { EnModel } from './model';
import type { PanelBuckling } from './shear-buckling';

export const plated = 'EN 1993-1-5';

/** A number put into a working. */
export const one = (symbol: string, value: number, unit: string, from?: string): WorkingInput =>
	from === undefined ? { symbol, value, unit } : { symbol, value, unit, from };

/** Keeps how kτ, λw, χw and Vbw,Rd of one panel came about. */
export function explainPanel(
	{ workings, code }: EnModel,
	axis: 'y' | 'z',
	found: PanelBuckling
): void {
	const { panel, spacing, kTau, slenderness, chiW, Vbw, fyw, epsilon, needed } = found;
	const { part, depth, thickness } = panel;
	const key = (figure: string) => workingKey.shear(axis, `${part}.${figure}`);
	const hw = one('hw', depth, 'mm', 'clear depth');
	const t = one('t', thickness, 'mm');
	const chi = chiFormula(found, code.eta);
	const panelWorking = (
		title: string,
		clause: string,
		formula: string,
		inputs: WorkingInput[],
		value: number,
		unit = ''
	): Working => ({
		title: `${title} of the part ${part}`,
		clause: `${plated} ${clause}`,
		edition: plated,
		formula,
		inputs,
		result: { value, unit }
	});
	workings!.add(key('kTau'), () =>
		panelWorking(
			'Shear buckling coefficient',
			'A.3(1)',
			coefficientFormula(depth, spacing),
			spacing === null ? [] : [hw, one('a', spacing, 'mm', 'clear spacing of the stiffeners')],
			kTau
		)
	);
	workings!.add(key('lambda'), () =>
		panelWorking(
			'Slenderness in shear',
			'5.3(3)',
			spacing === null ? 'λw = hw/(86.4·t·ε)' : 'λw = hw/(37.4·t·ε·√(kτ))',
			[
				hw,
				t,
				one('ε', epsilon, '', '√(235/fyw)'),
				...(spacing === null ? [] : [one('kτ', kTau, '', key('kTau'))])
			],
			slenderness
		)
	);
	workings!.add(key('chi'), () =>
		panelWorking(
			needed ? 'Shear reduction' : 'Shear reduction, no check needed,',
			'Table 5.1',
			chi,
			chi.endsWith('η')
				? [one('η', code.eta, '', 'chosen with the code')]
				: [one('λw', slenderness, '', key('lambda'))],
			chiW
		)
	);
	workings!.add(key('Vbw'), () =>
		panelWorking(
			'Shear buckling resistance',
			'5.2(1)',
			'V_bw,Rd = χw·fyw·hw·t/(√(3)·γM1)·10^-3',
			[
				one('χw', chiW, '', key('chi')),
				one('fyw', fyw, 'N/mm²'),
				hw,
				t,
				one('γM1', code.gammaM1, '', 'chosen with the code')
			],
			Vbw,
			'kN'
		)
	);
}

function coefficientFormula(depth: number, spacing: number | null): string {
	if (spacing === null) return 'kτ = 5.34';
	return spacing >= depth ? 'kτ = 5.34 + 4·(hw/a)²' : 'kτ = 4 + 5.34·(hw/a)²';
}

function chiFormula({ needed, slenderness, endPost }: PanelBuckling, eta: number): string {
	if (!needed || slenderness < 0.83 / eta) return 'χw = η';
	return slenderness < 1.08 || endPost === 'non-rigid' ? 'χw = 0.83/λw' : 'χw = 1.37/(0.7 + λw)';
}
