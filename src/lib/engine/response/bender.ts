import { equilibrium } from '../tolerances';
import type { Profile } from '../geometry/profile';
import type { Mechanics } from './law-groups';
import { planeForces, type PlaneForces } from './plane-forces';
import { risingRoot } from './rising-root';
import type { Transverse } from './state';

/**
 * A strain plane in the frame of the asked axis: ε = e0 − curvature·across + turn·along, with the
 * forces it gives in that frame. 1/mm, N, N·mm.
 */
export interface Bent {
	e0: number;
	curvature: number;
	/** Curvature across the asked axis. */
	turn: number;
	forces: PlaneForces;
	converged: boolean;
}

/** Evaluates and balances strain planes about one axis; see `bender`. */
export interface Bender {
	readonly mechanics: Mechanics;
	/** Radians from y. */
	readonly angle: number;
	evaluate(e0: number, curvature: number, turn: number): PlaneForces;
	profiles(
		curvature: number,
		turn: number
	): { profiles: readonly Profile[]; turned: number; size: number };
}

/** What balancing needs of a bender: the forces of a strain plane, whatever gives them. */
export type Forces = Pick<Bender, 'mechanics' | 'evaluate'>;

/** Strain planes about an axis at `angle` radians, any transverse curvature. */
export function bender(mechanics: Mechanics, angle: number): Bender {
	const profiles = (curvature: number, turn: number) => {
		const turned = turn === 0 ? 0 : Math.atan2(turn, curvature);
		const size = turn === 0 ? curvature : Math.hypot(curvature, turn);
		return { profiles: mechanics.profiles(angle + turned), turned, size };
	};
	const evaluate = (e0: number, curvature: number, turn: number) => {
		const seen = profiles(curvature, turn);
		const own = planeForces(mechanics.groups, seen.profiles, e0, seen.size);
		return seen.turned === 0 ? own : turnedForces(own, seen.turned);
	};
	return { mechanics, angle, evaluate, profiles };
}

/** Forces of a frame turned by δ, seen in the frame it was turned from. */
function turnedForces(f: PlaneForces, turned: number): PlaneForces {
	const [c, s] = [Math.cos(turned), Math.sin(turned)];
	return {
		N: f.N,
		M: f.M * c - f.T * s,
		T: f.M * s + f.T * c,
		NN: f.NN,
		NM: f.NM * c - f.NT * s,
		NT: f.NM * s + f.NT * c,
		MM: f.MM * c * c - 2 * f.MT * c * s + f.TT * s * s,
		MT: (f.MM - f.TT) * c * s + f.MT * (c * c - s * s),
		TT: f.MM * s * s + 2 * f.MT * c * s + f.TT * c * c
	};
}

/** Where to begin: the plane before, or the elastic one. */
export interface Guess {
	e0: number;
	turn: number;
}

/** The plane with a given curvature that carries N (newton), free or held across the axis. */
export function bentAtCurvature(
	b: Forces,
	transverse: Transverse,
	N: number,
	curvature: number,
	guess: Guess
): Bent {
	if (transverse === 'curvature-zero') return bentAt(b, N, curvature, 0, guess.e0);
	return freelyBent(b, N, curvature, guess);
}

/** Balances N by e0, everything else held. */
function bentAt(b: Forces, N: number, curvature: number, turn: number, guess: number): Bent {
	const { squash, reach } = b.mechanics;
	const size = Math.abs(curvature) + Math.abs(turn);
	let forces!: PlaneForces;
	let best: { e0: number; forces: PlaneForces } | undefined;
	const root = risingRoot(
		(e0) => {
			forces = b.evaluate(e0, curvature, turn);
			const value = forces.N - N;
			if (!best || Math.abs(value) < Math.abs(best.forces.N - N)) best = { e0, forces };
			return { value, slope: forces.NN };
		},
		guess,
		size * reach + largestYieldStrain(b.mechanics),
		finest * squash
	);
	const converged = Math.abs(root.value) <= equilibrium * squash;
	return { ...best!, curvature, turn, converged };
}

/** As fine as sums of a section's forces can be told apart. */
const finest = 1e-14;

const largestYieldStrain = ({ groups }: Mechanics): number =>
	Math.max(...groups.map(({ law }) => Math.max(law.yieldTension, law.yieldCompression)));

/** Balances N by e0 and the transverse moment by the transverse curvature. */
function freelyBent(b: Forces, N: number, curvature: number, guess: Guess): Bent {
	const scale = b.mechanics.squash * b.mechanics.reach;
	let e0 = guess.e0;
	let best: Bent | undefined;
	const root = risingRoot(
		(turn) => {
			const bent = bentAt(b, N, curvature, turn, e0);
			e0 = bent.e0;
			if (!best || Math.abs(bent.forces.T) < Math.abs(best.forces.T)) best = bent;
			return { value: bent.forces.T, slope: slopeAcross(bent.forces) };
		},
		guess.turn,
		Math.abs(curvature) +
			Math.abs(guess.turn) +
			largestYieldStrain(b.mechanics) / b.mechanics.reach,
		finest * scale
	);
	const balanced = Math.abs(root.value) <= equilibrium * scale;
	return { ...best!, converged: best!.converged && balanced };
}

/** ∂T/∂turn with N held. */
const slopeAcross = ({ TT, NT, NN }: PlaneForces): number => (NN > 0 ? TT - (NT * NT) / NN : TT);

/** ∂M/∂curvature with N held, and the transverse moment too when it is free. */
export function bendingStiffness(f: PlaneForces, transverse: Transverse): number {
	const axial = f.NN > 0 ? f.MM - (f.NM * f.NM) / f.NN : f.MM;
	if (transverse === 'curvature-zero') return axial;
	const across = slopeAcross(f);
	const mixed = f.NN > 0 ? f.MT - (f.NM * f.NT) / f.NN : f.MT;
	return across > 0 ? axial - (mixed * mixed) / across : axial;
}
