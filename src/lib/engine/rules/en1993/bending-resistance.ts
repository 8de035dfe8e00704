import type { ClassifiedElement, Resistance } from '../result';
import type { AxisSense } from '../section-moments';
import type { ClassifiedCase } from './classify';
import { effectiveClassTwoMoment } from './effective-class-two';
import type { EnModel } from './model';

/** kNm; null where no moment may be counted. */
export interface BendingResistance {
	readonly value: number | null;
	readonly basis: Resistance['basis'];
	/** A class 3 web that might be taken as class 2 but has no such resistance. */
	readonly webRefused: boolean;
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
	if (classified.overall === 4) return { value: null, basis: 'effective', webRefused: false };
	if (classified.overall <= 2)
		return { value: over(plastic.moment, gammaM0), basis: 'plastic', webRefused: false };
	const elastic = over(firstYield, gammaM0);
	const web = effectiveWeb ? classTwoWeb(sense, classified) : undefined;
	const reduced = web ? over(classTwoMoment(model, sense, web), gammaM0) : null;
	return reduced !== null && elastic !== null && reduced > elastic
		? { value: reduced, basis: 'effective-class-2', webRefused: false }
		: { value: elastic, basis: 'elastic', webRefused: web !== undefined && reduced === null };
}

const over = (moment: number | null, gamma: number) => (moment === null ? null : moment / gamma);

/** The class 3 web between class 1 or 2 flanges in bending about y, if that is what it is. */
function classTwoWeb(
	sense: AxisSense,
	{ elements }: ClassifiedCase
): ClassifiedElement | undefined {
	if (sense === 'plusMz' || sense === 'minusMz') return undefined;
	const webs = elements.filter(({ part }) => /web$/i.test(part));
	const flanges = elements.filter((element) => !webs.includes(element));
	if (flanges.some((flange) => flange.class > 2)) return undefined;
	return webs.find((web) => web.class === 3);
}

const classTwoMoment = (
	{ section }: EnModel,
	sense: AxisSense,
	{ epsilon }: ClassifiedElement
): number | null => effectiveClassTwoMoment(section, sense === 'plusMy', epsilon);
