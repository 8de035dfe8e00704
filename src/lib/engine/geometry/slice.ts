import type { Edge } from './boundary';
import { flanksOf, type Flank } from './flank';
import { frameAt } from './frame';

/** A stretch of steel along a line, by its two ends, mm. */
export type Stretch = readonly [from: number, to: number];

/**
 * Steel along the line at `along` (mm) that runs across the axis of a frame at `angle` radians about the
 * origin: stretches by their `across`, ascending. Of two bodies that meet on the line one alone has it.
 */
export function stretchesAt(edges: readonly Edge[], angle: number, along: number): Stretch[] {
	const aside = frameAt({ y: 0, z: 0 }, angle - Math.PI / 2);
	const ends = flanksOf([edges], aside)
		.filter(({ low, high }) => low <= along && along < high)
		.map((flank) => ({ at: 0 - placeOn(flank, along), sign: -flank.sign }))
		.sort((a, b) => a.at - b.at);
	const out: Stretch[] = [];
	let open = 0;
	for (const [i, { at, sign }] of ends.entries()) {
		open -= sign;
		const next = ends[i + 1];
		if (open !== 0 && next && next.at > at) out.push([at, next.at]);
	}
	return out;
}

function placeOn(flank: Flank, level: number): number {
	if (flank.kind === 'line') return flank.start + flank.slope * (level - flank.low);
	const u = level - flank.across;
	const half = Math.sqrt(Math.max(0, (flank.radius - u) * (flank.radius + u)));
	return flank.along + flank.side * half;
}
