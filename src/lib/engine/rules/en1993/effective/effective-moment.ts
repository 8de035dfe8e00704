import type { AxisSense } from '../../section-moments';
import type { EnModel } from '../model';
import { effectiveFrom, reducedSection, type EffectiveSection } from './effective-section';
import { hybridWorking, momentWorking } from './resistance-workings';
import type { StressUse } from './element-width';
import { firstFibre } from './first-fibre';
import { hybridMoment, isHybridGirder, type HybridMoment } from './hybrid-moment';
import type { Reduced } from './reduce';
import type { EffectiveBasis } from './stress-field';

/** Bending resistance of the effective section. */
export interface EffectiveMoment {
	/** kNm, a size, γM0 in it. */
	readonly value: number;
	/** The same with the neutral axis at rest. */
	readonly converged: number;
	readonly governing: 'compression' | 'tension';
	/** Moment over stress at the governing fibre, mm³; null for a hybrid whose web yields early. */
	readonly modulus: number | null;
	readonly effective: EffectiveSection;
}

export const basisOf: Readonly<Record<AxisSense, EffectiveBasis>> = {
	plusMy: '+My',
	minusMy: '−My',
	plusMz: '+Mz',
	minusMz: '−Mz'
};

/**
 * Weff fy/γM0 at the first fibre of what remains that reaches its own strength, EN 1993-1-1 6.2.5(2)
 * with EN 1993-1-5 4.4. A hybrid I or box bent about y: the webs may yield early, 4.3(6). Null for a
 * round tube.
 */
export function effectiveMoment(
	model: EnModel,
	sense: AxisSense,
	use?: StressUse
): EffectiveMoment | null {
	const basis = basisOf[sense];
	const reduced = reducedSection(model, basis, use);
	if (reduced === null) return null;
	const { once, atRest } = reduced;
	const first = strengthOf(model, sense, once);
	const rest = atRest === null || atRest === once ? first : strengthOf(model, sense, atRest);
	explain(model, basis, once, first, use);
	return {
		value: first.value,
		converged: rest.value,
		governing: first.governing,
		modulus: first.modulus,
		effective: effectiveFrom(model, basis, reduced, use)
	};
}

interface Strength extends Pick<EffectiveMoment, 'value' | 'governing' | 'modulus'> {
	readonly hybrid: HybridMoment | null;
}

function strengthOf(model: EnModel, sense: AxisSense, reduced: Reduced): Strength {
	const scale = 1e-6 / model.code.gammaM0;
	if ((sense === 'plusMy' || sense === 'minusMy') && isHybridGirder(model)) {
		const hybrid = hybridMoment(model, sense, reduced);
		return { value: hybrid.moment * scale, governing: hybrid.side, modulus: null, hybrid };
	}
	const { moment, side, modulus } = firstFibre(model, basisOf[sense], reduced);
	return { value: moment * scale, governing: side, modulus, hybrid: null };
}

function explain(
	model: EnModel,
	basis: EffectiveBasis,
	reduced: Reduced,
	{ hybrid, value }: Strength,
	use?: StressUse
): void {
	const { workings, code } = model;
	if (workings === null || use) return;
	if (hybrid) hybridWorking(workings, basis, hybrid, value, code.gammaM0);
	else momentWorking(workings, basis, firstFibre(model, basis, reduced), value, code.gammaM0);
}
