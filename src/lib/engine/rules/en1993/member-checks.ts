import type { Note } from '../../result';
import type { ReducedFigures, ResistanceCheck } from '../result';
import { simpleCheck } from './check-workings';
import { senseY, senseZ, singleSense, type DemandCase } from './demand-case';
import type { Constraint } from './demand-checks';
import { lateralTorsional, type LateralOutcome } from './lateral-torsional';
import { stabilityGaps } from './member-stability';

export interface MemberChecks {
	readonly checks: ResistanceCheck[];
	readonly constraints: Constraint[];
	readonly missing: Note[];
	readonly notes: Note[];
	readonly reduced: ReducedFigures;
}

/**
 * Lateral–torsional buckling where a demand names its unbraced length, 6.3.2: M/Mb,Rd for bending about
 * one axis. A pull is not counted in its favour; beside a thrust, and about both axes, the check of the
 * member (6.3.3) is missing. A demand without effects is judged for the moment that its ruler measures.
 */
export function memberChecks(c: DemandCase): MemberChecks {
	const { context, demand, name, direction, size, effects } = c;
	const { model } = context;
	const unbent = size === 0 && effects.N === 0;
	const bent = unbent ? { ...demand, My: direction.y, Mz: direction.z } : demand;
	const outcome = lateralTorsional(model, bent, name, unreduced(c));
	const missing = stabilityGaps(model, bent, name, outcome);
	const { value: found, notes } = outcome;
	if (found === null || singleSense(direction) === null)
		return { checks: [], constraints: [], missing, notes, reduced: {} };
	return { ...bounds(c, found), missing, notes };
}

function bounds(
	{ context, name, size }: DemandCase,
	{ MbRd, Mcr, lambda, chi, clause }: NonNullable<LateralOutcome['value']>
) {
	const label = 'lateral–torsional buckling';
	return {
		checks: size === 0 ? [] : [simpleCheck(context.model, name, label, clause, size, MbRd)],
		constraints: [
			{ by: 'lateral-torsional' as const, use: (moment: number) => moment / MbRd, most: MbRd }
		],
		reduced: { MbRd, Mcr, lambdaLT: lambda, chiLT: chi }
	};
}

/** Wy fy of the class that holds for member buckling, kNm without γM0; null without a resistance. */
function unreduced({ context, direction, memberClass }: DemandCase): number | null {
	const sense = direction.z === 0 ? senseY(direction.y) : senseZ(direction.z);
	const { value } = context.bending(sense, memberClass);
	return value === null ? null : value * context.model.code.gammaM0;
}
