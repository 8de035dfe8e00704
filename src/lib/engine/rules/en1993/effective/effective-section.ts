import type { Note } from '../../../result';
import type { EnModel } from '../model';
import type { StressUse } from './element-width';
import { effectiveProperties, type EffectiveProperties } from './effective-properties';
import { effectiveWorkings } from './effective-workings';
import { platesOf } from './plate-widths';
import { reducedAtRest, reducedOnce, type Reduced } from './reduce';
import type { EffectiveBasis } from './stress-field';

export type { EffectiveElement, EffectiveProperties, RemovedStrip } from './effective-properties';
export type { EffectiveBasis } from './stress-field';

/** The effective section of one basis: the code's one pass, and the same with its neutral axis at rest. */
export interface EffectiveSection extends EffectiveProperties {
	readonly basis: EffectiveBasis;
	/** The one-pass figures themselves where the axis does not come to rest; a note says so. */
	readonly converged: EffectiveProperties;
	readonly notes: readonly Note[];
}

/**
 * Effective section by EN 1993-1-5 4.4 under bending in one sense or compression alone. Bending is about
 * the axis through the effective centroid parallel to the asked one, with no moment across it. With
 * `use` (greatest design compression of an element over fy/γM0) the reductions follow 4.4(4). Null for a
 * round tube: EN 1993-1-6.
 */
export function effectiveSection(
	model: EnModel,
	basis: EffectiveBasis,
	use?: StressUse
): EffectiveSection | null {
	const reduced = reducedSection(model, basis, use);
	return reduced === null ? null : effectiveFrom(model, basis, reduced, use);
}

/** The answer from a section that is reduced already. */
export function effectiveFrom(
	model: EnModel,
	basis: EffectiveBasis,
	{ once, atRest }: ReducedBoth,
	use?: StressUse
): EffectiveSection {
	const { section, workings } = model;
	const figures = effectiveProperties(section, once);
	const last = atRest ?? once;
	const converged = last === once ? figures : effectiveProperties(section, last);
	if (workings && !use) {
		effectiveWorkings(workings, section, basis, once, figures);
		effectiveWorkings(workings, section, `${basis} converged`, last, converged);
	}
	return {
		...figures,
		basis,
		converged,
		notes: [
			...(atRest === null ? [notAtRest] : []),
			...(use ? [stressLevelUsed] : []),
			...(isSkew(basis, figures) ? [noMomentAcross] : [])
		]
	};
}

/** One pass, and with the axis at rest; null where it does not come to rest. */
export interface ReducedBoth {
	readonly once: Reduced;
	readonly atRest: Reduced | null;
}

/** The reduced section in its bare form. */
export function reducedSection(
	model: EnModel,
	basis: EffectiveBasis,
	use?: StressUse
): ReducedBoth | null {
	const plates = platesOf(model);
	if (plates === null) return null;
	const source = { gross: model.section.gross, plates, basis, use };
	const once = reducedOnce(source);
	return { once, atRest: reducedAtRest(source, once) };
}

/** Product of inertia beyond rounding, as a share of Iy + Iz. */
const leastProduct = 1e-9;

function isSkew(
	basis: EffectiveBasis,
	{ productYZ, secondMomentY, secondMomentZ }: EffectiveProperties
): boolean {
	return basis !== 'N' && Math.abs(productYZ) > leastProduct * (secondMomentY + secondMomentZ);
}

const notAtRest: Note = {
	code: 'effective-section-not-converged',
	message:
		'The neutral axis of the effective section does not come to rest when it is iterated; the one-pass figures are given for the converged ones.',
	clause: 'EN 1993-1-5 4.4(3)'
};

const stressLevelUsed: Note = {
	code: 'effective-stress-level',
	message:
		'Effective widths follow the design stress of each part instead of its yield strength. They may not be used for member buckling.',
	clause: 'EN 1993-1-5 4.4(4)'
};

const noMomentAcross: Note = {
	code: 'effective-section-skew',
	message:
		'The effective section has no axis of symmetry: its stresses are those of a moment about the asked axis alone, with no moment across it.',
	clause: 'EN 1993-1-5 4.4(3)'
};
