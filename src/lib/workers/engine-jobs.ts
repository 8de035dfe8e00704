import type { Issue, Result } from '$lib/engine/result';
import type { BendingPath } from '$lib/engine/response/state';
import type { Imposed, Response } from '$lib/engine/response/respond';
import type { AnalyseRequest } from '$lib/engine/rules/analyse';
import type { Analysis } from '$lib/engine/rules/analysis';
import type { StrengthBasis } from '$lib/engine/material/material';
import type { SectionDefinition } from '$lib/engine/section/definition';
import type { SectionWithTorsion } from '$lib/engine/section/torsion/with-numerical';
import type { Unlocking, UnlockRequest } from '$lib/engine/unlock/unlock';
import type { InteractionAsked, SolvedInteraction } from './interaction-handler';
import { jobsOver, type Jobs } from './jobs';

export interface About {
	definition: SectionDefinition;
	strengthBasis?: StrengthBasis;
}

/** The engine's jobs: what each takes and gives. Issues are those of the definition. */
export type EngineJobs = {
	analyse: {
		payload: About & { request?: AnalyseRequest };
		value: Result<Analysis, Issue[]>;
	};
	/** States along one path; reports progress, may be cancelled between states. */
	respond: {
		payload: About & { path: BendingPath; at: Imposed };
		value: Result<Response, Issue[]>;
	};
	/** Changes that unlock more; reports progress, may be cancelled; null when it was, or cannot be built. */
	unlock: { payload: UnlockRequest; value: Unlocking | null };
	/** Curves and load factors; may be cancelled between them, null when it was. */
	interaction: {
		payload: InteractionAsked;
		value: Result<SolvedInteraction, Issue[]> | null;
	};
	/** Torsion solved numerically, tens of milliseconds at a stretch; null when cancelled before it began. */
	torsion: { payload: About; value: Result<SolvedTorsion, Issue[]> | null };
};

/** Gross properties with the numerical figures where no handbook gives any, and both side by side. */
export type SolvedTorsion = Pick<SectionWithTorsion, 'gross' | 'torsion' | 'notes'>;

let shared: Jobs<EngineJobs> | undefined;

/** The page's one engine worker, started at first use. Call in the browser only. */
export function engineJobs(): Jobs<EngineJobs> {
	if (shared) return shared;
	const worker = new Worker(new URL('./engine.worker.ts', import.meta.url), { type: 'module' });
	const jobs = jobsOver<EngineJobs>(worker);
	worker.addEventListener('error', () => {
		shared = undefined;
		worker.terminate();
		jobs.abandon('The calculation stopped unexpectedly. Try again.');
	});
	shared = jobs;
	return jobs;
}
