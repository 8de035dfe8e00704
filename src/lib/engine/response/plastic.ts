import { momentCount } from '../geometry/flank-moments';
import { chordAt, momentsBelow, type Profile } from '../geometry/profile';
import { weightedLevel } from '../geometry/weighted-level';
import type { PreparedSection } from '../section/prepared';
import { mechanicsOf, type LawGroup, type Mechanics } from './law-groups';
import type { BendingPath, NeutralAxis } from './state';

const radians = Math.PI / 180;

/** A fully plastic state. kNm; `moment` is the component about the asked axis. */
export interface PlasticState {
	moment: number | null;
	My: number | null;
	Mz: number | null;
	neutralAxis: NeutralAxis | null;
}

/** N·mm in the frame of the neutral axis, and its level from the centroid, mm. */
interface PlasticForces {
	M: number;
	T: number;
	level: number;
	/** How fast the moment moves as the neutral axis turns, N·mm a radian. */
	turning: () => number;
}

/**
 * Full plastic moment under N (kN): every fibre at its own strength, tension below the neutral
 * axis for positive bending. `curvature-zero`: the neutral axis is parallel to the asked axis;
 * `moment-zero`: it turns until no moment is left across it. Null when N exceeds the plastic force.
 */
export function plasticMoment(section: PreparedSection, path: BendingPath): PlasticState {
	return plasticMomentOf(mechanicsOf(section), path);
}

export function plasticMomentOf(
	mechanics: Mechanics,
	path: BendingPath,
	strengths: BlockStrengths = yieldStrengths
): PlasticState {
	const angle = path.axisAngle * radians;
	const N = path.N * 1e3;
	const block = (turned: number) => plasticForces(mechanics, angle + turned, N, strengths);
	const turned = path.transverse === 'moment-zero' ? plasticTurn(mechanics, block) : 0;
	const at = turned === null ? null : block(turned);
	if (turned === null || at === null) return noState;
	const [c, s] = [Math.cos(turned), Math.sin(turned)];
	const own = { M: at.M * c - at.T * s, T: at.M * s + at.T * c };
	const [ca, sa] = [Math.cos(angle), Math.sin(angle)];
	return {
		moment: own.M * 1e-6,
		My: (own.M * ca - own.T * sa) * 1e-6,
		Mz: (own.M * sa + own.T * ca) * 1e-6,
		neutralAxis: neutralAxisAt(path.axisAngle + turned / radians, at.level)
	};
}

/** Stresses of the block in one body, N/mm². */
export type BlockStrengths = (group: LawGroup) => { tension: number; compression: number };

const yieldStrengths: BlockStrengths = ({ fy, fyc }) => ({ tension: fy, compression: fyc });

const noState: PlasticState = { moment: null, My: null, Mz: null, neutralAxis: null };

/** The same line with its angle in (−90, 90]. */
export function neutralAxisAt(degrees: number, level: number): NeutralAxis {
	const half = Math.ceil((degrees - 90) / 180);
	return { distance: half % 2 === 0 ? level : -level, angle: degrees - 180 * half };
}

function plasticForces(
	mechanics: Mechanics,
	angle: number,
	N: number,
	strengths: BlockStrengths = yieldStrengths
): PlasticForces | null {
	const profiles = mechanics.profiles(angle);
	const stresses = mechanics.groups.map(strengths);
	const crushed = profiles.reduce((sum, p, i) => sum + stresses[i]!.compression * p.total[0]!, 0);
	const stretched = profiles.reduce((sum, p, i) => sum + stresses[i]!.tension * p.total[0]!, 0);
	const slack = 1e-12 * (crushed + stretched);
	if (!(N >= -crushed - slack && N <= stretched + slack)) return null;
	const weights = stresses.map(({ tension, compression }) => tension + compression);
	const target = Math.min(Math.max(N + crushed, 0), crushed + stretched);
	const level = weightedLevel(profiles, weights, target);
	let [M, T] = [0, 0];
	profiles.forEach((profile, i) => {
		const { tension, compression } = stresses[i]!;
		const forces = blockForces(profile, tension, compression, level);
		M += forces.M;
		T += forces.T;
	});
	return { M, T, level, turning: () => turningOf(profiles, weights, level) };
}

/** Second moment of the strengths along the neutral axis about their middle, N·mm. */
function turningOf(
	profiles: readonly Profile[],
	weights: readonly number[],
	level: number
): number {
	const sums = [0, 0, 0];
	profiles.forEach((profile, i) => {
		const chord = chordAt(profile, level);
		for (let k = 0; k < 3; k++) sums[k]! += weights[i]! * chord[k]!;
	});
	const [width, first, second] = sums as [number, number, number];
	return width > 0 ? second - (first * first) / width : 0;
}

/** Tension fy below the level, compression fyc above it. */
function blockForces(profile: Profile, fy: number, fyc: number, level: number) {
	const below = new Float64Array(momentCount);
	momentsBelow(profile, level, below);
	const [, across, along] = below as unknown as [number, number, number];
	return {
		M: fyc * (profile.total[1]! - across) - fy * across,
		T: fy * along - fyc * (profile.total[2]! - along)
	};
}

/** Share of the greatest moment below which the moment across the asked axis is rounding. */
const nothingAcross = { straight: 1e-13, turned: 2e-15 };
/** The neutral axis is known to this angle, radians. */
const sameAngle = 1e-15;

/**
 * How far the neutral axis turns from the asked axis until the transverse moment is zero; radians. The
 * block's moment moves along the neutral axis as that turns (normality), so that the transverse moment
 * only rises over half a turn: Newton's method in a bracket.
 */
function plasticTurn(
	mechanics: Mechanics,
	block: (turned: number) => PlasticForces | null
): number | null {
	const scale = mechanics.squash * mechanics.reach;
	let [low, high] = [-Math.PI / 2, Math.PI / 2];
	let turned = 0;
	for (let i = 0; i < 200; i++) {
		const at = block(turned);
		if (at === null) return null;
		const [c, s] = [Math.cos(turned), Math.sin(turned)];
		const across = at.M * s + at.T * c;
		const nothing = turned === 0 ? nothingAcross.straight : nothingAcross.turned;
		if (Math.abs(across) <= nothing * scale) return turned;
		if (across < 0) low = turned;
		else high = turned;
		const step = -across / (at.turning() * c);
		const newton = turned + step;
		if (high - low <= sameAngle || Math.abs(step) <= sameAngle) break;
		turned = newton > low && newton < high ? newton : (low + high) / 2;
	}
	return Math.PI / 2 - Math.abs(turned) > 2 * sameAngle ? turned : null;
}

/** Full plastic moments about y and z (kNm, N = 0, other curvature 0) and their neutral axes from the definition's origin. */
export function fullPlastic(section: PreparedSection) {
	const mechanics = mechanicsOf(section);
	const aboutY = plasticForces(mechanics, 0, 0)!;
	const aboutZ = plasticForces(mechanics, Math.PI / 2, 0)!;
	return {
		plasticY: aboutY.M * 1e-6,
		plasticZ: aboutZ.M * 1e-6,
		plasticNeutralAxisZ: section.gross.centroid.z + aboutY.level,
		plasticNeutralAxisY: section.gross.centroid.y - aboutZ.level
	};
}

/** Squash load, kN: every part at its own compressive strength. */
export function squashLoad(section: PreparedSection): number {
	const mechanics = mechanicsOf(section);
	return mechanics
		.profiles(0)
		.reduce((sum, { total }, i) => sum + mechanics.groups[i]!.fyc * total[0]! * 1e-3, 0);
}
