import type { Flank } from '../geometry/flank';
import { flanksOf } from '../geometry/flank';
import { momentCount } from '../geometry/flank-moments';
import { addMomentsBelow, widthBetween } from '../geometry/flanks-below';
import { frameAt } from '../geometry/frame';
import { rootBetween } from '../geometry/weighted-level';
import type { Mechanics } from './law-groups';

/** Forces of the full plastic block about the gross centroid, N and N·mm. */
export interface BlockForces {
	N: number;
	My: number;
	Mz: number;
}

/** Full plastic blocks of a section, one neutral axis at a time. */
export interface Blocks {
	/** Block of the strains e0 − ky·z + kz·y: every fibre at its strength, by the sign of its strain. */
	ofStrains(e0: number, ky: number, kz: number): BlockForces;
	/** Block under N with its neutral axis along (ky, kz), tension on the side that they stretch. */
	under(N: number, ky: number, kz: number): BlockForces;
	/** Forces with all steel in compression (negative) and in tension. */
	readonly crushed: number;
	readonly stretched: number;
}

export function plasticBlocks(mechanics: Mechanics): Blocks {
	const areas = mechanics.profiles(0).map(({ total }) => total[0]!);
	const sum = (strength: (i: number) => number) =>
		areas.reduce((force, area, i) => force + strength(i) * area, 0);
	const crushed = -sum((i) => mechanics.groups[i]!.fyc);
	const stretched = sum((i) => mechanics.groups[i]!.fy);
	return {
		crushed,
		stretched,
		ofStrains: (e0, ky, kz) => {
			const size = Math.hypot(ky, kz);
			const level = size === 0 ? Math.sign(e0) * Infinity : e0 / size;
			return blockAt(mechanics, viewOf(mechanics, ky, kz), level);
		},
		under: (N, ky, kz) => {
			const view = viewOf(mechanics, ky, kz);
			return blockAt(mechanics, view, levelUnder(mechanics, view, N, crushed));
		}
	};
}

/** The bodies seen along the normal of a neutral axis. */
interface View {
	readonly cos: number;
	readonly sin: number;
	readonly flanks: readonly (readonly Flank[])[];
}

function viewOf({ groups, centroid }: Mechanics, ky: number, kz: number): View {
	const frame = frameAt(centroid, ky === 0 && kz === 0 ? 0 : Math.atan2(kz, ky));
	const flanks = groups.map(({ loops }) => flanksOf(loops, frame));
	return { cos: frame.cos, sin: frame.sin, flanks };
}

const below = new Float64Array(momentCount);
const total = new Float64Array(momentCount);

/** Tension fy below the level, compression fyc above it. */
function blockAt({ groups }: Mechanics, { cos, sin, flanks }: View, level: number): BlockForces {
	let [N, M, T] = [0, 0, 0];
	flanks.forEach((body, i) => {
		const { fy, fyc } = groups[i]!;
		below.fill(0);
		total.fill(0);
		addMomentsBelow(below, body, level);
		addMomentsBelow(total, body, Infinity);
		N += fy * below[0]! - fyc * (total[0]! - below[0]!);
		M += fyc * (total[1]! - below[1]!) - fy * below[1]!;
		T += fy * below[2]! - fyc * (total[2]! - below[2]!);
	});
	return { N, My: M * cos - T * sin, Mz: M * sin + T * cos };
}

/** Forces closer than this share of the squash load are told apart by rounding only. */
const rounding = 2e-15;

/** Level at which the block carries N: the force rises with the level. */
function levelUnder(
	{ groups, squash }: Mechanics,
	{ flanks }: View,
	N: number,
	crushed: number
): number {
	const weights = groups.map(({ fy, fyc }) => fy + fyc);
	const excess = (level: number) => {
		let force = crushed - N;
		flanks.forEach((body, i) => {
			below.fill(0);
			addMomentsBelow(below, body, level);
			force += weights[i]! * below[0]!;
		});
		return Math.abs(force) <= rounding * squash ? 0 : force;
	};
	const slope = (level: number) =>
		flanks.reduce((sum, body, i) => sum + weights[i]! * widthBetween(body, level), 0);
	let [low, high] = [Infinity, -Infinity];
	for (const flank of flanks.flat()) {
		low = Math.min(low, flank.low);
		high = Math.max(high, flank.high);
	}
	return rootBetween(low, high, excess, slope);
}
