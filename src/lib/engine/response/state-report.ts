import type { Point } from '../geometry/boundary';
import { frameAt, pointIn, type Frame } from '../geometry/frame';
import type { Profile } from '../geometry/profile';
import { stressAt } from '../material/laws';
import type { Bender, Bent } from './bender';
import type { LawGroup } from './law-groups';
import { eachBand } from './plane-forces';
import { neutralAxisAt } from './plastic';
import type { ResponseState, Resultant } from './state';

const degrees = 180 / Math.PI;

/** A state that does not exist or was not found: no figures. */
export const noState: ResponseState = {
	curvature: null,
	curvatureRatio: null,
	moment: null,
	N: null,
	My: null,
	Mz: null,
	e0: null,
	ky: null,
	kz: null,
	neutralAxis: null,
	yieldedShare: null,
	extremes: null,
	compression: null,
	tension: null,
	leverArm: null,
	converged: false
};

/** The whole state of a balanced strain plane, in the contract's names and units. */
export function stateReport(b: Bender, bent: Bent, yieldCurvature: number | null): ResponseState {
	if (!bent.converged) return noState;
	const { forces, curvature, turn, e0 } = bent;
	const [c, s] = axisOf(b.angle);
	const seen = b.profiles(curvature, turn);
	const angle = b.angle + seen.turned;
	const frame = frameAt(b.mechanics.centroid, angle);
	const blocks = stressBlocks(b, seen.profiles, e0, seen.size);
	const compression = resultantOf(blocks.compression, frame);
	const tension = resultantOf(blocks.tension, frame);
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
		neutralAxis: seen.size === 0 ? null : neutralAxisAt(angle * degrees, e0 / seen.size),
		yieldedShare: blocks.yielded / b.mechanics.area,
		extremes: extremesOf(b.mechanics.groups, seen.profiles, e0, seen.size),
		compression,
		tension,
		leverArm: compression && tension ? distanceBetween(compression, tension) : null,
		converged: true
	};
}

const axisOf = (angle: number): readonly [number, number] => {
	const { cos, sin } = frameAt({ y: 0, z: 0 }, angle);
	return [cos, sin];
};

/** Force and its first moments in the frame of the neutral axis: N, N·mm. */
interface Block {
	force: number;
	across: number;
	along: number;
}

function stressBlocks(b: Bender, profiles: readonly Profile[], e0: number, size: number) {
	const compression: Block = { force: 0, across: 0, along: 0 };
	const tension: Block = { force: 0, across: 0, along: 0 };
	let yielded = 0;
	b.mechanics.groups.forEach((group, i) => {
		const { cuts, cutOffsets, cutSlopes, law } = group;
		eachBand(profiles[i]!, cuts, e0, size, (band, interval) => {
			const below = cuts[interval];
			const above = cuts[interval - 1];
			const squeezed = below !== undefined && below <= 0;
			const block = squeezed ? compression : tension;
			const constant = cutOffsets[interval]! + cutSlopes[interval]! * e0;
			const rate = cutSlopes[interval]! * size;
			block.force += constant * band[0]! - rate * band[1]!;
			block.across += constant * band[1]! - rate * band[3]!;
			block.along += constant * band[2]! - rate * band[4]!;
			const past = squeezed
				? below <= -law.yieldCompression
				: above !== undefined && above >= law.yieldTension;
			if (past) yielded += band[0]!;
		});
	});
	return { compression, tension, yielded };
}

function resultantOf({ force, across, along }: Block, frame: Frame): Resultant | null {
	if (force === 0) return null;
	return { force: force * 1e-3, ...pointIn(frame, along / force, across / force) };
}

const distanceBetween = (a: Point, b: Point): number => Math.hypot(a.y - b.y, a.z - b.z);

/** Extreme strains and stresses over all bodies. */
function extremesOf(
	groups: readonly LawGroup[],
	profiles: readonly Profile[],
	e0: number,
	size: number
) {
	const out = {
		strainMin: Infinity,
		strainMax: -Infinity,
		stressMin: Infinity,
		stressMax: -Infinity
	};
	groups.forEach(({ law }, i) => {
		const ends = [e0 - size * profiles[i]!.low, e0 - size * profiles[i]!.high];
		const [low, high] = [Math.min(...ends), Math.max(...ends)];
		const between = law.kinks.filter((kink) => kink > low && kink < high);
		const stresses = [low, high, ...between].map((strain) => stressAt(law, strain));
		out.strainMin = Math.min(out.strainMin, low);
		out.strainMax = Math.max(out.strainMax, high);
		out.stressMin = Math.min(out.stressMin, ...stresses);
		out.stressMax = Math.max(out.stressMax, ...stresses);
	});
	return out;
}
