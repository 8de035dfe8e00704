import type { Note } from '../../../result';
import type { AxisSense } from '../../section-moments';
import type { EnModel } from '../model';
import { effectiveFrom, reducedSection, type EffectiveSection } from './effective-section';
import { grossWorking, hybridWorking, momentWorking } from './resistance-workings';
import type { StressUse } from './element-width';
import { firstFibre } from './first-fibre';
import { hybridMoment, isHybridGirder, type HybridMoment } from './hybrid-moment';
import type { MajorSense } from './flange-moments';
import { wholeOf, type Reduced } from './reduce';
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
	/** Taking plates out moved the axis so that more would come out than for the gross section: its moment is given. */
	readonly asGross: boolean;
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
 * with EN 1993-1-5 4.4; never more than the gross section gives the same way. A hybrid I or box bent about y: the
 * webs may yield early, 4.3(6). Null for a round tube.
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
	const effective = effectiveFrom(model, basis, reduced, use);
	return {
		value: first.value,
		converged: rest.value,
		governing: first.governing,
		modulus: first.modulus,
		asGross: first.asGross,
		effective: first.asGross
			? { ...effective, notes: [...effective.notes, asGrossNote] }
			: effective
	};
}

const asGrossNote: Note = {
	code: 'effective-moment-as-gross',
	message:
		'The section without its removed strips would give more than the whole one, because its neutral axis or its extreme fibre moves: no more than the elastic moment of the gross section is counted.',
	clause: 'EN 1993-1-5 4.4'
};

interface Strength extends Pick<EffectiveMoment, 'value' | 'governing' | 'modulus' | 'asGross'> {
	readonly hybrid: HybridMoment | null;
}

function strengthOf(model: EnModel, sense: AxisSense, reduced: Reduced): Strength {
	const own = ownStrength(model, sense, reduced);
	if (reduced.strips.length === 0) return own;
	const gross = grossMoment(model, sense, own) / model.code.gammaM0;
	return own.value <= gross ? own : { ...own, value: gross, asGross: true };
}

function ownStrength(model: EnModel, sense: AxisSense, reduced: Reduced): Strength {
	const scale = 1e-6 / model.code.gammaM0;
	if (isMajor(sense) && isHybridGirder(model)) {
		const hybrid = hybridMoment(model, sense, reduced);
		const value = hybrid.moment * scale;
		return { value, governing: hybrid.side, modulus: null, asGross: false, hybrid };
	}
	const { moment, side, modulus } = firstFibre(model, basisOf[sense], reduced);
	return { value: moment * scale, governing: side, modulus, asGross: false, hybrid: null };
}

const isMajor = (sense: AxisSense): sense is MajorSense =>
	sense === 'plusMy' || sense === 'minusMy';

/** kNm, without γM0. The axis of a hybrid girder moves away from its compressed flange: it gives less there. */
function grossMoment(model: EnModel, sense: AxisSense, { governing, hybrid }: Strength): number {
	if (hybrid === null || !isMajor(sense)) return model.moments[sense].firstYield ?? Infinity;
	if (governing === 'compression') return Infinity;
	return hybridMoment(model, sense, wholeOf(model.section.gross)).moment * 1e-6;
}

function explain(
	model: EnModel,
	basis: EffectiveBasis,
	reduced: Reduced,
	{ hybrid, value, asGross }: Strength,
	use?: StressUse
): void {
	const { workings, code } = model;
	if (workings === null || use) return;
	if (asGross) {
		grossWorking(workings, basis, value, code.gammaM0);
		return;
	}
	if (hybrid) hybridWorking(workings, basis, hybrid, value, code.gammaM0);
	else momentWorking(workings, basis, firstFibre(model, basis, reduced), value, code.gammaM0);
}
