import { extentAcross } from '../geometry/bounds';
import { frameAt } from '../geometry/frame';
import type { Mechanics } from './law-groups';
import type { Transverse } from './state';

/** Elastic strain planes about an axis at constant N: e0 and turn are straight lines in the curvature. */
export interface ElasticPath {
	e0: (curvature: number) => number;
	turn: (curvature: number) => number;
	moment: (curvature: number) => number;
}

/** Strain plane to forces, symmetric: rows N, M, T; columns e0, κ, τ. N, N·mm, N·mm². */
export interface Stiffness {
	NN: number;
	NM: number;
	NT: number;
	MM: number;
	MT: number;
	TT: number;
}

/** Elastic stiffness about the gross centroid in the frame of the axis, each body with its own E. */
export function elasticStiffness(mechanics: Mechanics, angle: number): Stiffness {
	const sum: Stiffness = { NN: 0, NM: 0, NT: 0, MM: 0, MT: 0, TT: 0 };
	mechanics.profiles(angle).forEach(({ total }, i) => {
		const E = mechanics.groups[i]!.modulus;
		sum.NN += E * total[0]!;
		sum.NM -= E * total[1]!;
		sum.NT += E * total[2]!;
		sum.MM += E * total[3]!;
		sum.MT -= E * total[4]!;
		sum.TT += E * total[5]!;
	});
	return withoutRounding(sum);
}

/** Couplings that symmetry makes zero are set to zero, so that a symmetric section bends straight. */
function withoutRounding({ NN, NM, NT, MM, MT, TT }: Stiffness): Stiffness {
	const clean = (value: number, a: number, b: number) =>
		Math.abs(value) < 1e-13 * Math.sqrt(a * b) ? 0 : value;
	return {
		NN,
		MM,
		TT,
		NM: clean(NM, NN, MM),
		NT: clean(NT, NN, TT),
		MT: clean(MT, MM, TT)
	};
}

export function elasticPath(
	mechanics: Mechanics,
	angle: number,
	transverse: Transverse,
	N: number
): ElasticPath {
	const k = elasticStiffness(mechanics, angle);
	if (transverse === 'curvature-zero') {
		const e0 = (curvature: number) => (N - k.NM * curvature) / k.NN;
		return { e0, turn: () => 0, moment: (c) => k.NM * e0(c) + k.MM * c };
	}
	const determinant = k.NN * k.TT - k.NT * k.NT;
	const e0 = (c: number) => ((N - k.NM * c) * k.TT + k.MT * c * k.NT) / determinant;
	const turn = (c: number) => (-k.MT * c * k.NN - (N - k.NM * c) * k.NT) / determinant + 0;
	return { e0, turn, moment: (c) => k.NM * e0(c) + k.MM * c + k.MT * turn(c) };
}

/** Largest strain of a plane over what each body bears elastically; 1 at first yield. */
export function elasticUse(
	mechanics: Mechanics,
	angle: number,
	e0: number,
	curvature: number,
	turn: number
): number {
	const size = turn === 0 ? curvature : Math.hypot(curvature, turn);
	const extents = bodyExtents(mechanics, angle, turn === 0 ? 0 : Math.atan2(turn, curvature));
	let use = -Infinity;
	mechanics.groups.forEach(({ law }, i) => {
		const { low, high } = extents[i]!;
		const tension = (e0 - size * low) / law.yieldTension;
		use = Math.max(use, tension, (size * high - e0) / law.yieldCompression);
	});
	return use;
}

function bodyExtents(mechanics: Mechanics, angle: number, turned: number) {
	if (turned === 0) return mechanics.profiles(angle);
	const frame = frameAt(mechanics.centroid, angle + turned);
	return mechanics.groups.map(({ loops }) => extentAcross(loops, frame));
}
