import { interactionCurve, type InteractionPlane } from '$lib/engine/response/interaction';
import { interactionWith, type LoadFactors } from '$lib/engine/response/interaction-factors';
import { countableCurve, type CountablePoint } from '$lib/engine/rules/countable-curve';
import type { Bench } from '../bench.svelte';
import { casePoint, hasForce, withoutNoise, type Series } from './interaction-model';

/** Time the hand rests before what takes longer is worked out, ms. */
const rest = 150;

/** The curves of the section in one plane of forces, and where every demand case lies. */
export class Interaction {
	plane = $state<InteractionPlane>('N-My');
	/** The code's own curve and the factors take longer: they follow once the hand rests. */
	#code = $state.raw<readonly CountablePoint[] | null>(null);
	#factors = $state.raw<readonly LoadFactors[]>([]);
	readonly #bench: Bench;

	constructor(bench: Bench) {
		this.#bench = bench;
	}

	readonly N: number = $derived.by(() => this.#bench.activeDemand.N ?? 0);
	readonly #heldN = $derived.by(() => (this.plane === 'My-Mz' ? this.N : 0));
	readonly #curves = $derived.by(() => {
		const request = { plane: this.plane, N: this.#heldN };
		const { section } = this.#bench;
		return {
			plastic: interactionCurve(section, { ...request, limit: 'plastic' }),
			firstYield: interactionCurve(section, { ...request, limit: 'first-yield' })
		};
	});

	/** Why a curve cannot be drawn, each once. */
	readonly faults: readonly string[] = $derived.by(() => {
		const { plastic, firstYield } = this.#curves;
		const found = [plastic, firstYield].flatMap((curve) => (curve.ok ? [] : [curve.error.message]));
		return found.filter((message, at) => found.indexOf(message) === at);
	});

	readonly cases = $derived.by(() =>
		this.#bench.demands
			.map((demand) => casePoint(demand, this.plane, this.N))
			.filter((point) => hasForce(point))
	);

	readonly series: readonly Series[] = $derived.by(() => {
		const { plastic, firstYield } = this.#curves;
		const all: Series[] = [
			{ key: 'cases', title: 'Demand cases', points: this.cases },
			{ key: 'plastic', title: 'Full plastic', points: plastic.ok ? plastic.value.points : [] },
			{
				key: 'first-yield',
				title: 'First yield',
				points: firstYield.ok ? firstYield.value.points : []
			},
			{ key: 'code', title: 'Counted by the code', points: this.#code ?? [] }
		];
		return all.filter(({ points }) => points.some((point) => point !== null)).map(withoutNoise);
	});

	/** Load factors of the cases, in their order; shorter while they are worked out. */
	get factors(): readonly LoadFactors[] {
		return this.#factors;
	}
	/** The code gives no curve in this plane. */
	get codeMissing(): boolean {
		return this.#code !== null && !this.#code.some((point) => point !== null);
	}

	/** Works out what takes longer, piece by piece; call in an effect, its answer stops it. */
	follow = (): (() => void) => {
		const { section, code, study } = this.#bench;
		const request = { plane: this.plane, N: this.#heldN, code, stiffeners: study.stiffeners };
		const { cases } = this;
		this.#factors = [];
		const found: LoadFactors[] = [];
		const steps = [
			() => (this.#code = countableCurve(section, request)),
			...cases.map((point) => () => {
				found.push(interactionWith(section, point));
				this.#factors = [...found];
			})
		];
		let timer = setTimeout(function next() {
			steps.shift()?.();
			if (steps.length > 0) timer = setTimeout(next, 0);
		}, rest);
		return () => clearTimeout(timer);
	};
}
