import type { EffectiveAnswer } from '$lib/engine/rules/effective-answer';
import type { EffectiveProperties } from '$lib/engine/rules/en1993/effective/effective-section';
import type { DemandState } from '$lib/engine/rules/result';

/** A pure case that may be class 4. */
export type EffectiveCase = keyof EffectiveAnswer['byCase'];

/** One pass as the code's examples do, or with the neutral axis at rest. */
export type EffectivePass = 'once' | 'converged';

const order: readonly EffectiveCase[] = ['+My', '−My', '+Mz', '−Mz', 'N'];

/** Which effective section is on show: follows the demand case until another is chosen. */
export class EffectiveView {
	readonly #answer: () => EffectiveAnswer | null;
	readonly #demand: () => DemandState | undefined;
	#chosen = $state<EffectiveCase | null>(null);
	pass = $state<EffectivePass>('once');

	constructor(answer: () => EffectiveAnswer | null, demand: () => DemandState | undefined) {
		this.#answer = answer;
		this.#demand = demand;
	}

	/** Cases that are class 4, in a fixed order; empty where none is. */
	readonly cases: readonly EffectiveCase[] = $derived.by(() => {
		const byCase = this.#answer()?.byCase ?? {};
		return order.filter((one) => byCase[one] !== undefined);
	});

	/** Case that was chosen or that the demand on show is in; null where all of the section counts for it. */
	readonly #own: EffectiveCase | null = $derived.by(() => {
		const wanted = [this.#chosen, ...casesOf(this.#demand())];
		return wanted.find((one) => one !== null && this.cases.includes(one)) ?? null;
	});

	readonly case: EffectiveCase | null = $derived.by(() => this.#own ?? this.cases[0] ?? null);

	readonly #both = $derived.by(() =>
		this.case === null ? null : (this.#answer()?.byCase[this.case] ?? null)
	);

	/** Figures of one pass; null where no case is class 4. */
	readonly once: EffectiveProperties | null = $derived.by(() => this.#both);
	readonly converged: EffectiveProperties | null = $derived.by(() => this.#both?.converged ?? null);
	readonly shown: EffectiveProperties | null = $derived.by(() =>
		this.pass === 'once' ? this.once : this.converged
	);

	/** What the drawing shows: nothing while the demand on show leaves the section whole. */
	readonly drawn: EffectiveProperties | null = $derived.by(() =>
		this.#own === null ? null : this.shown
	);

	choose(wanted: EffectiveCase): void {
		this.#chosen = wanted;
	}
}

/** Pure cases whose reductions a class 4 demand takes, the nearest first: that of its moment, then N. */
function casesOf(state: DemandState | undefined): EffectiveCase[] {
	if (state?.class !== 4) return [];
	const pressed: EffectiveCase[] = state.N < 0 ? ['N'] : [];
	return state.moment === 0 ? pressed : [bendingCase(state.axisAngle), ...pressed];
}

/** The axis of the greater part of the moment, with its sense. */
function bendingCase(axisAngle: number): EffectiveCase {
	const angle = (axisAngle * Math.PI) / 180;
	const [y, z] = [Math.cos(angle), Math.sin(angle)];
	if (Math.abs(y) >= Math.abs(z) - 1e-9) return y > 0 ? '+My' : '−My';
	return z > 0 ? '+Mz' : '−Mz';
}
