import type { StressKnot } from './stress-profile';

type Scale = (value: number) => number;

const point = (x: number, y: number) => `${x.toFixed(2)} ${y.toFixed(2)}`;

/** Closed path of a stress block against its zero line; `x` of stress and `y` of depth in px. */
export function blockPath(knots: readonly StressKnot[], x: Scale, y: Scale): string {
	const [first, last] = [knots[0], knots.at(-1)];
	if (!first || !last) return '';
	const edge = knots.map((knot) => `L${point(x(knot.stress), y(knot.depth))}`).join('');
	return `M${point(x(0), y(first.depth))}${edge}L${point(x(0), y(last.depth))}Z`;
}

/** The part of a block that lies on one side of zero: +1 tension, −1 compression. */
export function signedKnots(knots: readonly StressKnot[], sign: 1 | -1): StressKnot[] {
	return knots.map(({ depth, stress }) => ({ depth, stress: stress * sign > 0 ? stress : 0 }));
}

/** The part of a block between two depths, with the stress read off at the cuts. */
export function knotsBetween(
	knots: readonly StressKnot[],
	top: number,
	bottom: number
): StressKnot[] {
	const inner = knots.filter(({ depth }) => depth < top && depth > bottom);
	const at = (depth: number, fromBelow: boolean) => ({
		depth,
		stress: stressAt(knots, depth, fromBelow)
	});
	return [at(top, true), ...inner, at(bottom, false)];
}

function stressAt(knots: readonly StressKnot[], depth: number, fromBelow: boolean): number {
	for (let index = 0; index + 1 < knots.length; index += 1) {
		const [a, b] = [knots[index], knots[index + 1]];
		if (!a || !b || a.depth === b.depth) continue;
		const inside = fromBelow
			? depth <= a.depth && depth > b.depth
			: depth < a.depth && depth >= b.depth;
		if (inside) return a.stress + ((b.stress - a.stress) * (a.depth - depth)) / (a.depth - b.depth);
	}
	return (fromBelow ? knots.at(-1) : knots[0])?.stress ?? 0;
}
