import { extentAcross } from '../../geometry/bounds';
import { flanksOf } from '../../geometry/flank';
import { momentCount, type Moments } from '../../geometry/flank-moments';
import { addMomentsBelow } from '../../geometry/flank-sums';
import { frameAt } from '../../geometry/frame';
import type { Layer } from '../../material/layers';
import type { Bent } from '../bender';
import { neutralAxisAt } from '../plastic';
import type { BendingPath, ResponseState, Resultant } from '../state';
import { boxSpread, fallOf, spreadOver, type Cell } from './cell';
import { upright } from './cell-forces';
import { stressField } from './cut-cells';
import type { History } from './history';
import { fieldSum, type LinearField } from './linear-field';

const degrees = 180 / Math.PI;

/** Forces below this share of the squash load are rounding. */
const noForce = 1e-12;

/** The whole state of a section whose cells have been cut for its present strain plane. */
export function historyReport(
	history: History,
	{ axisAngle }: BendingPath,
	{ forces, curvature, turn, e0 }: Bent,
	yieldCurvature: number | null
): ResponseState {
	const { cos: c, sin: s } = frameAt({ y: 0, z: 0 }, axisAngle / degrees);
	const blocks = stressBlocks(history);
	const compression = resultantOf(history, blocks.compression);
	const tension = resultantOf(history, blocks.tension);
	const size = Math.hypot(curvature, turn);
	const turned = size === 0 ? 0 : Math.atan2(turn, curvature) * degrees;
	return {
		curvature: curvature * 1e3,
		curvatureRatio: yieldCurvature === null ? null : (curvature * 1e3) / yieldCurvature,
		moment: forces.M * 1e-6,
		N: forces.N * 1e-3,
		My: (forces.M * c - forces.T * s) * 1e-6,
		Mz: (forces.M * s + forces.T * c) * 1e-6,
		e0,
		ky: (curvature * c - turn * s) * 1e3,
		kz: (curvature * s + turn * c) * 1e3,
		neutralAxis: size === 0 ? null : neutralAxisAt(axisAngle + turned, e0 / size),
		yieldedShare: blocks.yielded / history.mechanics.area,
		extremes: {
			...strainExtremes(history),
			stressMin: blocks.stressMin,
			stressMax: blocks.stressMax
		},
		compression,
		tension,
		leverArm:
			compression && tension
				? Math.hypot(compression.y - tension.y, compression.z - tension.z)
				: null,
		converged: true
	};
}

/** Force, ∫σz and ∫σy of the stresses of one sign. */
type Block = [number, number, number];

function stressBlocks({ cells, layers, strain }: History) {
	const compression: Block = [0, 0, 0];
	const tension: Block = [0, 0, 0];
	let [yielded, stressMin, stressMax] = [0, Infinity, -Infinity];
	for (const cell of cells) {
		const own = layers[cell.part]!;
		const stress = stressField(cell, own, strain);
		const { least, most } = spreadOver(cell, stress);
		stressMin = Math.min(stressMin, least);
		stressMax = Math.max(stressMax, most);
		if (yieldSense(cell, own[0]!, strain)) yielded += cell.moments[0]!;
		if (least >= 0) addStress(tension, cell.moments, stress);
		else if (most <= 0) addStress(compression, cell.moments, stress);
		else {
			const { stretched, crushed } = partedByStress(cell, stress);
			addStress(tension, stretched, stress);
			addStress(compression, crushed, stress);
		}
	}
	return { compression, tension, yielded, stressMin, stressMax };
}

function addStress(block: Block, m: Moments, { c, y, z }: LinearField): void {
	block[0] += c * m[0]! + z * m[1]! + y * m[2]!;
	block[1] += c * m[1]! + z * m[3]! + y * m[4]!;
	block[2] += c * m[2]! + z * m[4]! + y * m[5]!;
}

/** Moments of the two sides of the line of no stress. */
function partedByStress({ edges, moments }: Cell, stress: LinearField) {
	const { frame, size } = fallOf(stress);
	const out = new Float64Array(momentCount);
	addMomentsBelow(out, flanksOf([edges], frame), stress.c / size);
	const stretched = upright(out, frame);
	return { stretched, crushed: moments.map((value, i) => value - stretched[i]!) };
}

function resultantOf({ section, mechanics }: History, [force, z, y]: Block): Resultant | null {
	if (Math.abs(force) <= noForce * mechanics.squash) return null;
	const { centroid } = section.gross;
	return { force: force * 1e-3, y: centroid.y + y / force, z: centroid.z + z / force };
}

/** How far from its limit, as a share of it, steel still counts as yielding. */
const atLimit = 1e-9;

/** The sense in which a cell stands at its yield strength, if so. */
export function yieldSense(
	cell: Cell,
	{ tension, compression }: Layer,
	strain: LinearField
): 'tension' | 'compression' | null {
	const { least, most } = boxSpread(cell.box, fieldSum(strain, cell.plastic[0]!, -1));
	if (least >= tension * (1 - atLimit)) return 'tension';
	return most <= -compression * (1 - atLimit) ? 'compression' : null;
}

function strainExtremes({ section, strain }: History) {
	const { size, frame } = fallOf(strain);
	if (size === 0) return { strainMin: strain.c, strainMax: strain.c };
	const loops = section.parts.flatMap(({ region }) => region.loops);
	const { low, high } = extentAcross(loops, { ...frame, origin: section.gross.centroid });
	return { strainMin: strain.c - size * high, strainMax: strain.c - size * low };
}
