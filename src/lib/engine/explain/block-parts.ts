import { momentCount } from '../geometry/flank-moments';
import { frameAt } from '../geometry/frame';
import { momentsBelow, profileOf } from '../geometry/profile';
import type { PreparedSection } from '../section/prepared';

/** How a level line across the section splits one part: areas (mm²) and first moments (mm³) about the centroid. */
export interface PartSplit {
	readonly name: string;
	readonly fy: number;
	readonly fyc: number;
	readonly below: number;
	readonly above: number;
	/** ∫across dA; across is up for an axis along y, to the left for one along z. */
	readonly firstBelow: number;
	readonly firstAbove: number;
}

/** Parts split at a level (mm from the centroid, across an axis at `angle` degrees). */
export function partSplits(
	{ parts, gross: { centroid } }: PreparedSection,
	angle: number,
	level: number
): PartSplit[] {
	const frame = frameAt(centroid, (angle * Math.PI) / 180);
	const out = new Float64Array(momentCount);
	return parts.map(({ name, region, material: { fy, fyc } }) => {
		const profile = profileOf(region.loops, frame);
		momentsBelow(profile, level, out);
		const [area, first] = [profile.total[0]!, profile.total[1]!];
		return {
			name,
			fy,
			fyc,
			below: out[0]!,
			above: area - out[0]!,
			firstBelow: out[1]!,
			firstAbove: first - out[1]!
		};
	});
}
