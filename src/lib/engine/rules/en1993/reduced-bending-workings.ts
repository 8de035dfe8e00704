import { workingKey } from '../../explain/keys';
import type { Working } from '../../explain/working';
import type { AxisSense } from '../section-moments';
import { axisOf, bendingTitle, factor, same, strength } from './bending-workings';
import type { PulledPart } from './bolt-holes';
import { clauseOf, editionName } from './edition';
import type { EffectiveSection } from './effective/effective-section';
import type { EnModel } from './model';

/** W_eff fy/γM0 of the section that remains. */
export function effectiveMomentWorking(
	model: EnModel,
	sense: AxisSense,
	effective: EffectiveSection,
	value: number
): Working {
	const axis = axisOf(sense);
	const sides = axis === 'Y' ? (['Top', 'Bottom'] as const) : (['Left', 'Right'] as const);
	const figures = effective as unknown as Record<string, number>;
	const W = sides.map((side) => figures[`elasticModulus${axis}${side}`]!);
	const { strengths, code } = model;
	const byModulus = (Math.min(...W) * strengths.least * 1e-6) / code.gammaM0;
	const edition = editionName(code.standard);
	const clause = `${clauseOf(code.standard, 'bending')}; EN 1993-1-5 4.4`;
	const title = `${bendingTitle[sense]}, effective section`;
	if (Math.abs(byModulus / value - 1) <= same)
		return {
			title,
			clause,
			edition,
			formula: `M_c,Rd = min(W_eff,${sides[0].toLowerCase()}, W_eff,${sides[1].toLowerCase()})·fy/γM0·10^-6`,
			inputs: [
				...sides.map((side, i) => ({
					symbol: `W_eff,${side.toLowerCase()}`,
					value: W[i]!,
					unit: 'mm³',
					from: workingKey.effective(effective.basis, `elasticModulus${axis}${side}`)
				})),
				strength(strengths.least),
				factor(model)
			],
			result: { value, unit: 'kNm' }
		};
	return {
		title,
		clause: `${clause}; 4.3(6)`,
		edition,
		formula: 'M_c,Rd = M_eff/γM0',
		inputs: [
			{
				symbol: 'M_eff',
				value: value * code.gammaM0,
				unit: 'kNm',
				from: 'effective section, each part up to its own strength'
			},
			factor(model)
		],
		result: { value, unit: 'kNm' }
	};
}

/** The moment of the section with its pulled parts reduced for holes. */
export function holedMomentWorking(
	model: EnModel,
	pulled: readonly PulledPart[],
	moment: number,
	value: number
): Working {
	const { standard } = model.code;
	const shares = pulled.map(({ part, share }) => `${part.name} ${(100 * share).toFixed(1)} %`);
	return {
		title: 'Moment resistance with bolt holes on the pulled side',
		clause: clauseOf(standard, 'tensionHoles'),
		edition: editionName(standard),
		formula: 'M_c,Rd = M_net/γM0',
		inputs: [
			{
				symbol: 'M_net',
				value: moment,
				unit: 'kNm',
				from: `section with 0.9·A_net·fu/γM2 over A·fy/γM0 of its pulled area: ${shares.join(', ')}`
			},
			factor(model)
		],
		result: { value, unit: 'kNm' }
	};
}
