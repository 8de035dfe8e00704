import type { DemandCase } from './demand-case';
import { extremeFibres, momentToYield, worstFibre } from './elastic-stress-check';
import type { NormalRule } from './normal-rule';
import { sumName } from './normal-rule-sum';

/** Class 3, 6.2.9.2: elastic stress of N and moments within fy/γM0 at every fibre of every part. */
export function elasticRule(c: DemandCase): NormalRule {
	const { effects, size, direction } = c;
	const { model } = c.context;
	const fibres = extremeFibres(model.section, direction);
	const at = (moment: number) => worstFibre(model, fibres, effects.N, moment);
	const own = at(size);
	return {
		name: sumName(c),
		topic: 'classThree',
		value: Math.abs(own.stress),
		limit: own.strength,
		use: (moment) => at(moment).use,
		most: momentToYield(model, fibres, effects.N),
		basis: 'elastic',
		kind: 'fibre',
		reduced: {},
		working: () => ({
			formula: 'U = abs(N·10^3/A + M·s)·γM0/fy',
			inputs: [
				{ symbol: 'N', value: effects.N, unit: 'kN', from: 'demand, tension positive' },
				{ symbol: 'A', value: model.section.gross.area, unit: 'mm²', from: 'gross.area' },
				{ symbol: 'M', value: size, unit: 'kNm', from: 'demand, along its own direction' },
				{
					symbol: 's',
					value: own.fibre.perMoment,
					unit: 'N/mm² per kNm',
					from: `elastic stress of 1 kNm at the edge of ${own.fibre.part}`
				},
				{
					symbol: 'fy',
					value: own.strength * model.code.gammaM0,
					unit: 'N/mm²',
					from: own.fibre.part
				},
				{
					symbol: 'γM0',
					value: model.code.gammaM0,
					unit: '',
					from: 'partial factor of the code chosen'
				}
			],
			result: { value: own.use, unit: '' }
		})
	};
}
