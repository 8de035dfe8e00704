import type { Explanation } from '$lib/engine/explain/working';
import type { StrengthBasis } from '$lib/engine/material/material';
import type { Issue } from '$lib/engine/result';
import { analyse } from '$lib/engine/rules/analyse';
import type { CodeChoice, DemandState } from '$lib/engine/rules/result';
import { verdict, type Verdict } from '$lib/engine/rules/verdict';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import type { PreparedSection } from '$lib/engine/section/prepared';
import { engineJobs } from '$lib/workers/engine-jobs';
import { BendState } from './bend-state.svelte';
import { EffectiveView } from './effective-view.svelte';
import { History } from './history.svelte';
import { rulerModel, type RulerModel } from './ruler-model';
import { PieceFocus } from './piece-focus.svelte';
import { freeCaseName, openingStudy, type DemandCase } from './study';
import type { BendChoice, Study } from './study';
import { TorsionState } from './torsion/torsion-state.svelte';
import type { Addressed } from './study-address';

/** The demand case that decides; `value` is its use, null when a check that applies is missing. */
export interface GoverningCase {
	readonly name: string;
	readonly index: number;
	readonly value: number | null;
}

export interface CountAbout {
	readonly positive: number | null;
	readonly negative: number | null;
}

/**
 * Everything on the Bench: the study with its undo, the section made of it, what the rules say,
 * and how it is bent. Derived in stages, so that bending touches none of the stages before it.
 */
export class Bench {
	/** Plate or point that form and drawing point at. */
	readonly pieces = new PieceFocus();
	readonly torsion = new TorsionState(({ definition, strengthBasis }) =>
		engineJobs().start('torsion', { definition, strengthBasis })
	);
	readonly #history: History<Study>;
	readonly bend: BendState;
	/** The effective section that is drawn and read; none where nothing is class 4. */
	readonly effectiveView = new EffectiveView(
		() => this.analysis.effective,
		() => this.activeState
	);
	/** Case that was chosen; null follows the governing one. */
	#chosenCase = $state<number | null>(null);
	#valid: PreparedSection | null = null;

	constructor({ study, bend }: Addressed) {
		this.#history = new History(study);
		this.#chosenCase = bend.activeCase;
		const source = {
			section: () => this.section,
			demandN: () => this.activeDemand.N ?? 0,
			residual: () => this.study.residual ?? ('none' as const)
		};
		this.bend = new BendState(source, bend);
	}

	get study(): Study {
		return this.#history.present;
	}
	get canUndo(): boolean {
		return this.#history.canUndo;
	}
	get canRedo(): boolean {
		return this.#history.canRedo;
	}

	readonly definition: SectionDefinition = $derived.by(() => this.study.section);
	readonly strengthBasis: StrengthBasis = $derived.by(() => this.study.strengthBasis);
	readonly code = $derived.by(() => this.study.code);
	readonly demands = $derived.by(() => this.study.demands);

	readonly #built = $derived.by(() => prepareSection(this.definition, this.strengthBasis));

