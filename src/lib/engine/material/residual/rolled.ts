import { cutAlong } from '../../geometry/cut';
import type { Edge } from '../../geometry/boundary';
import { frameAt } from '../../geometry/frame';
import { edgesAbout } from '../../geometry/edges-about';
import { zeroField } from '../../response/history/linear-field';
import type { PreparedSection } from '../../section/prepared';
import { iSizes } from '../../section/kinds/i';
import type { StressedPiece } from './pattern';

/** Peak stress, N/mm²: a share of 235 whatever the grade (ECCS 33, by memory). */
const peakStress = (h: number, b: number): number => (h / b <= 1.2 ? 0.5 : 0.3) * 235;

/** Levels of y or z at which a part is cut, from one end of a plate to the other. */
export const upwards = frameAt({ y: 0, z: 0 }, 0);
/** `across` is −y. */
export const leftwards = frameAt({ y: 0, z: 0 }, Math.PI / 2);

/**
 * Residual stress of a rolled I: over each flange half from tension at the web's middle to compression at
 * the tip, over the web from tension at both flanges to compression at mid-depth; constant through the
 * thickness. The root fillets carry none. A sentence where the section is no rolled I.
 */
export function rolledPattern(section: PreparedSection): readonly StressedPiece[] | string {
	const { definition, gross } = section;
	if (definition.kind !== 'i' || definition.fabrication !== 'rolled')
		return 'Published residual stresses of rolling cover rolled I and H sections only.';
	const { h, bTop, bBottom, tfTop, tfBottom, tw, middle } = iSizes(definition);
	const peak = peakStress(h, Math.max(bTop, bBottom));
	const { y: yc, z: zc } = gross.centroid;
	const tolerance = 1e-12 * h;
	const axis = middle - yc;
	return section.parts.flatMap(({ name, region }, part): StressedPiece[] => {
		const edges = edgesAbout(region.loops, gross.centroid);
		if (name === 'web') {
			const depth = { low: tfBottom - zc, high: h - tfTop - zc };
			return webPieces(part, edges, { ...depth, axis, tw, peak, tolerance });
		}
		const half = (name === 'topFlange' ? bTop : bBottom) / 2;
		const { below: right, above: left } = cutAlong(edges, leftwards, -axis, tolerance);
		const rate = (2 * peak) / half;
		return [
			{ part, edges: right, stress: { c: peak + rate * axis, y: -rate, z: 0 } },
			{ part, edges: left, stress: { c: peak - rate * axis, y: rate, z: 0 } }
		];
	});
}

interface WebPlace {
	low: number;
	high: number;
	axis: number;
	tw: number;
	peak: number;
	tolerance: number;
}

function webPieces(
	part: number,
	edges: readonly Edge[],
	{ low, high, axis, tw, peak, tolerance }: WebPlace
): StressedPiece[] {
	const right = cutAlong(edges, leftwards, -(axis + tw / 2), tolerance);
	const left = cutAlong(right.above, leftwards, -(axis - tw / 2), tolerance);
	const middle = (low + high) / 2;
	const { below, above } = cutAlong(left.below, upwards, middle, tolerance);
	const rate = (4 * peak) / (high - low);
	const pieces = [
		{ part, edges: below, stress: { c: -peak + rate * middle, y: 0, z: -rate } },
		{ part, edges: above, stress: { c: -peak - rate * middle, y: 0, z: rate } },
		{ part, edges: right.below, stress: zeroField },
		{ part, edges: left.above, stress: zeroField }
	];
	return pieces.filter((piece) => piece.edges.length > 0);
}
