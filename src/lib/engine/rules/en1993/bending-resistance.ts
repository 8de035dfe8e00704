import type { Working } from '../../explain/working';
import type { Resistance } from '../result';
import type { AxisSense } from '../section-moments';
import {
	holedElasticMoment,
	holedPlasticMoment,
	holedParts,
	pulledParts,
	type PulledPart
} from './bolt-holes';
import type { ClassifiedCase } from './classify';
import { editionName } from './edition';
import { effectiveMoment, type EffectiveMoment } from './effective/effective-moment';
import type { EffectiveSection } from './effective/effective-section';
import { effectiveClassTwo, effectiveClassTwoWorking } from './effective-class-two';
import { interpolationOf, type Interpolation } from './interpolated-modulus';
import {
	elasticMomentWorking,
	interpolatedMomentWorking,
	plasticMomentWorking
} from './bending-workings';
import { effectiveMomentWorking, holedMomentWorking } from './reduced-bending-workings';
import type { EnModel } from './model';

/** kNm, design; null where no moment may be counted. */
export interface BendingResistance {
	readonly value: number | null;
	readonly basis: Resistance['basis'];
	/** A class 3 web that might be taken as class 2 but has no such resistance. */
	readonly webRefused: boolean;
	readonly effective: EffectiveSection | null;
	/** Interpolated between Wel and Wpl, where it is. */
	readonly interpolation: Interpolation | null;
	/** Why there is no figure: holes in a grade without fu, or a slender tube or holed slender plate. */
	readonly gap: 'holes' | 'slender' | null;
	readonly working: (() => Working) | null;
}

const plain = { webRefused: false, effective: null, interpolation: null, gap: null, working: null };

/**
 * Moment resistance 6.2.5 in one sense for a section of that class: plastic (1, 2); for class 3
 * first yield at any fibre, or what more the effective class 2 section of 6.2.2.4 gives; in the 2022
 * edition the interpolated modulus of Annex B in its place where that has a row; for class 4 the effective section of
 * EN 1993-1-5. Bolt holes on the pulled side are deducted. `alone`: nothing acts beside this moment,
 * so that a class 3 web may be taken as class 2; `slender` gives the effective section of a sense.
 */
export function bendingResistance(
	model: EnModel,
	sense: AxisSense,
	classified: ClassifiedCase,
	alone = true,
	slender: (sense: AxisSense) => EffectiveMoment | null = (own) => effectiveMoment(model, own)
): BendingResistance {
	const pulled = holedParts(model.section).length === 0 ? [] : pulledParts(model, sense);
	if (pulled === null) return { ...plain, value: null, basis: basisOf(classified), gap: 'holes' };
	const weaker = pulled.filter(({ share }) => share < 1);
	if (weaker.length > 0) return holedResistance(model, sense, classified, weaker);
	if (classified.overall === 4) return slenderResistance(model, sense, slender(sense));
	if (classified.overall <= 2) return plasticResistance(model, sense);
	return classThreeResistance(model, sense, classified, alone);
}

const basisOf = ({ overall }: ClassifiedCase): Resistance['basis'] =>
	overall <= 2 ? 'plastic' : overall === 3 ? 'elastic' : 'effective';

function plasticResistance(model: EnModel, sense: AxisSense): BendingResistance {
	const { moment } = model.moments[sense].plastic;
	if (moment === null) return { ...plain, value: null, basis: 'plastic' };
	const value = moment / model.code.gammaM0;
	return {
		...plain,
		value,
		basis: 'plastic',
		working: () => plasticMomentWorking(model, sense, value)
	};
}

function classThreeResistance(
	model: EnModel,
	sense: AxisSense,
	classified: ClassifiedCase,
	alone: boolean
): BendingResistance {
	const { plastic, firstYield } = model.moments[sense];
	const { gammaM0, standard, allowEffectiveClass2 } = model.code;
	if (firstYield === null) return { ...plain, value: null, basis: 'elastic' };
	const elastic: BendingResistance = {
		...plain,
		value: firstYield / gammaM0,
		basis: 'elastic',
		working: () => elasticMomentWorking(model, sense, firstYield / gammaM0)
	};
	if (classified.firstYieldOnly) return elastic;
	const found = [elastic];
	const interpolation = interpolationOf(model, sense, classified);
	if (interpolation !== null && plastic.moment !== null) {
		const value = (plastic.moment - (plastic.moment - firstYield) * interpolation.beta) / gammaM0;
		found.push({
			...plain,
			value,
			basis: 'interpolated',
			interpolation,
			working: () => interpolatedMomentWorking(model, sense, interpolation, value)
		});
	}
	const mayWeb = alone && allowEffectiveClass2 && interpolation === null;
	const web = mayWeb ? effectiveClassTwo(model, sense, classified) : null;
	if (web?.kind === 'taken')
		found.push({
			...plain,
			value: web.moment / gammaM0,
			basis: 'effective-class-2',
			working: () => effectiveClassTwoWorking(web, gammaM0, editionName(standard))
		});
	const most = found.reduce((a, b) => ((b.value ?? 0) > (a.value ?? 0) ? b : a));
	return { ...most, webRefused: most.basis === 'elastic' && web?.kind === 'refused' };
}

function slenderResistance(
	model: EnModel,
	sense: AxisSense,
	found: EffectiveMoment | null
): BendingResistance {
	if (found === null) return { ...plain, value: null, basis: 'effective', gap: 'slender' };
	const { value, effective } = found;
	return {
		...plain,
		value,
		basis: 'effective',
		effective,
		working: () => effectiveMomentWorking(model, sense, effective, value)
	};
}

/** With holes that weaken the pulled side: class 1 and 2 plastic, class 3 elastic, class 4 none. */
function holedResistance(
	model: EnModel,
	sense: AxisSense,
	classified: ClassifiedCase,
	weaker: readonly PulledPart[]
): BendingResistance {
	const basis = basisOf(classified);
	if (classified.overall === 4) return { ...plain, value: null, basis, gap: 'holes' };
	const moment =
		classified.overall <= 2
			? holedPlasticMoment(model, sense, weaker)
			: Math.min(holedElasticMoment(model, sense, weaker), model.moments[sense].firstYield ?? 0);
	if (moment === null) return { ...plain, value: null, basis, gap: 'holes' };
	const value = moment / model.code.gammaM0;
	return {
		...plain,
		value,
		basis,
		working: () => holedMomentWorking(model, weaker, moment, value)
	};
}
