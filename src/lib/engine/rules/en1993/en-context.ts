import type { AxisSense } from '../section-moments';
import { axialResistance, type AxialResistance } from './axial-resistance';
import { bendingResistance, type BendingResistance } from './bending-resistance';
import type { ClassifiedCase } from './classify';
import { effectiveAxial, type EffectiveAxial } from './effective/effective-axial';
import { effectiveMoment, type EffectiveMoment } from './effective/effective-moment';
import type { EnModel, PureCases } from './model';

/** A model with its pure cases; effective sections are found once for all demands. */
export interface EnContext {
	readonly model: EnModel;
	readonly cases: PureCases;
	readonly bending: (
		sense: AxisSense,
		classified: ClassifiedCase,
		alone?: boolean
	) => BendingResistance;
	readonly axial: (N: number, classified: ClassifiedCase) => AxialResistance;
}

export function contextOf(model: EnModel, cases: PureCases): EnContext {
	const moments = new Map<AxisSense, EffectiveMoment | null>();
	let axial: EffectiveAxial | null | undefined;
	const slender = {
		moment(sense: AxisSense) {
			if (!moments.has(sense)) moments.set(sense, effectiveMoment(model, sense));
			return moments.get(sense) ?? null;
		},
		axial: () => (axial === undefined ? (axial = effectiveAxial(model)) : axial)
	};
	return {
		model,
		cases,
		bending: (sense, classified, alone = true) =>
			bendingResistance(model, sense, classified, alone, slender.moment),
		axial: (N, classified) => axialResistance(model, N, classified, slender.axial)
	};
}
