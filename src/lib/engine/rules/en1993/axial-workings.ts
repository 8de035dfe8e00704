import { regionMoments } from '../../geometry/moments';
import { workingKey } from '../../explain/keys';
import type { Working, WorkingInput } from '../../explain/working';
import { isCentred } from './axial-strength';
import { clauseOf, editionName } from './edition';
import type { EffectiveSection } from './effective/effective-section';
import type { EnModel } from './model';

const factor = (model: EnModel): WorkingInput => ({
	symbol: 'γM0',
	value: model.code.gammaM0,
	unit: '',
	from: 'partial factor of the code chosen'
});

/** A fy or the forces of all parts, in newton, as a formula with its inputs. */
function yielding(model: EnModel, plastic: boolean) {
	const { section, strengths } = model;
	if (strengths.hybrid && plastic && isCentred(model)) {
		const { parts } = section;
		const inputs = parts.flatMap(({ region, material }, i): WorkingInput[] => [
			{
				symbol: `A_${i + 1}`,
				value: regionMoments(region, section.gross.centroid).area,
				unit: 'mm²',
				from: parts[i]!.name
			},
			{
				symbol: `fy_${i + 1}`,
				value: Math.min(material.fy, material.fyc),
				unit: 'N/mm²',
				from: parts[i]!.name
			}
		]);
		return { formula: `(${parts.map((_, i) => `A_${i + 1}·fy_${i + 1}`).join(' + ')})`, inputs };
	}
	const inputs: WorkingInput[] = [
		{ symbol: 'A', value: section.gross.area, unit: 'mm²', from: workingKey.gross('area') },
		{ symbol: 'fy', value: strengths.least, unit: 'N/mm²', from: 'grade, the weakest part' }
	];
	return { formula: 'A·fy', inputs };
}

/** A fy/γM0, or Aeff fy/γM0 in class 4. */
export function compressionWorking(
	model: EnModel,
	plastic: boolean,
	value: number,
	effective?: EffectiveSection
): Working {
	const { standard } = model.code;
	const head = {
		title: 'Resistance to compression',
		clause: clauseOf(standard, 'compression'),
		edition: editionName(standard),
		result: { value, unit: 'kN' }
	};
	if (!effective) {
		const { formula, inputs } = yielding(model, plastic);
		return {
			...head,
			formula: `N_c,Rd = ${formula}/γM0·10^-3`,
			inputs: [...inputs, factor(model)]
		};
	}
	const { area } = effective;
	return {
		...head,
		title: 'Resistance to compression, effective section',
		clause: `${head.clause}; EN 1993-1-5 4.4`,
		formula: 'N_c,Rd = A_eff·fy/γM0·10^-3',
		inputs: [
			{ symbol: 'A_eff', value: area, unit: 'mm²', from: workingKey.effective('N', 'area') },
			{
				symbol: 'fy',
				value: (value * model.code.gammaM0 * 1e3) / area,
				unit: 'N/mm²',
				from: 'grade'
			},
			factor(model)
		]
	};
}

/** min(A fy/γM0, 0.9 Anet fu/γM2). */
export function tensionWorking(
	model: EnModel,
	net: { area: number; fu: number } | null,
	value: number
): Working {
	const { standard, gammaM2 } = model.code;
	const { formula, inputs } = yielding(model, true);
	const whole = `${formula}/γM0·10^-3`;
	return {
		title: 'Resistance to tension',
		clause: clauseOf(standard, 'tension'),
		edition: editionName(standard),
		formula: net ? `N_t,Rd = min(${whole}, 0.9·A_net·fu/γM2·10^-3)` : `N_t,Rd = ${whole}`,
		inputs: [
			...inputs,
			factor(model),
			...(net
				? [
						{ symbol: 'A_net', value: net.area, unit: 'mm²', from: 'area less the bolt holes' },
						{ symbol: 'fu', value: net.fu, unit: 'N/mm²', from: 'grade, the weakest part' },
						{ symbol: 'γM2', value: gammaM2, unit: '', from: 'partial factor of the code chosen' }
					]
				: [])
		],
		result: { value, unit: 'kN' }
	};
}
