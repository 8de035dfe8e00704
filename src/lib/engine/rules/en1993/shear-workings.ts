import { workingKey } from '../../explain/keys';
import type { Working, WorkingInput } from '../../explain/working';
import { clauseOf, editionName } from './edition';
import type { EnModel } from './model';
import type { ShearArea } from './shear-area';
import type { PanelBuckling } from './shear-buckling';
import type { FlangeShare } from './shear-buckling-flange';
import type { AxisShear } from './shear-resistance';

/** Numbers of one axis as they were computed. */
export interface ShearFigures {
	readonly axis: 'y' | 'z';
	readonly area: ShearArea;
	readonly fy: number;
	readonly plastic: number;
	readonly checked: readonly PanelBuckling[];
	readonly buckling: AxisShear['buckling'];
	readonly share: FlangeShare | null;
	/** Name of the demand whose My and N the flanges' part stands beside. */
	readonly name: string | null;
	readonly resistance: number;
}

const plated = 'EN 1993-1-5';

const one = (symbol: string, value: number, unit: string, from?: string): WorkingInput =>
	from === undefined ? { symbol, value, unit } : { symbol, value, unit, from };

/** Keeps how the shear figures of one axis came about. */
export function explainShear(model: EnModel, figures: ShearFigures): void {
	const { workings } = model;
	if (workings === null) return;
	const { axis, buckling, checked, name } = figures;
	workings.add(workingKey.shear(axis, 'area'), () => areaWorking(model, figures));
	workings.add(workingKey.shear(axis, 'Vpl'), () => plasticWorking(model, figures));
	if (buckling !== null) for (const panel of checked) explainPanel(model, axis, panel);
	const total =
		name === null ? workingKey.resistance(`V${axis}Rd`) : workingKey.reduced(name, `V${axis}Rd`);
	if (name !== null && figures.share && buckling !== null)
		workings.add(workingKey.reduced(name, 'Vbf'), () =>
			flangeWorking(figures.share!, buckling.Vbf)
		);
	if (buckling !== null) workings.add(workingKey.shear(axis, 'Vb'), () => bucklingWorking(figures));
	workings.add(total, () => resistanceWorking(model, figures));
}

function areaWorking({ code }: EnModel, { axis, area }: ShearFigures): Working {
	const { formula, inputs, letter } = area;
	return {
		title: `Shear area along ${axis}`,
		clause: `${clauseOf(code.standard, 'shear')}(3)${letter === null ? '' : ` ${letter}`}`,
		edition: editionName(code.standard),
		formula,
		inputs,
		result: { value: area.area, unit: 'mm²' },
		...(letter === null ? { notes: ['shear-area-from-practice'] } : {})
	};
}

function plasticWorking({ code }: EnModel, { axis, area, fy, plastic }: ShearFigures): Working {
	return {
		title: `Plastic shear resistance along ${axis}`,
		clause: `${clauseOf(code.standard, 'shear')}(2)`,
		edition: editionName(code.standard),
		formula: 'V_pl,Rd = A_v·fy/(√(3)·γM0)·10^-3',
		inputs: [
			one('A_v', area.area, 'mm²', workingKey.shear(axis, 'area')),
			one('fy', fy, 'N/mm²', `strength of the ${area.plate}`),
			one('γM0', code.gammaM0, '', 'chosen with the code')
		],
		result: { value: plastic, unit: 'kN' }
	};
}

function explainPanel({ workings, code }: EnModel, axis: 'y' | 'z', found: PanelBuckling): void {
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

function flangeWorking({ inputs }: FlangeShare, value: number): Working {
	return {
		title: 'Part of the flanges in the shear buckling resistance',
		clause: `${plated} 5.4(1)`,
		edition: plated,
		formula: 'V_bf,Rd = bf·tf²·fyf/(c·γM1)·(1 − (M_Ed/M_f,Rd)²)·10^-3',
		inputs,
		result: { value, unit: 'kN' }
	};
}

function bucklingWorking({ axis, checked, buckling, name }: ShearFigures): Working {
	const { Vbw, Vbf, Vb } = buckling!;
	const most = checked.reduce((sum, panel) => sum + panel.most, 0);
	const parts = checked.map(({ panel }) => workingKey.shear(axis, `${panel.part}.Vbw`));
	const from =
		Vbf > 0 && name !== null
			? workingKey.reduced(name, 'Vbf')
			: 'none without stiffeners between supports, beyond Mf,Rd or without a demand';
	return {
		title: 'Shear buckling resistance with the flanges',
		clause: `${plated} 5.2(1)`,
		edition: plated,
		formula: 'V_b,Rd = min(V_bw,Rd + V_bf,Rd, V_max)',
		inputs: [
			one('V_bw,Rd', Vbw, 'kN', parts.join(', ')),
			one('V_bf,Rd', Vbf, 'kN', from),
			one('V_max', most, 'kN', 'η fyw hw t/(√3 γM1)')
		],
		result: { value: Vb, unit: 'kN' }
	};
}

function resistanceWorking(
	{ code }: EnModel,
	{ axis, plastic, buckling, resistance }: ShearFigures
): Working {
	const plain = one('V_pl,Rd', plastic, 'kN', workingKey.shear(axis, 'Vpl'));
	return {
		title: `Shear resistance along ${axis}`,
		clause: clauseOf(code.standard, 'shear'),
		edition: editionName(code.standard),
		formula: buckling === null ? `V_${axis},Rd = V_pl,Rd` : `V_${axis},Rd = min(V_pl,Rd, V_b,Rd)`,
		inputs:
			buckling === null
				? [plain]
				: [plain, one('V_b,Rd', buckling.Vb, 'kN', workingKey.shear(axis, 'Vb'))],
		result: { value: resistance, unit: 'kN' }
	};
}
