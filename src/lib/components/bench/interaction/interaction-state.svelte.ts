import type { InteractionPlane } from '$lib/engine/response/interaction';
import type { LoadFactors } from '$lib/engine/response/interaction-factors';
import type { EngineJobs } from '$lib/workers/engine-jobs';
import type { InteractionAsked, SolvedInteraction } from '$lib/workers/interaction-handler';
import type { Job } from '$lib/workers/jobs';
import type { Bench } from '../bench.svelte';
import { casePoint, hasForce, withoutNoise, type Series } from './interaction-model';

/** Time the hand rests before the curves are worked out, ms. */
const rest = 150;

type Answer = EngineJobs['interaction']['value'];
/** Starts working out what was asked, off the main thread. */
export type SolveInteraction = (asked: InteractionAsked) => Job<Answer>;

interface Solved {
	readonly asked: InteractionAsked;
	readonly value: SolvedInteraction;
}

/** The curves of the section in one plane of forces, and where every demand case lies. */
export class Interaction {
	plane = $state<InteractionPlane>('N-My');
	#solved = $state.raw<Solved | null>(null);
	#failed = $state.raw<{ readonly asked: InteractionAsked; readonly why: string } | null>(null);
	readonly #bench: Bench;
	readonly #solve: SolveInteraction;

	constructor(bench: Bench, solve: SolveInteraction) {
		this.#bench = bench;
		this.#solve = solve;
	}

	readonly N: number = $derived.by(() => this.#bench.activeDemand.N ?? 0);
	readonly #heldN = $derived.by(() => (this.plane === 'My-Mz' ? this.N : 0));

	readonly cases = $derived.by(() =>
		this.#bench.demands
			.map((demand) => casePoint(demand, this.plane, this.N))
			.filter((point) => hasForce(point))
	);

	readonly #asked: InteractionAsked = $derived.by(() => {
		const { definition, strengthBasis } = this.#bench.section;
		const { code, stiffeners } = this.#bench.study;
		const cases = this.cases.map(({ N, My, Mz }) => ({ N, My, Mz }));
		const { plane } = this;
		return { definition, strengthBasis, plane, N: this.#heldN, code, stiffeners, cases };
	});

	/** The curves of this plane: those of the last section, N or code while new ones are worked out. */
	readonly #shown: Solved | null = $derived.by(() =>
		this.#solved?.asked.plane === this.plane ? this.#solved : null
	);
	/** Why the curves could not be worked out; empty when they were, or are being so. */
	readonly failure: string = $derived.by(() =>
		this.#failed?.asked === this.#asked ? this.#failed.why : ''
	);
	/** What is shown belongs to what stands on the Bench. */
	readonly current: boolean = $derived.by(() => this.#shown?.asked === this.#asked);
	readonly computing: boolean = $derived.by(() => !this.current && this.failure === '');
	/** There are curves to look at, be they the last ones. */
	readonly drawn: boolean = $derived.by(() => this.#shown !== null);

	/** Why a curve cannot be drawn, each once. */
	readonly faults: readonly string[] = $derived.by(() => {
		const value = this.#shown?.value;
		const curves = value ? [value.plastic, value.firstYield] : [];
		const found = curves.flatMap((curve) => (curve.ok ? [] : [curve.error.message]));
		return found.filter((message, at) => found.indexOf(message) === at);
	});

	readonly series: readonly Series[] = $derived.by(() => {
		const value = this.#shown?.value;
		const pointsOf = (curve: SolvedInteraction['plastic'] | undefined) =>
			curve?.ok ? curve.value.points : [];
		const all: Series[] = [
			{ key: 'cases', title: 'Demand cases', points: this.cases },
			{ key: 'plastic', title: 'Full plastic', points: pointsOf(value?.plastic) },
			{ key: 'first-yield', title: 'First yield', points: pointsOf(value?.firstYield) },
			{ key: 'code', title: 'Counted by the code', points: value?.code ?? [] }
		];
		return all.filter(({ points }) => points.some((point) => point !== null)).map(withoutNoise);
	});

	/** Load factors of the cases, in their order; empty while they are worked out. */
	readonly factors: readonly LoadFactors[] = $derived.by(() =>
		this.current ? (this.#shown?.value.factors ?? []) : []
	);
	/** The code gives no curve in this plane. */
	readonly codeMissing: boolean = $derived.by(
		() => this.current && !this.#shown?.value.code.some((point) => point !== null)
	);

	/** Works the curves out once the hand rests; call in an effect, its answer stops it. */
	follow = (): (() => void) => {
		const asked = this.#asked;
		let stop = () => {};
		const timer = setTimeout(() => (stop = this.#ask(asked)), rest);
		return () => {
			clearTimeout(timer);
			stop();
		};
	};

	#ask(asked: InteractionAsked): () => void {
		try {
			const job = this.#solve(asked);
			void job.result.then((end) => {
				if (end.ok) this.#end(asked, end.value);
				else if (end.error.reason === 'failed') this.#fail(asked, end.error.message);
			});
			return () => job.cancel();
		} catch {
			this.#fail(asked, 'Calculating in the background is not available here.');
			return () => {};
		}
	}

	#end(asked: InteractionAsked, answer: Answer): void {
		if (answer?.ok) this.#solved = { asked, value: answer.value };
		else if (answer) this.#fail(asked, answer.error[0]?.message ?? 'The section does not stand.');
	}

	#fail(asked: InteractionAsked, why: string): void {
		this.#failed = { asked, why };
	}
}
