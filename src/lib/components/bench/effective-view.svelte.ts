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

	readonly case: EffectiveCase | null = $derived.by(() => {
		const wanted = [this.#chosen, caseOf(this.#demand())];
		const found = wanted.find((one) => one !== null && this.cases.includes(one));
		return found ?? this.cases[0] ?? null;
	});

	readonly #both = $derived.by(() =>
		this.case === null ? null : (this.#answer()?.byCase[this.case] ?? null)
	);

	/** Figures of one pass; null where no case is class 4. */
	readonly once: EffectiveProperties | null = $derived.by(() => this.#both);
	readonly converged: EffectiveProperties | null = $derived.by(() => this.#both?.converged ?? null);
	readonly shown: EffectiveProperties | null = $derived.by(() =>
		this.pass === 'once' ? this.once : this.converged
	);

	choose(wanted: EffectiveCase): void {
		this.#chosen = wanted;
	}
}

/** The pure case that a demand is nearest to: its moment's greater part, or its N alone. */
function caseOf(state: DemandState | undefined): EffectiveCase | null {
	if (!state || (state.moment === 0 && state.N === 0)) return null;
	if (state.moment === 0) return 'N';
	const angle = (state.axisAngle * Math.PI) / 180;
	const [y, z] = [Math.cos(angle), Math.sin(angle)];
	if (Math.abs(y) >= Math.abs(z) - 1e-9) return y > 0 ? '+My' : '−My';
	return z > 0 ? '+Mz' : '−Mz';
}
