import { ok } from '$lib/engine/result';
import { bending, type Bending, type Imposed } from '$lib/engine/response/respond';
import type { ResponseState } from '$lib/engine/response/state';
import { noState } from '$lib/engine/response/state-report';
import { analyse } from '$lib/engine/rules/analyse';
import { prepareSection } from '$lib/engine/section/prepare';
import { withNumericalTorsion } from '$lib/engine/section/torsion/with-numerical';
import { unlocking, type Unlocking } from '$lib/engine/unlock/unlock';
import type { EngineJobs } from './engine-jobs';
import { solvedInteraction } from './interaction-handler';
import type { JobContext, JobHandlers } from './protocol';

/** States between two pauses: some milliseconds of work. */
const batch = 25;

type Step = () => ResponseState;

const stepsOf = (bent: Bending, at: Imposed): Step[] => {
	if ('curvature' in at) return at.curvature.map((value) => () => bent.atCurvature(value));
	if ('moment' in at) return at.moment.map((value) => () => bent.atMoment(value));
	if ('strainPlanes' in at) return at.strainPlanes.map((plane) => () => bent.atPlane(plane));
	const unit = bent.firstYield.curvature;
	return at.curvatureRatio.map(
		(ratio) => () => (unit === null ? noState : bent.atCurvature(ratio * unit))
	);
};

/** States in batches, reporting after each; fewer than asked when cancelled. */
async function statesInBatches(steps: readonly Step[], { progress, goOn }: JobContext) {
	const states: ResponseState[] = [];
	for (let at = 0; at < steps.length; at += batch) {
		if (at > 0 && !(await goOn())) break;
		states.push(...steps.slice(at, at + batch).map((step) => step()));
		progress(states.length / steps.length);
	}
	return states;
}

/** Milliseconds of a search between two pauses. */
const searchTurn = 12;

/** A search that can pause, to its end; null when cancelled. */
async function searched(
	search: Generator<number, Unlocking | null>,
	{ progress, goOn }: JobContext
): Promise<Unlocking | null> {
	let paused = performance.now();
	for (;;) {
		const step = search.next();
		if (step.done) return step.value;
		if (performance.now() - paused < searchTurn) continue;
		progress(step.value);
		if (!(await goOn())) return null;
		paused = performance.now();
	}
}

/** The engine's jobs as the worker does them. */
export const engineHandlers: JobHandlers<EngineJobs> = {
	analyse: ({ definition, strengthBasis, request }) => {
		const section = prepareSection(definition, strengthBasis);
		return section.ok ? ok(analyse(section.value, request)) : section;
	},
	respond: async ({ definition, strengthBasis, path, at }, context) => {
		const section = prepareSection(definition, strengthBasis);
		if (!section.ok) return section;
		const bent = bending(section.value, path);
		const states = await statesInBatches(stepsOf(bent, at), context);
		return ok({ states, firstYield: bent.firstYield, plasticMoment: bent.plasticMoment });
	},
	unlock: (request, context) => searched(unlocking(request), context),
	interaction: solvedInteraction,
	torsion: async ({ definition, strengthBasis }, { goOn }) => {
		const section = prepareSection(definition, strengthBasis);
		if (!section.ok) return section;
		if (!(await goOn())) return null;
		const { gross, torsion, notes } = withNumericalTorsion(section.value);
		return ok({ gross, torsion, notes });
	}
};
