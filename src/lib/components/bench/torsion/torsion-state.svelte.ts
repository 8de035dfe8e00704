import type { Issue, Result } from '$lib/engine/result';
import type { PreparedSection } from '$lib/engine/section/prepared';
import type { SolvedTorsion } from '$lib/workers/engine-jobs';
import type { Job } from '$lib/workers/jobs';

type Answer = Result<SolvedTorsion, Issue[]> | null;
/** Starts the numerical solution of a section. */
export type Solve = (section: PreparedSection) => Job<Answer>;

export type TorsionStanding =
	| { readonly kind: 'idle' | 'computing' }
	| { readonly kind: 'failed'; readonly why: string }
	| { readonly kind: 'solved'; readonly solved: SolvedTorsion };

/** A hand that still moves is waited for so long, ms. */
const rest = 250;

/** The numerical torsion solution of the section on the Bench, asked for by hand or when needed. */
export class TorsionState {
	readonly #solve: Solve;
	#standing = $state.raw<TorsionStanding>({ kind: 'idle' });
	#of = $state.raw<PreparedSection | null>(null);

	constructor(solve: Solve) {
		this.#solve = solve;
	}

	/** How it stands with a section; what belongs to another one is not shown. */
	standing = (section: PreparedSection): TorsionStanding =>
		this.#of === section ? this.#standing : { kind: 'idle' };

	/** Solves a section once the hand rests; gives back how to stop. */
	askSoon(section: PreparedSection): () => void {
		let stop = () => {};
		this.#take(section, { kind: 'computing' });
		const timer = setTimeout(() => (stop = this.ask(section)), rest);
		return () => {
			clearTimeout(timer);
			stop();
		};
	}

	/** Solves a section now; gives back how to stop. */
	ask(section: PreparedSection): () => void {
		this.#take(section, { kind: 'computing' });
		try {
			const job = this.#solve(section);
			void job.result.then((end) => {
				if (end.ok) this.#end(section, end.value);
				else if (end.error.reason === 'failed') this.#fail(section, end.error.message);
				else if (this.#of === section) this.#take(section, { kind: 'idle' });
			});
			return () => job.cancel();
		} catch {
			this.#fail(section, 'Calculating in the background is not available here.');
			return () => {};
		}
	}

	#end(section: PreparedSection, answer: Answer): void {
		if (this.#of !== section) return;
		if (answer === null) this.#take(section, { kind: 'idle' });
		else if (answer.ok) this.#take(section, { kind: 'solved', solved: answer.value });
		else this.#fail(section, answer.error[0]?.message ?? 'No solution was found.');
	}

	#fail(section: PreparedSection, why: string): void {
		if (this.#of === section) this.#take(section, { kind: 'failed', why });
	}

	#take(section: PreparedSection, standing: TorsionStanding): void {
		this.#of = section;
		this.#standing = standing;
	}
}
