import { cutAlong } from '../../geometry/cut';
import type { Edge } from '../../geometry/boundary';
import { frameAt, type Frame } from '../../geometry/frame';
import { edgesAbout } from '../../geometry/edges-about';
import type { PreparedSection } from '../../section/prepared';
import { boxSizes } from '../../section/kinds/box';
import { iSizes } from '../../section/kinds/i';
import type { StressedPiece } from './pattern';
import { plateWelds } from './plate-welds';

/** Share of a plate's width in tension at its welds, and stress of the rest as a share of fy. */
const tensionShare = 0.2;
const compressionShare = 0.25;

/** A rectangular plate: the direction of its width, where it ends, and its weld lines, mm from the centroid. */
export interface WeldedPlate {
	/** Radians from y. */
	readonly angle: number;
	readonly from: number;
	readonly to: number;
	/** Placed evenly about the middle of the width; none leaves the plate without stress. */
	readonly welds: readonly number[];
}

/**
 * Residual stress of welding: tension fy at the welds over 20 % of each plate's width, shared evenly by
 * its welds, and compression 0.25 fy over the rest. Welds at the web–flange joints of an I and a box,
 * and where plates meet edge to face or edge to edge. A sentence where the section is none of these,
 * or where the welds of a plate do not lie evenly about its middle.
 */
export function weldedPattern(section: PreparedSection): readonly StressedPiece[] | string {
	const plates = platesOf(section);
	if (typeof plates === 'string') return plates;
	return section.parts.flatMap(({ region, material }, part) => {
		const edges = edgesAbout(region.loops, section.gross.centroid);
		return platePieces(part, edges, plates[part]!, material.fy);
	});
}

function platesOf(section: PreparedSection): readonly WeldedPlate[] | string {
	const { definition } = section;
	switch (definition.kind) {
		case 'i':
			if (definition.fabrication === 'welded') return iPlates(section);
			break;
		case 'box':
			return boxPlates(section);
		case 'plates':
			return plateWelds(definition, section.gross.centroid);
		default:
	}
	return 'Published residual stresses of welding cover welded I sections, boxes and joined plates only.';
}

const rightAngle = Math.PI / 2;

function iPlates({ definition, parts, gross }: PreparedSection): WeldedPlate[] {
	if (definition.kind !== 'i') return [];
	const { h, bTop, tfTop, bBottom, tfBottom, middle } = iSizes(definition);
	const { y, z } = gross.centroid;
	const flange = (b: number): WeldedPlate => ({
		...{ angle: 0, from: middle - b / 2 - y, to: middle + b / 2 - y },
		welds: [middle - y]
	});
	const [low, high] = [tfBottom - z, h - tfTop - z];
	const web: WeldedPlate = { angle: rightAngle, from: low, to: high, welds: [low, high] };
	return parts.map(({ name }) =>
		name === 'web' ? web : flange(name === 'topFlange' ? bTop : bBottom)
	);
}

function boxPlates({ definition, parts, gross }: PreparedSection): WeldedPlate[] {
	if (definition.kind !== 'box') return [];
	const { h, bTop, tfTop, bBottom, tfBottom, webGap, tw, middle } = boxSizes(definition);
	const { y, z } = gross.centroid;
	const apart = (webGap + tw) / 2;
	const flange = (b: number): WeldedPlate => ({
		...{ angle: 0, from: middle - b / 2 - y, to: middle + b / 2 - y },
		welds: [middle - apart - y, middle + apart - y]
	});
	const [low, high] = [tfBottom - z, h - tfTop - z];
	const web: WeldedPlate = { angle: rightAngle, from: low, to: high, welds: [low, high] };
	return parts.map(({ name }) => {
		if (name === 'leftWeb' || name === 'rightWeb') return web;
		return flange(name === 'topFlange' ? bTop : bBottom);
	});
}

function platePieces(
	part: number,
	edges: readonly Edge[],
	plate: WeldedPlate,
	fy: number
): StressedPiece[] {
	const even = (own: readonly Edge[], stress: number): StressedPiece => ({
		...{ part, edges: own },
		stress: { c: stress, y: 0, z: 0 }
	});
	if (plate.welds.length === 0) return [even(edges, 0)];
	// `across` of this frame runs along the width of the plate
	const frame: Frame = frameAt({ y: 0, z: 0 }, plate.angle - rightAngle);
	const tolerance = 1e-12 * (plate.to - plate.from);
	const pieces: StressedPiece[] = [];
	let rest = edges;
	for (const [from, to] of tensionBlocks(plate)) {
		const before = cutAlong(rest, frame, from, tolerance);
		const after = cutAlong(before.above, frame, to, tolerance);
		pieces.push(even(before.below, -compressionShare * fy), even(after.below, fy));
		rest = after.above;
	}
	pieces.push(even(rest, -compressionShare * fy));
	return pieces.filter((piece) => piece.edges.length > 0);
}

/** Stretches of the width in tension, in order; moved aside where they would overrun an end or each other. */
function tensionBlocks({ from, to, welds }: WeldedPlate): [number, number][] {
	const width = (tensionShare * (to - from)) / welds.length;
	const blocks: [number, number][] = [];
	const lines = [...welds].sort((a, b) => a - b);
	const half = (from + to) / 2;
	lines.forEach((weld, i) => {
		const start = Math.min(Math.max(weld - width / 2, from), to - width);
		const apart = (lines.length - 1) / 2 - i;
		// blocks on one side of the middle stay there, so that both sides mirror each other
		const kept =
			apart > 0
				? Math.min(start, half - apart * width - width / 2)
				: Math.max(start, half - apart * width - width / 2);
		blocks.push([kept, kept + width]);
	});
	return blocks;
}
