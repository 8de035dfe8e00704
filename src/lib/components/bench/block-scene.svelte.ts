import { blockLayout, depthToPx, type BlockLayout } from '$lib/drawing/block-layout';
import { cellFills } from '$lib/drawing/cell-fills';
import { edgeStresses } from '$lib/drawing/edge-labels';
import { historyStresses, stressTurns } from '$lib/drawing/history-stress';
import { loopsPath, polygonPath } from '$lib/drawing/loop-path';
import { strainSpan } from '$lib/drawing/span-steps';
import { plateEdges, stressBlocks } from '$lib/drawing/stress-blocks';
import { depthAt, depthParts, partStress, strainAt } from '$lib/drawing/stress-profile';
import { depthOf, extentOf, turnedFrame } from '$lib/drawing/turned-frame';
import type { EffectiveProperties } from '$lib/engine/rules/en1993/effective/effective-section';
import type { History } from '$lib/engine/response/history/history';
import { historyPicture } from '$lib/engine/response/history/history-picture';
import type { ResponseState } from '$lib/engine/response/state';
import type { PreparedSection } from '$lib/engine/section/prepared';
import type { StrainLine } from '$lib/drawing/stress-profile';

/** What the drawing shows: a section, how it is seen, and how it is bent. */
export interface SceneSource {
	readonly section: PreparedSection;
	/** What of it counts in class 4; null where all of it does. */
	readonly effective: Pick<EffectiveProperties, 'removed' | 'centroid'> | null;
	/** Degrees of the level axis. */
	readonly angle: number;
	readonly line: StrainLine;
	readonly state: ResponseState;
	/** The steel as its past left it; null where the strain alone tells its stress. */
	readonly past: History | null;
	/** Let go: the stress is locked in. */
	readonly released: boolean;
	readonly width: number;
	readonly height: number;
	/** Span of the strain scale in multiples of the yield strain, held while an end is dragged. */
	readonly heldSpan: number | null;
}

/** Everything the drawing needs, in two stages: what follows the section, and what follows the bending. */
export class BlockScene {
	readonly #source: () => SceneSource;

	constructor(source: () => SceneSource) {
		this.#source = source;
	}

	readonly #section = $derived.by(() => this.#source().section);
	readonly #angle = $derived.by(() => this.#source().angle);
	readonly #width = $derived.by(() => this.#source().width);
	readonly #height = $derived.by(() => this.#source().height);

