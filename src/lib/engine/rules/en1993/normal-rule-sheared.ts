import { plasticMomentOf } from '../../response/plastic';
import type { WorkingInput } from '../../explain/working';
import { angleOf, singleSense, type DemandCase } from './demand-case';
import { momentUnderShear, shearedMechanics } from './moment-shear';
import type { NormalRule, NoRule } from './normal-rule';
import { sumName, sumRule } from './normal-rule-sum';
import { addedMoments } from './shifted-centroid';
import { shearedAxial, shearLosses } from './shear-state';

/**
 * Beside high shear, 6.2.8 and 6.2.10. Bending about one axis alone: the code's reduced moment.
 * With N or about both axes: class 1 and 2 by the plastic block with (1 − ρ) fy on the shear areas,
 * class 3 and 4 by the linear sum of resistances that are all reduced by the greater ρ.
 */
export function shearedRule(c: DemandCase): NormalRule | NoRule {
	const { effects, direction, shear, classified, context } = c;
	const sense = singleSense(direction);
	const own = sense === null || sense === 'plusMy' || sense === 'minusMy' ? 'z' : 'y';
	const crossed = own === 'z' ? shear.rhoY > 0 : shear.rhoZ > 0;
	if (sense !== null && effects.N === 0 && !crossed) {
		const V = own === 'z' ? (c.demand.Vz ?? 0) : (c.demand.Vy ?? 0);
		const bending = context.bending(sense, classified);
		const counted = { value: bending.value, overall: classified.overall };
		const along = shear.resistances[own];
		const { MyVRd } = momentUnderShear(context.model, sense, counted, V, along, c.name);
		if (MyVRd !== null && MyVRd > 0) return aloneUnderShear(c, own, MyVRd, bending.basis);
	}
	const block = classified.overall <= 2 ? shearedBlock(c) : null;
	return block ?? reducedSum(c);
}

function aloneUnderShear(
	c: DemandCase,
	own: 'y' | 'z',
	value: number,
	basis: NormalRule['basis']
): NormalRule {
	return {
		name: own === 'z' ? 'bending about y–y beside shear' : 'bending about z–z beside shear',
		topic: 'bendingShear',
		value: c.size,
		limit: value,
		use: (moment) => moment / value,
		most: value,
		basis,
		kind: 'alone',
		reduced: own === 'z' ? { MyVRd: value } : { MzVRd: value },
		working: () => ({
			formula: 'U = M_Ed/M_V,Rd',
			inputs: [
				{ symbol: 'M_Ed', value: c.size, unit: 'kNm', from: 'demand' },
				{ symbol: 'M_V,Rd', value, unit: 'kNm', from: 'moment resistance beside this shear' }
			],
			result: { value: c.size / value, unit: '' }
		})
	};
}

/** The plastic block of the weakened section; null where it cannot be taken, holes among others. */
function shearedBlock(c: DemandCase): NormalRule | null {
	const { model } = c.context;
	const { N } = c.effects;
	const { kind, boltHoles = [] } = model.section.definition;
	// a tube's wall is only partly in the shear area: the block would not know which part
	if (boltHoles.length > 0 || kind.endsWith('hollow')) return null;
	const mechanics = shearedMechanics(model, shearLosses(c.shear));
	const { gammaM0 } = model.code;
	const NVRd = shearedAxial(model, mechanics);
	if (Math.abs(N) >= NVRd) return null;
	const path = {
		axisAngle: angleOf(c.direction),
		transverse: 'moment-zero',
		N: N * gammaM0
	} as const;
	const moment = plasticMomentOf(mechanics, path).moment;
	if (moment === null || moment <= 0) return null;
	const value = moment / gammaM0;
	const inputs: WorkingInput[] = [
		{ symbol: 'M_Ed', value: c.size, unit: 'kNm', from: 'demand' },
		{
			symbol: 'M_NV,Rd',
			value,
			unit: 'kNm',
			from: `plastic block with (1 − ρ) fy on the shear areas, ρy ${c.shear.rhoY.toFixed(3)}, ρz ${c.shear.rhoZ.toFixed(3)}`
		}
	];
	return {
		name: `${N === 0 && singleSense(c.direction) !== null ? 'bending' : sumName(c)} beside shear`,
		topic: 'bendingShearAxial',
		value: c.size,
		limit: value,
		use: (m) => m / value,
		most: value,
		basis: 'plastic',
		kind: 'curve',
		reduced: { MNVRd: value, ...(N === 0 ? {} : { NVRd }) },
		working: () => ({
			formula: 'U = M_Ed/M_NV,Rd',
			inputs,
			result: { value: c.size / value, unit: '' }
		})
	};
}

/** All resistances times 1 − ρ with the greater ρ, added up. */
function reducedSum(c: DemandCase): NormalRule | NoRule {
	const { effects, classified, context, shear } = c;
	const left = Math.max(1 - Math.max(shear.rhoY, shear.rhoZ), leastLeft);
	const axial = effects.N === 0 ? null : context.axial(effects.N, classified);
	if (axial && axial.value === null) return { gap: axial.gap ?? 'slender' };
	const NRd = axial?.value ? axial.value * left : null;
	const limit = (sense: 'plusMy' | 'minusMy' | 'plusMz' | 'minusMz') => {
		const { value } = context.bending(sense, classified, false);
		return value === null ? null : value * left;
	};
	return sumRule(
		c,
		{
			axial: NRd === null ? 0 : Math.abs(effects.N) / NRd,
			axialLimit: NRd,
			...addedMoments(context.model, effects.N, axial),
			limitY: limit,
			limitZ: limit
		},
		{
			topic: 'bendingShearAxial',
			also: 'all resistances times 1 − ρ',
			basis: context.bending('plusMy', classified, false).basis,
			reduced: NRd === null ? {} : { NVRd: NRd }
		}
	);
}

/** At V = VRd nothing would be left; this keeps figures finite. */
const leastLeft = 1e-9;