	/** What keeps the section from being built; empty when it stands. */
	readonly issues: readonly Issue[] = $derived.by(() => (this.#built.ok ? [] : this.#built.error));

	/** The section as it stands, or the last that could be built. */
	readonly section: PreparedSection = $derived.by(() => {
		const built = this.#built;
		if (built.ok) this.#valid = built.value;
		return this.#valid ?? openingSection();
	});

	/** Shear centre by formula, or where none gives it by the numerical solution, once it is there. */
	readonly shearCentre = $derived.by(() => {
		const standing = this.torsion.standing(this.section);
		const solved = standing.kind === 'solved' ? standing.solved.gross : this.section.gross;
		return solved.shearCentre;
	});

	get stale(): boolean {
		return this.issues.length > 0;
	}

	readonly #asked = $derived.by(() => ({
		code: this.code,
		demands: [...this.demands],
		stiffeners: this.study.stiffeners
	}));

	readonly analysis = $derived.by(() => analyse(this.section, this.#asked));

	/** How the figures came about: made when first read, as it takes an analysis of its own. */
	readonly explanation: Explanation = $derived.by(
		() => analyse(this.section, { ...this.#asked, explain: true }).explain ?? {}
	);

	/** The case that uses most, or whose check is missing; null where no rule covers the section. */
	readonly governing: GoverningCase | null = $derived.by(() => {
		const name = this.analysis.verdict.demand;
		const index = this.analysis.demands.findIndex(({ demand }) => demand === name);
		const state = this.analysis.demands[index];
		return name === null || !state ? null : { name, index, value: state.utilisation };
	});

	readonly activeCase: number = $derived.by(() =>
		Math.min(this.#chosenCase ?? this.governing?.index ?? 0, this.demands.length - 1)
	);
	readonly activeDemand: DemandCase = $derived.by(
		() => this.demands[this.activeCase] ?? { name: 'Case 1' }
	);

	/** What the rules say of the case that is shown; none where they do not reach. */
	readonly activeState: DemandState | undefined = $derived.by(
		() => this.analysis.demands[this.activeCase]
	);

	/** The verdict on the case that is shown. */
	readonly verdict: Verdict = $derived.by(() => verdict(this.analysis, this.activeState?.demand));

	readonly ruler: RulerModel = $derived.by(() =>
		rulerModel(
			this.section,
			this.verdict.demand === null ? null : this.verdict.ruler,
			this.activeDemand,
			this.verdict.countable.force
		)
	);

	/** What may be counted about the axis of bending, both senses, kNm; null where no rule gives it. */
	readonly countAbout: CountAbout = $derived.by(() => {
		const { axisAngle } = this.bend;
		const resistance = this.analysis.resistance;
		if (!resistance || this.bend.N !== 0) return { positive: null, negative: null };
		if (axisAngle === 0) return { positive: resistance.MyRd, negative: resistance.MyRdNegative };
		if (axisAngle === 90) return { positive: resistance.MzRd, negative: resistance.MzRd };
		return { positive: null, negative: null };
	});

	readonly bendChoice: BendChoice = $derived.by(() => ({
		axisAngle: this.bend.axisAngle,
		transverse: this.bend.transverse,
		ratio: this.bend.ratio,
		activeCase: this.#chosenCase,
		...(this.bend.turns.length > 0 ? { turns: this.bend.turns } : {}),
		...(this.bend.atTurn ? { atTurn: true } : {}),
		...(this.bend.typedN === null ? {} : { typedN: this.bend.typedN })
	}));

	/** First message about a field, by its path. */
	issueAt(path: string): string | undefined {
		return this.issues.find((issue) => issue.path === path)?.message;
	}

	undo = () => this.#history.undo();
	redo = () => this.#history.redo();

	change(part: Partial<Study>, key = ''): void {
		this.#history.change({ ...this.study, ...part }, key);
	}

	/** Changes a size: the section is then no longer the catalogue's shape. */
	reshape(section: SectionDefinition, key = ''): void {
		this.change({ section, shape: null }, key);
	}

	/** Changes grades: the shape stays what it is. */
	regrade(section: SectionDefinition): void {
		this.change({ section });
	}

	/** Takes a catalogue shape in the grade that is in use. */
	takeShape(designation: string, shape: SectionDefinition): void {
		this.change({ shape: designation, section: { ...shape, grade: this.study.section.grade } });
	}

	choose(code: Partial<CodeChoice>): void {
		this.change({ code: { ...this.study.code, ...code } });
	}

	activate(index: number): void {
		this.#chosenCase = index;
	}

	addCase(): void {
		const { demands } = this.study;
		this.change({ demands: [...demands, { name: freeCaseName(demands) }] });
		this.#chosenCase = demands.length;
	}

	removeCase(index: number): void {
		const left = this.study.demands.filter((_, at) => at !== index);
		this.change({ demands: left.length > 0 ? left : [{ name: 'Case 1' }] });
		this.#chosenCase = null;
	}

	changeCase(index: number, part: Partial<DemandCase>): void {
		const demands = this.study.demands.map((one, at) => (at === index ? { ...one, ...part } : one));
		this.#chosenCase = index;
		this.change({ demands }, `case ${index} ${Object.keys(part).join()}`);
	}

	/** Opens another study as a fresh start, with nothing to undo. */
	restart({ study, bend }: Addressed): void {
		this.#history.restart(study);
		this.#chosenCase = bend.activeCase;
	}
}

function openingSection(): PreparedSection {
	const built = prepareSection(openingStudy.section, openingStudy.strengthBasis);
	if (!built.ok) throw new Error('The opening section cannot be built.');
	return built.value;
}
