import { ok, type Issue, type Result } from '$lib/engine/result';
import {
	interactionCurve,
	type InteractionCurve,
	type InteractionLimit,
	type InteractionPlane,
	type InteractionPoint
} from '$lib/engine/response/interaction';
import { interactionWith, type LoadFactors } from '$lib/engine/response/interaction-factors';
import { countableCurve, type CountablePoint } from '$lib/engine/rules/countable-curve';
import type { CodeChoice, Stiffeners } from '$lib/engine/rules/result';
import { prepareSection } from '$lib/engine/section/prepare';
import type { About } from './engine-jobs';
import type { JobContext } from './protocol';

export interface InteractionAsked extends About {
	readonly plane: InteractionPlane;
	/** kN, held; for My–Mz. */
	readonly N: number;
	readonly code: Partial<CodeChoice>;
	readonly stiffeners: Stiffeners | undefined;
	/** Demands, kN and kNm. */
	readonly cases: readonly InteractionPoint[];
}

/** Both limits and the code's own curve in one plane of forces, and how far each case may grow. */
export interface SolvedInteraction {
	readonly plastic: Result<InteractionCurve, Issue>;
	readonly firstYield: Result<InteractionCurve, Issue>;
	readonly code: readonly CountablePoint[];
	/** One for each case. */
	readonly factors: readonly LoadFactors[];
}

/** Works out an interaction, pausing between its pieces; null when cancelled. Issues are the definition's. */
export async function solvedInteraction(
	{ definition, strengthBasis, plane, N, cases, ...rules }: InteractionAsked,
	{ goOn }: Pick<JobContext, 'goOn'>
): Promise<Result<SolvedInteraction, Issue[]> | null> {
	const section = prepareSection(definition, strengthBasis);
	if (!section.ok) return section;
	const curve = (limit: InteractionLimit) => interactionCurve(section.value, { plane, N, limit });
	const limits = { plastic: curve('plastic'), firstYield: curve('first-yield') };
	if (!(await goOn())) return null;
	const code = countableCurve(section.value, { plane, N, ...rules });
	const factors: LoadFactors[] = [];
	for (const demand of cases) {
		if (!(await goOn())) return null;
		factors.push(interactionWith(section.value, demand));
	}
	return ok({ ...limits, code, factors });
}
