import type { EnModel } from '../model';
import { effectiveSection, type EffectiveSection } from './effective-section';
import { axialWorking } from './resistance-workings';

/** Compression resistance of the effective section and the shifts of its centroid. */
export interface EffectiveAxial {
	/** kN, a size, γM0 in it. */
	readonly value: number;
	/** eNy and eNz: effective minus gross centroid, mm, to the right and upwards positive. */
	readonly shiftY: number;
	readonly shiftZ: number;
	readonly effective: EffectiveSection;
}

/**
 * Nc,Rd = Aeff fy/γM0, EN 1993-1-1 6.2.4(2)b: the area that counts under uniform compression, at the
 * weakest strength of the section (parts of different strength may not yield one after the other in class
 * 4). N at the gross centroid then also bends the section by N times the shifts, 6.2.9.3. Null for a
 * round tube.
 */
export function effectiveAxial(model: EnModel): EffectiveAxial | null {
	const effective = effectiveSection(model, 'N');
	if (effective === null) return null;
	const { strengths, code, workings } = model;
	const value = (effective.area * strengths.least * 1e-3) / code.gammaM0;
	if (workings) axialWorking(workings, effective.area, strengths.least, value, code.gammaM0);
	return {
		value,
		shiftY: effective.centroidShiftY,
		shiftZ: effective.centroidShiftZ,
		effective
	};
}
