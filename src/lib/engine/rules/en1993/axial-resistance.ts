import type { Working } from '../../explain/working';
import type { ClassifiedCase } from './classify';
import { holedParts, netSection } from './bolt-holes';
import { axialStrength } from './axial-strength';
import { compressionWorking, tensionWorking } from './axial-workings';
import { effectiveAxial, type EffectiveAxial } from './effective/effective-axial';
import type { EffectiveSection } from './effective/effective-section';
import type { EnModel } from './model';

/** kN, design; null where none may be counted. */
export interface AxialResistance {
	readonly value: number | null;
	readonly effective: EffectiveSection | null;
	/** Effective minus gross centroid, mm: N at the gross centroid then bends the section. */
	readonly shiftY: number;
	readonly shiftZ: number;
	readonly gap: 'holes' | 'slender' | null;
	readonly working: (() => Working) | null;
}

const plain = { effective: null, shiftY: 0, shiftZ: 0, gap: null, working: null };

/** Resistance to N of that sign for a section of that class: 6.2.3 in tension, 6.2.4 in compression. */
export const axialResistance = (
	model: EnModel,
	N: number,
	classified: ClassifiedCase,
	slender?: () => EffectiveAxial | null
): AxialResistance =>
	N > 0 ? tensionResistance(model) : compressionResistance(model, classified, slender);

/** Compression 6.2.4: A fy/γM0, class 4 Aeff fy/γM0; holes filled by fasteners are not deducted. */
export function compressionResistance(
	model: EnModel,
	{ overall }: ClassifiedCase,
	slender: () => EffectiveAxial | null = () => effectiveAxial(model)
): AxialResistance {
	if (overall < 4) {
		const value = axialStrength(model, overall <= 2) / model.code.gammaM0;
		return { ...plain, value, working: () => compressionWorking(model, overall <= 2, value) };
	}
	const found = slender();
	if (found === null) return { ...plain, value: null, gap: 'slender' };
	const { value, shiftY, shiftZ, effective } = found;
	return {
		value,
		effective,
		shiftY,
		shiftZ,
		gap: null,
		working: () => compressionWorking(model, false, value, effective)
	};
}

/** Tension 6.2.3: the lesser of A fy/γM0 and, with bolt holes, 0.9 Anet fu/γM2. */
export function tensionResistance(model: EnModel): AxialResistance {
	const gross = axialStrength(model, true) / model.code.gammaM0;
	if (holedParts(model.section).length === 0)
		return { ...plain, value: gross, working: () => tensionWorking(model, null, gross) };
	const net = netSection(model);
	if (net === null) return { ...plain, value: null, gap: 'holes' };
	const value = Math.min(gross, net.value);
	return { ...plain, value, working: () => tensionWorking(model, net, value) };
}
