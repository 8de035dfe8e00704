import { workingKey } from '../../explain/keys';
import type { Working } from '../../explain/working';
import { clauseOf, editionName } from './edition';
import type { EnModel } from './model';
import type { ShearArea } from './shear-area';
import type { PanelBuckling } from './shear-buckling';
import { explainPanel, one, plated } from './shear-buckling-workings';
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
