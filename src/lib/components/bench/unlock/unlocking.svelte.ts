import type { PlateStock } from '$lib/engine/unlock/plate-stock';
import type { UnlockOption } from '$lib/engine/unlock/proposal';
import type { Unlocking, UnlockRequest } from '$lib/engine/unlock/unlock';
import { engineJobs } from '$lib/workers/engine-jobs';
import type { Job, JobOptions } from '$lib/workers/jobs';
import type { Bench } from '../bench.svelte';

/** Starts a search; the page's worker, unless a test brings its own. */
export type StartSearch = (request: UnlockRequest, options: JobOptions) => Job<Unlocking | null>;

const inWorker: StartSearch = (request, options) => engineJobs().start('unlock', request, options);

/** The hand has rested so long before a search begins, ms. */
const rest = 250;
/** A search that takes longer is told of. */
const patience = 200;

/** Searches what unlocks more of the section on the Bench, and puts it in. */
export class UnlockSearch {
	readonly #bench: Bench;
	readonly #start: StartSearch;
	found = $state.raw<Unlocking | null>(null);
	/** The study that `found` is about. */
	#about = $state.raw<unknown>(null);
	progress = $state<number | null>(null);
	cancelled = $state(false);
	fault = $state('');
	/** The option that was put in last, and the study that it made. */
	#tried = $state.raw<{ option: UnlockOption; study: unknown } | null>(null);
	#job: Job<Unlocking | null> | null = null;

	constructor(bench: Bench, start: StartSearch = inWorker) {
		this.#bench = bench;
		this.#start = start;
	}

	readonly tried: UnlockOption | null = $derived.by(() =>
		this.#tried !== null && this.#tried.study === this.#bench.study ? this.#tried.option : null
	);

	/** Whether what was found is of the study as it stands. */
	readonly isCurrent: boolean = $derived.by(() => this.#about === this.#bench.study);

	/** Searches once the hand rests; gives what ends it. */
	follow(stock: PlateStock): () => void {
		const { study, stale } = this.#bench;
		if (stale || this.#about === study) return () => {};
		const timer = setTimeout(() => void this.search(stock), rest);
		return () => {
			clearTimeout(timer);
			this.#job?.cancel();
			this.progress = null;
		};
	}

	async search(stock: PlateStock): Promise<void> {
		const { study } = this.#bench;
		this.cancelled = false;
		this.fault = '';
		let share = 0;
		const job = this.#start(requestOf(this.#bench, stock), {
			onProgress: (now) => {
				share = now;
				if (this.progress !== null) this.progress = now;
			}
		});
		this.#job = job;
		const slow = setTimeout(() => (this.progress = share), patience);
		const ended = await job.result;
		clearTimeout(slow);
		if (this.#job !== job) return;
		this.progress = null;
		if (ended.ok) [this.found, this.#about] = [ended.value, study];
		else if (ended.error.reason === 'failed') this.fault = ended.error.message;
	}

	cancel(): void {
		this.#job?.cancel();
		this.progress = null;
		this.cancelled = true;
	}

	/** Puts an option in as one step that undo takes back. */
	take(option: UnlockOption): void {
		const { definition, stiffeners } = option.girder;
		this.#bench.change({
			section: definition,
			shape: null,
			...(stiffeners === null ? {} : { stiffeners })
		});
		this.#tried = { option, study: this.#bench.study };
	}

	undo(): void {
		this.#bench.undo();
		this.#tried = null;
	}
}

/** The study as the engine searches it, without the reactive proxies that cannot be posted. */
function requestOf({ study }: Bench, stock: PlateStock): UnlockRequest {
	return structuredClone({
		girder: { definition: study.section, stiffeners: study.stiffeners ?? null },
		stock: {
			thicknesses: [...stock.thicknesses],
			widthStep: stock.widthStep,
			depthStep: stock.depthStep,
			stiffenerStep: stock.stiffenerStep
		},
		code: study.code,
		demands: study.demands,
		strengthBasis: study.strengthBasis
	});
}
