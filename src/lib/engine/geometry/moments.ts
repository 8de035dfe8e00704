import type { Point, Region } from './boundary';
import { frameAt } from './frame';
import { flanksOf } from './flank';
import { addArcAntiderivative, addLineMoments, momentCount } from './flank-moments';

/** Moments of area about axes through a point, parallel to y and z. mm², mm³, mm⁴. */
export interface AreaMoments {
	area: number;
	/** ∫z dA */
	firstY: number;
	/** ∫y dA */
	firstZ: number;
	/** ∫z² dA */
	secondY: number;
	/** ∫y² dA */
	secondZ: number;
	/** ∫yz dA */
	product: number;
}

/** Exact moments of area of a region bounded by straight edges and circular arcs. */
export function regionMoments(region: Region, origin: Point = { y: 0, z: 0 }): AreaMoments {
	const frame = frameAt(origin, 0);
	const out = new Float64Array(momentCount);
	for (const flank of flanksOf(region.loops, frame)) {
		if (flank.kind === 'line') addLineMoments(out, flank, flank.low, flank.high, flank.sign);
		else {
			addArcAntiderivative(out, flank, flank.high, flank.sign);
			addArcAntiderivative(out, flank, flank.low, -flank.sign);
		}
	}
	const [area, firstY, firstZ, secondY, product, secondZ] = out as unknown as SixNumbers;
	return { area, firstY, firstZ, secondY, secondZ, product };
}

type SixNumbers = [number, number, number, number, number, number];
