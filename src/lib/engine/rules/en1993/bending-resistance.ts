import type { Resistance } from '../result';
import type { AxisSense } from '../section-moments';
import type { ClassifiedCase } from './classify';
import { effectiveClassTwoMoment } from './effective-class-two';
import type { EnModel } from './model';

/** kNm; null where no moment may be counted. */
export interface BendingResistance {
	readonly value: number | null;
	readonly basis: Resistance['basis'];
}

/**
 * Moment resistance 6.2.5 in one sense for a section of that class: plastic (1, 2), first yield
 * at any fibre (3), or the effective class 2 section of 6.2.2.4 for a class 3 web between class 1
 * or 2 flanges, where that gives more. Class 4: null. Holes are the business of `bolt-holes`.
 */
export function bendingResistance(
	model: EnModel,
	sense: AxisSense,
	classified: ClassifiedCase,
	effectiveWeb = model.code.allowEffectiveClass2
): BendingResistance {
	const { plastic, firstYield } = model.moments[sense];
	const { gammaM0 } = model.code;
	if (classified.overall === 4) return { value: null, basis: 'effective' };
	if (classified.overall <= 2) return { value: over(plastic.moment, gammaM0), basis: 'plastic' };
	const elastic = over(firstYield, gammaM0);
	const reduced = effectiveWeb ? over(classTwoMoment(model, sense, classified), gammaM0) : null;
	return reduced !== null && elastic !== null && reduced > elastic
		? { value: reduced, basis: 'effective-class-2' }
		: { value: elastic, basis: 'elastic' };
}

const over = (moment: number | null, gamma: number) => (moment === null ? null : moment / gamma);

function classTwoMoment(
	{ section }: EnModel,
	sense: AxisSense,
	{ elements }: ClassifiedCase
): number | null {
	if (sense === 'plusMz' || sense === 'minusMz') return null;
	const webs = elements.filter(({ part }) => /web$/i.test(part));
	const flanges = elements.filter((element) => !webs.includes(element));
	const slenderWeb = webs.find((web) => web.class === 3);
	if (!slenderWeb || flanges.some((flange) => flange.class > 2)) return null;
	return effectiveClassTwoMoment(section, sense === 'plusMy', slenderWeb.epsilon);
}
