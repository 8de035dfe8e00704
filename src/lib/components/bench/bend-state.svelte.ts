import type { ResidualPattern } from '$lib/engine/material/residual/pattern';
import { historyOf, type History as Past } from '$lib/engine/response/history/history';
import { bendingFrom, type HistoryBending } from '$lib/engine/response/history/history-bending';
import { bending, type Bending } from '$lib/engine/response/respond';
import type { BendingPath, ResponseState } from '$lib/engine/response/state';
import type { Note, Result } from '$lib/engine/result';
import type { PreparedSection } from '$lib/engine/section/prepared';
import type { StrainLine } from '$lib/drawing/stress-profile';
import type { BendChoice } from './study';
import { curvatureForStrain } from './strain-drag';
import { mostTurns, turnedSection, type Turn, type TurnedSection } from './turns';

/** Reach of slider, keys and handle, in multiples of the curvature at first yield. */
export const mostRatio = 10;
/** Moments below this share of full plastic are rounding. */
const momentNoise = 1e-9;
/** Reach of what is typed. */
const mostTyped = 1000;

const clamp = (value: number, most: number) => Math.max(-most, Math.min(most, value));

/** What bending stands on: section, N of the demand, kN, and how its steel left mill or shop. */
export interface BendSource {
	readonly section: () => PreparedSection;
	readonly demandN: () => number;
	readonly residual: () => ResidualPattern;
}

/** How the section is bent now, and the state that follows; bending touches nothing above it. */
export class BendState {
	#axisAngle = $state(0);
	#transverse = $state<BendChoice['transverse']>('moment-zero');
	#ratio = $state(0);
	/** It stands where the last turn left it, wherever that comes to lie. */
	#atTurn = $state(false);
	#turns = $state.raw<readonly Turn[]>([]);
	/** N that was typed, kN; null follows the demand. */
	typedN = $state<number | null>(null);
	readonly #source: BendSource;

	constructor(source: BendSource, first: BendChoice) {
		this.#source = source;
		this.#axisAngle = first.axisAngle;
		this.#transverse = first.transverse;
		this.#ratio = first.ratio;
		this.#turns = first.turns ?? [];
		this.#atTurn = first.atTurn ?? false;
		this.typedN = first.typedN ?? null;
	}

