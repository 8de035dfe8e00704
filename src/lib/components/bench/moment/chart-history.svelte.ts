import { bendingFrom } from '$lib/engine/response/history/history-bending';
import { bending } from '$lib/engine/response/respond';
import type { PreparedSection } from '$lib/engine/section/prepared';
import type { BendState } from '../bend-state.svelte';
import { curvePoints, curveRatios, type CurvePoint } from '../curve';
import { evenRatios, legPoints, stretchOf, yieldBegins, type YieldMark } from './history-lines';

interface Reach {
	readonly least: number;
	readonly most: number;
}

/** Pieces of steel times lines of their law beyond which marks are left out and curves are coarse. */
const slow = 1500;

/** The lines of the moment–curvature chart: what has been, what lies ahead, and the same without a past. */
export class ChartLines {
	readonly #bend: () => BendState;
	readonly #section: () => PreparedSection;
	readonly #reach: () => Reach;

	constructor(bend: () => BendState, section: () => PreparedSection, reach: () => Reach) {
		this.#bend = bend;
		this.#section = section;
		this.#reach = reach;
	}

	readonly #turned = $derived.by(() => this.#bend().turned);
	readonly #path = $derived.by(() => this.#bend().path);
	readonly #unit = $derived.by(() => this.#bend().unit);
	readonly #least = $derived.by(() => this.#reach().least);
	readonly #most = $derived.by(() => this.#reach().most);
	readonly #isSlow = $derived.by(() => {
		const past = this.#turned?.history;
		if (!past) return false;
		return past.cells.reduce((sum, { plastic }) => sum + plastic.length, 0) > slow;
	});

	/** Its own bending: the curves must not disturb the search of the state that is dragged. */
	readonly bending = $derived.by(() =>
		this.#turned
			? bendingFrom(this.#turned.history, this.#path)
			: bending(this.#section(), this.#path)
	);

	readonly #ratios = $derived.by(() => {
		const [least, most] = [this.#least, this.#most];
		if (this.#turned && this.#turned.legs.length > 0)
			return evenRatios(least, most, this.#isSlow ? 16 : 72);
		const pieces = this.#isSlow ? 14 : 60;
		const back = least < 0 ? curveRatios(-least, pieces).slice(1) : [];
		return [...back.map((ratio) => -ratio).reverse(), ...curveRatios(most, pieces)];
	});

	/** The curve the handle moves on. */
	readonly ahead: readonly CurvePoint[] = $derived.by(() =>
		curvePoints(this.bending, this.#unit, this.#ratios)
	);

	/** The same section without residual stress and turns; none where that is the curve itself. */
	readonly fresh: readonly CurvePoint[] = $derived.by(() =>
		this.#turned && this.#bend().residual !== 'none'
			? curvePoints(bending(this.#section(), this.#path), this.#unit, this.#ratios)
			: []
	);

	readonly legs: readonly (readonly CurvePoint[])[] = $derived.by(() =>
		(this.#turned?.legs ?? []).map((leg) => legPoints(leg, this.#unit))
	);

	/** From the last turn to where it stands now. */
	readonly now: readonly CurvePoint[] = $derived.by(() => {
		const last = this.#turned?.legs.at(-1);
		const bend = this.#bend();
		const { moment } = bend.state;
		if (!last || bend.atTurn || moment === null) return [];
		return stretchOf(
			this.ahead,
			{ ratio: last.to, moment: last.moment },
			{ ratio: bend.ratio, moment }
		);
	});

	/** Where steel yields again: on the legs after the first, and ahead both ways. */
	readonly marks: readonly YieldMark[] = $derived.by(() => {
		const legs = this.#turned?.legs ?? [];
		const first = legs[0];
		if (!first || this.#isSlow) return [];
		const sense = Math.sign(first.to - first.from) || 1;
		const mark = (point: CurvePoint | null, along: number): YieldMark[] =>
			point ? [{ ...point, reverse: Math.sign(along) !== sense }] : [];
		const end = legs.at(-1)!.to;
		const been = legs
			.slice(1)
			.slice(-8)
			.flatMap((leg) =>
				mark(yieldBegins(leg.bending, this.#unit, leg.from, leg.to), leg.to - leg.from)
			);
		const toward = [this.#most, this.#least].filter((to) => Math.abs(to - end) > 1e-9);
		const next = toward.flatMap((to) =>
			mark(yieldBegins(this.bending, this.#unit, end, to), to - end)
		);
		return [...been, ...next].filter(
			(one, at, all) =>
				all.findIndex(
					({ ratio, moment }) =>
						Math.abs(ratio - one.ratio) < 0.02 &&
						Math.abs(moment - one.moment) < 0.02 * Math.abs(one.moment)
				) === at
		);
	});
}
