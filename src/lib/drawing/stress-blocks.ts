import type { PartStress, StressKnot, YieldedBand } from './stress-profile';

/** Stress over a stretch of depth, drawn as one block; where materials lie side by side, the others follow dashed. */
export interface StressBlock {
	readonly top: number;
	readonly bottom: number;
	readonly knots: readonly StressKnot[];
	readonly yielded: readonly YieldedBand[];
	/** True for a second material at the same depth. */
	readonly beside: boolean;
}

/**
 * The stress diagram from top to bottom: one block for each stretch between plate edges.
 * Parts of the same law side by side share a block; other laws at the same depth come `beside`.
 */
export function stressBlocks(stresses: readonly PartStress[]): StressBlock[] {
	const edges = plateEdges(stresses);
	const blocks: StressBlock[] = [];
	for (let index = 0; index + 1 < edges.length; index += 1) {
		const [top, bottom] = [edges[index] ?? 0, edges[index + 1] ?? 0];
		const here = stresses.filter(({ part }) => part.top >= top && part.bottom <= bottom);
		here
			.filter((one, at) => here.findIndex((other) => sameStress(one, other)) === at)
			.forEach((one, at) => blocks.push(cutBlock(one, top, bottom, at > 0)));
	}
	return joined(blocks);
}

/** Depths of all plate edges, from the top down, each once. */
export function plateEdges(stresses: readonly PartStress[]): number[] {
	const depths = stresses.flatMap(({ part }) => [part.top, part.bottom]).sort((a, b) => b - a);
	const size = Math.abs((depths[0] ?? 0) - (depths.at(-1) ?? 0)) || 1;
	return depths.filter((depth, at) => at === 0 || (depths[at - 1] ?? 0) - depth > size * 1e-9);
}

const sameStress = (a: PartStress, b: PartStress) =>
	a.past || b.past ? sameKnots(a.knots, b.knots) : sameStrength(a, b);

const sameKnots = (a: readonly StressKnot[], b: readonly StressKnot[]) =>
	a.length === b.length &&
	a.every(({ depth, stress }, at) => {
		const other = b[at]!;
		return (
			Math.abs(depth - other.depth) < 1e-6 * (1 + Math.abs(depth)) &&
			Math.abs(stress - other.stress) < 1e-3
		);
	});

const sameStrength = (a: PartStress, b: PartStress) =>
	a.part.law === b.part.law ||
	(a.part.fy === b.part.fy &&
		a.part.fyc === b.part.fyc &&
		a.part.law.slopes.length === b.part.law.slopes.length);

function cutBlock(
	{ knots, yielded }: PartStress,
	top: number,
	bottom: number,
	beside: boolean
): StressBlock {
	const inner = knots.filter(({ depth }) => depth < top && depth > bottom);
	const ends = [
		{ depth: top, stress: between(knots, top) },
		{ depth: bottom, stress: between(knots, bottom) }
	] as const;
	const bands = yielded
		.map((band) => ({
			...band,
			top: Math.min(band.top, top),
			bottom: Math.max(band.bottom, bottom)
		}))
		.filter((band) => band.top > band.bottom);
	return { top, bottom, knots: [ends[0], ...inner, ends[1]], yielded: bands, beside };
}

function between(knots: readonly StressKnot[], depth: number): number {
	const below = Math.max(
		1,
		knots.findIndex((knot) => knot.depth <= depth)
	);
	const [from, to] = [knots[below - 1], knots[below]];
	if (!from || !to) return knots[0]?.stress ?? 0;
	const span = from.depth - to.depth;
	return span === 0
		? to.stress
		: from.stress + ((to.stress - from.stress) * (from.depth - depth)) / span;
}

/** Joins neighbours that carry on without a step, so that a plate edge inside one steel leaves no line. */
function joined(blocks: readonly StressBlock[]): StressBlock[] {
	const out: StressBlock[] = [];
	for (const block of blocks) {
		const last = out.at(-1);
		if (last && carriesOn(last, block)) out[out.length - 1] = join(last, block);
		else out.push(block);
	}
	return out;
}

function carriesOn(upper: StressBlock, lower: StressBlock): boolean {
	const [end, start] = [upper.knots.at(-1), lower.knots[0]];
	if (!end || !start || upper.beside || lower.beside) return false;
	return end.depth === start.depth && Math.abs(end.stress - start.stress) < 1e-6;
}

const join = (upper: StressBlock, lower: StressBlock): StressBlock => ({
	top: upper.top,
	bottom: lower.bottom,
	knots: [...upper.knots, ...lower.knots.slice(1)],
	yielded: [...upper.yielded, ...lower.yielded],
	beside: false
});