	readonly residual = $derived.by(() => this.#source.residual());
	readonly N: number = $derived.by(() => this.typedN ?? this.#source.demandN());
	readonly path: BendingPath = $derived.by(() => ({
		axisAngle: this.#axisAngle,
		transverse: this.#transverse,
		N: this.N
	}));

	/** Bending of the same section free of stress and never bent before. */
	readonly fresh: Bending = $derived.by(() => bending(this.#source.section(), this.path));

	/** Curvature of ratio 1, 1/m: first yield free of stress; where N alone yields the section, that of yield at mid-depth free of N. */
	readonly unit: number = $derived.by(() => this.fresh.firstYield.curvature ?? this.#roughUnit());

	/** The section before any bending, where its past matters; else null. */
	readonly #start: Result<Past, Note> | null = $derived.by(() =>
		this.residual === 'none' && this.#turns.length === 0
			? null
			: historyOf(this.#source.section(), this.residual)
	);
	/** Why residual stress and turns are not followed; null when they are, or there are none. */
	readonly fault: Note | null = $derived.by(() =>
		this.#start && !this.#start.ok ? this.#start.error : null
	);
	/** Why unloading is not followed for this steel, in a sentence; null when it is. */
	readonly unloadFault: string | null = $derived.by(() => {
		const free = historyOf(this.#source.section());
		return free.ok ? null : free.error.message;
	});
	/** Section and steel at rest with their residual stress; null where the past does not matter. */
	readonly start: Past | null = $derived.by(() => (this.#start?.ok ? this.#start.value : null));

	readonly turned: TurnedSection | null = $derived.by(
		() => this.start && turnedSection(this.start, this.path, this.unit, this.#turns)
	);
	readonly #bentOn: HistoryBending | null = $derived.by(
		() => this.turned && bendingFrom(this.turned.history, this.path)
	);

	/** Unbent and free of N, with the residual stress alone; null where the past does not matter. */
	readonly restState: ResponseState | null = $derived.by(
		() => this.start && bendingFrom(this.start, { ...this.path, N: 0 }).atCurvature(0)
	);

	/** Bending on from where the last turn left the section. */
	readonly bender: Bending = $derived.by(() => this.#bentOn ?? this.fresh);

	get axisAngle(): number {
		return this.#axisAngle;
	}
	/** Another axis starts afresh: the turns were of the other one. */
	set axisAngle(degrees: number) {
		if (degrees === this.#axisAngle || !Number.isFinite(degrees)) return;
		this.#axisAngle = degrees;
		this.#forget();
	}
	get transverse(): BendChoice['transverse'] {
		return this.#transverse;
	}
	set transverse(transverse: BendChoice['transverse']) {
		if (transverse === this.#transverse) return;
		this.#transverse = transverse;
		this.#forget();
	}

	get turns(): readonly Turn[] {
		return this.#turns;
	}
	get atTurn(): boolean {
		return this.#atTurn && this.turned !== null;
	}
	get ratio(): number {
		return this.#atTurn && this.turned ? this.turned.end : this.#ratio;
	}

	/** 1/m */
	get curvature(): number {
		return this.ratio * this.unit;
	}

	readonly state: ResponseState = $derived.by(() => this.bender.atCurvature(this.curvature));

	/** Moment of the state, kNm, without the last digits' noise about zero; null where there is none. */
	readonly moment: number | null = $derived.by(() => {
		const { moment } = this.state;
		const most = this.fresh.plasticMoment ?? 0;
		return moment !== null && Math.abs(moment) < momentNoise * most ? 0 : moment;
	});

	/** The steel as it is now, where its past matters. */
	readonly present: Past | null = $derived.by(() =>
		this.atTurn
			? (this.turned?.history ?? null)
			: (this.#bentOn?.after({ curvature: this.curvature }) ?? null)
	);
	/** Let go and at rest: what is left is locked in. */
	readonly released: boolean = $derived.by(
		() => this.atTurn && this.turned?.lost === null && this.#turns.at(-1) === 'release'
	);

	/** Direction of the level line on the drawing: the neutral axis, or the asked axis when there is none. */
	readonly seenAngle: number = $derived.by(() =>
		levelAngle(this.state.neutralAxis?.angle ?? this.axisAngle, this.axisAngle)
	);

	/** Strain over the depth as drawn; all zero where no state exists. */
	readonly line: StrainLine = $derived.by(() => strainLine(this.state, this.seenAngle));

	bendTo(ratio: number): void {
		if (Number.isFinite(ratio)) this.#set(clamp(ratio, mostRatio));
	}

	/** Bends to a typed curvature, 1/m. */
	bendToCurvature(curvature: number): void {
		if (Number.isFinite(curvature)) this.#set(clamp(curvature / this.unit, mostTyped));
	}

	/** Bends to a typed moment, kNm; false when no state carries it. */
	bendToMoment(moment: number): boolean {
		const found = this.bender.atMoment(moment);
		if (found.curvature === null) return false;
		this.#set(clamp(found.curvature / this.unit, mostTyped));
		return true;
	}

	/** Bends until the strain `depth` mm above the centroid, square to the neutral axis, is `strain`. */
	bendToStrain(depth: number, strain: number): void {
		const at = { angle: this.seenAngle, depth };
		const curvature = curvatureForStrain(this.bender, this.curvature, this.unit, at, strain);
		this.bendTo(curvature / this.unit);
	}

	/** Bending turns here: what follows unloads the section, or loads it on. */
	turnHere(): void {
		if (!this.atTurn) this.#turn([this.ratio]);
	}

	/** Lets the moment go, N held: the section springs back and stays as it then is. */
	release(): void {
		this.#turn(this.atTurn ? ['release'] : [this.ratio, 'release']);
	}

	/** Takes the last turn back: the section stands where it turned. */
	backTurn(): void {
		const last = this.#turns.at(-1);
		const left = this.#turns.slice(0, -1);
		this.#turns = left;
		this.#atTurn = last === 'release' && left.length > 0;
		if (typeof last === 'number') this.#ratio = last;
		else if (left.length === 0) this.#ratio = 0;
	}

	/** Bends to and fro between two ratios, from fresh steel. */
	cycle(turns: readonly Turn[]): void {
		this.#turns = turns.slice(0, mostTurns);
		this.#atTurn = true;
	}

	/** As it left mill or shop, unbent. */
	startFresh(): void {
		this.#forget();
		this.#ratio = 0;
	}

	#turn(more: readonly Turn[]): void {
		if (this.#turns.length + more.length > mostTurns) return;
		this.#turns = [...this.#turns, ...more];
		this.#atTurn = true;
	}

	#set(ratio: number): void {
		this.#ratio = ratio;
		this.#atTurn = false;
	}

	#forget(): void {
		this.#ratio = this.ratio;
		this.#turns = [];
		this.#atTurn = false;
	}

	#roughUnit(): number {
		const { parts, bounds } = this.#source.section();
		const strain = Math.min(...parts.map(({ material }) => material.law.yieldTension));
		return (strain / Math.max(bounds.top - bounds.bottom, bounds.right - bounds.left)) * 2000;
	}
}

/**
 * The direction of a line as an angle within 90° of the asked axis, so that positive bending always
 * has its tension at the bottom of the drawing; free of the last digits' noise.
 */
function levelAngle(degrees: number, asked: number): number {
	const apart = degrees - asked;
	const turned = asked + apart - 180 * Math.ceil((apart - 90) / 180);
	return Math.round(turned * 1e6) / 1e6 + 0;
}

function strainLine({ e0, ky, kz }: ResponseState, angle: number): StrainLine {
	const radians = (angle * Math.PI) / 180;
	const across = (ky ?? 0) * Math.cos(radians) + (kz ?? 0) * Math.sin(radians);
	return { atOrigin: e0 ?? 0, curvature: across * 1e-3 };
}