	readonly definition = $derived.by(() => this.#section.definition);
	readonly frame = $derived.by(() => turnedFrame(this.#section.gross.centroid, this.#angle));
	readonly extent = $derived.by(() => extentOf(this.frame, this.#section.contours));
	readonly layout: BlockLayout = $derived.by(() =>
		blockLayout(this.#width, this.#height, this.extent)
	);
	readonly parts = $derived.by(() => depthParts(this.#section.parts, this.frame));
	readonly outline = $derived.by(() => loopsPath(this.#section.contours, this.frame.origin));
	readonly partPaths = $derived.by(() =>
		this.#section.parts.map(({ region }) => loopsPath(region.loops, this.frame.origin))
	);
	/** Strips of plates that do not count. */
	readonly removed = $derived.by(() => this.#source().effective?.removed ?? []);
	readonly removedPaths = $derived.by(() =>
		this.removed.map(({ corners }) => polygonPath(corners, this.frame.origin))
	);
	/** Height of the effective centroid above the gross one, mm; null where nothing is removed. */
	readonly effectiveDepth = $derived.by(() => {
		const effective = this.#source().effective;
		return effective && effective.removed.length > 0
			? depthOf(this.frame, effective.centroid)
			: null;
	});
	/** Yield strain that scales the strain column: the least of all parts. */
	readonly yieldStrain = $derived.by(() =>
		Math.min(...this.parts.map(({ law }) => Math.min(law.yieldTension, law.yieldCompression)))
	);
	readonly yieldStrains = $derived.by(() => distinctYieldStrains(this.parts));
	readonly strength = $derived.by(() =>
		Math.max(...this.parts.map(({ fy, fyc }) => Math.max(fy, fyc)))
	);

	readonly line = $derived.by(() => this.#source().line);
	readonly state = $derived.by(() => this.#source().state);
	readonly topStrain = $derived.by(() => strainAt(this.line, this.extent.top));
	readonly bottomStrain = $derived.by(() => strainAt(this.line, this.extent.bottom));
	readonly span = $derived.by(() => {
		const most = Math.max(Math.abs(this.topStrain), Math.abs(this.bottomStrain));
		return this.#source().heldSpan ?? strainSpan(most / this.yieldStrain);
	});
	readonly past = $derived.by(() => this.#source().past);
	readonly released = $derived.by(() => this.#source().released);
	readonly stresses = $derived.by(() =>
		this.past
			? historyStresses(this.parts, historyPicture(this.past, this.#angle))
			: this.parts.map((part) => partStress(part, this.line))
	);
	/** Steel piece by piece, where its past matters. */
	readonly fills = $derived.by(() => this.past && cellFills(this.past));
	readonly blocks = $derived.by(() => stressBlocks(this.stresses));
	/** Levels at which a stress is written. */
	readonly #figureLevels = $derived.by(() => [
		...plateEdges(this.stresses),
		...(this.past ? stressTurns(this.stresses) : [])
	]);
	readonly edgeStresses = $derived.by(() =>
		edgeStresses(this.blocks, this.#figureLevels, 3 / this.layout.pxPerMm)
	);
	/** Height of the neutral axis above the centroid, mm; null when it lies outside the steel. */
	readonly neutralDepth = $derived.by(() => {
		const depth = this.state.converged ? depthAt(this.line, 0) : null;
		return depth !== null && depth <= this.extent.top && depth >= this.extent.bottom ? depth : null;
	});
	readonly fronts = $derived.by(() => frontDepths(this));
	readonly couple = $derived.by(() => {
		const { compression, tension } = this.state;
		return {
			compression: compression && {
				force: compression.force,
				depth: depthOf(this.frame, compression)
			},
			tension: tension && { force: tension.force, depth: depthOf(this.frame, tension) }
		};
	});

	depthPx = (depth: number) => depthToPx(this.layout, depth);

	/** Half the room of the strain line, px. */
	get strainHalf(): number {
		return this.layout.strain.width / 2 - (this.layout.narrow ? 4 : 8);
	}
	strainPx = (strain: number) =>
		this.layout.strain.middle + (strain / (this.span * this.yieldStrain)) * this.strainHalf;
	strainOfPx = (px: number) =>
		((px - this.layout.strain.middle) / this.strainHalf) * this.span * this.yieldStrain;

	/** Greatest stress drawn: the strength, or what the steel has hardened to. */
	readonly #stressReach = $derived.by(() => {
		const { extremes } = this.state;
		const most = extremes ? Math.max(extremes.stressMax, -extremes.stressMin) : 0;
		return Math.max(this.strength, most);
	});
	stressPx = (stress: number) => {
		const { stress: column, narrow } = this.layout;
		const half = column.width / 2 - (narrow ? 38 : 42);
		return column.middle + (stress / this.#stressReach) * half;
	};
}

type Scene = Pick<BlockScene, 'stresses' | 'extent' | 'line'>;

function frontDepths({ stresses, extent }: Scene): number[] {
	const near = (extent.top - extent.bottom) * 1e-6;
	const depths = stresses.flatMap(({ part, yielded }) =>
		yielded
			.flatMap(({ top, bottom }) => [top, bottom])
			.filter((depth) => depth < part.top - near && depth > part.bottom + near)
	);
	return depths
		.sort((a, b) => b - a)
		.filter((depth, at) => at === 0 || (depths[at - 1] ?? 0) - depth > near);
}

function distinctYieldStrains(parts: BlockScene['parts']): number[] {
	const strains = parts.flatMap(({ law }) => [law.yieldTension, -law.yieldCompression]);
	return [...new Set(strains.map((strain) => Number(strain.toPrecision(6))))];
}
