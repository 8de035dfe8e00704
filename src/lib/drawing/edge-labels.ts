import type { StressBlock } from './stress-blocks';

/** A stress to be written at a plate edge: its depth (mm), value (N/mm²) and side of the diagram. */
export interface EdgeStress {
	readonly depth: number;
	readonly stress: number;
	readonly side: 'left' | 'right';
}

/**
 * Stresses at every plate edge from the top down, each step giving two.
 * The same figure twice within `near` mm is written once.
 */
export function edgeStresses(
	blocks: readonly StressBlock[],
	edges: readonly number[],
	near: number
): EdgeStress[] {
	const ends = blocks.flatMap(({ knots, top, bottom }) => {
		const inner = edges.filter((edge) => edge < top && edge > bottom);
		const at = [top, ...inner, bottom];
		return at.map((depth) => ({ depth, stress: stressIn(knots, depth) }));
	});
	return ends
		.filter((end, index) => !ends.slice(0, index).some((other) => alike(end, other, near)))
		.map((end) => ({ ...end, side: end.stress < 0 ? 'left' : 'right' }));
}

const alike = (
	a: { depth: number; stress: number },
	b: { depth: number; stress: number },
	near: number
) => Math.abs(a.depth - b.depth) <= near && Math.round(a.stress) === Math.round(b.stress);

function stressIn(knots: StressBlock['knots'], depth: number): number {
	const exact = knots.find((knot) => knot.depth === depth);
	if (exact) return exact.stress;
	const below = knots.findIndex((knot) => knot.depth < depth);
	const [from, to] = [knots[below - 1], knots[below]];
	if (!from || !to) return 0;
	return from.stress + ((to.stress - from.stress) * (from.depth - depth)) / (from.depth - to.depth);
}
