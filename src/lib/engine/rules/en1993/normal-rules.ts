import { holedParts } from './bolt-holes';
import { singleSense, type DemandCase } from './demand-case';
import { isRule, type NormalRule, type NoRule } from './normal-rule';
import { addedMoments } from './shifted-centroid';
import { elasticRule } from './normal-rule-elastic';
import { plasticRule } from './normal-rule-plastic';
import { shearedRule } from './normal-rule-sheared';
import { sumRule } from './normal-rule-sum';

/**
 * The rule that judges the moments of a demand beside its N and V: 6.2.5 alone, 6.2.8 to 6.2.10
 * together, by the class that the demand puts the section in.
 */
export function normalRule(c: DemandCase): NormalRule | NoRule {
	if (c.shear.high) return shearedRule(c);
	const sense = singleSense(c.direction);
	if (c.effects.N === 0 && sense !== null) return aloneRule(c, sense);
	const { overall } = c.classified;
	if (holedParts(c.context.model.section).length > 0 || overall === 4) return addedRule(c);
	if (overall <= 2) return plasticRule(c);
	return isInterpolated(c) ? addedRule(c) : elasticRule(c);
}

function aloneRule(
	c: DemandCase,
	sense: NonNullable<ReturnType<typeof singleSense>>
): NormalRule | NoRule {
	const { value, basis, gap } = c.context.bending(sense, c.classified);
	if (value === null || value <= 0) return { gap: gap ?? 'slender' };
	const y = sense === 'plusMy' || sense === 'minusMy';
	return {
		name: y ? 'bending about y–y' : 'bending about z–z',
		topic: 'bending',
		value: c.size,
		limit: value,
		use: (moment) => moment / value,
		most: value,
		basis,
		kind: 'alone',
		reduced: {},
		working: () => ({
			formula: 'U = M_Ed/M_c,Rd',
			inputs: [
				{ symbol: 'M_Ed', value: c.size, unit: 'kNm', from: 'demand' },
				{ symbol: 'M_c,Rd', value, unit: 'kNm', from: y ? 'resistance.MyRd' : 'resistance.MzRd' }
			],
			result: { value: c.size / value, unit: '' }
		})
	};
}

/** Whether a class 3 moment counts more than first yield, so that stresses no longer say all. */
function isInterpolated(c: DemandCase): boolean {
	const { direction, classified, context } = c;
	const senses = [
		direction.y === 0 ? null : direction.y > 0 ? ('plusMy' as const) : ('minusMy' as const),
		direction.z === 0 ? null : direction.z > 0 ? ('plusMz' as const) : ('minusMz' as const)
	];
	return senses.some(
		(sense) => sense !== null && context.bending(sense, classified, false).basis === 'interpolated'
	);
}

/** Shares added up: 6.2.9.3 in class 4 with the moments of a shifted centroid, else 6.2.1(7). */
function addedRule(c: DemandCase): NormalRule | NoRule {
	const { effects, classified, context } = c;
	const axial = effects.N === 0 ? null : context.axial(effects.N, classified);
	if (axial && axial.value === null) return { gap: axial.gap ?? 'slender' };
	const limit = (sense: 'plusMy' | 'minusMy' | 'plusMz' | 'minusMz') =>
		context.bending(sense, classified, false).value;
	const { addedY, addedZ } = addedMoments(context.model, effects.N, axial);
	const rule = sumRule(
		c,
		{
			axial: axial?.value ? Math.abs(effects.N) / axial.value : 0,
			axialLimit: axial?.value ?? null,
			addedY,
			addedZ,
			limitY: limit,
			limitZ: limit
		},
		{
			topic: classified.overall === 4 ? 'classFour' : 'linearSum',
			basis: c.size === 0 ? 'effective' : basisOf(c),
			reduced: {
				...(addedY === 0 ? {} : { deltaMy: addedY }),
				...(addedZ === 0 ? {} : { deltaMz: addedZ })
			}
		}
	);
	return rule;
}

function basisOf({ direction, classified, context }: DemandCase): NormalRule['basis'] {
	const sense = direction.y === 0 ? 'plusMz' : direction.y > 0 ? 'plusMy' : 'minusMy';
	return context.bending(sense, classified, false).basis;
}

/** Use of N alone with the moments that a shifted effective centroid adds; 0 where there are none. */
export function sumUseOfAxial(c: DemandCase): number {
	if (c.effects.N === 0 || c.classified.overall !== 4) return 0;
	const rule = addedRule(c);
	return isRule(rule) ? rule.use(0) : 0;
}
