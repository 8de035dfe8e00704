import { elasticStiffness } from './elastic-path';
import type { InteractionPlane } from './interaction';
import { fibresOf, fibreUse, strainAt, type BodyFibres, type Plane } from './interaction-fibres';
import { convexCorners } from './interaction-corners';
import type { ConvexCurve, PlanePoint } from './interaction-spread';
import type { Mechanics } from './law-groups';
import { furthestForce } from './interaction-reach';

/** The elastic section: what it strains under forces about the gross centroid, and its fibres. */
export interface ElasticSection {
	readonly bodies: readonly BodyFibres[];
	/** Strains under N (newton), My and Mz (N·mm). */
	planeOf(N: number, My: number, Mz: number): Plane;
}

export function elasticSection(mechanics: Mechanics): ElasticSection {
	const { NN, NM, NT, MM, MT, TT } = elasticStiffness(mechanics, 0);
	const minors = {
		NN: MM * TT - MT * MT,
		NM: NT * MT - NM * TT,
		NT: NM * MT - NT * MM,
		MM: NN * TT - NT * NT,
		MT: NM * NT - NN * MT,
		TT: NN * MM - NM * NM
	};
	const determinant = NN * minors.NN + NM * minors.NM + NT * minors.NT;
	return {
		bodies: fibresOf(mechanics),
		planeOf: (N, My, Mz) => ({
			e0: (minors.NN * N + minors.NM * My + minors.NT * Mz) / determinant,
			ky: (minors.NM * N + minors.MM * My + minors.MT * Mz) / determinant,
			kz: (minors.NT * N + minors.MT * My + minors.TT * Mz) / determinant
		})
	};
}

/** A plane through the space of forces: the strains of its origin and of one unit along each axis. */
interface Slice {
	readonly bodies: readonly BodyFibres[];
	readonly origin: Plane;
	readonly a: Plane;
	readonly b: Plane;
}

/**
 * The first-yield curve of a plane: where the most strained fibre just reaches its own yield strain
 * while the section is elastic. A polygon with one side a fibre where the outline has straight edges
 * only; all its corners are among the starting points. `N` in newton, for My–Mz; null outside.
 */
export function firstYieldCurve(
	mechanics: Mechanics,
	plane: InteractionPlane,
	N: number
): ConvexCurve | null {
	const elastic = elasticSection(mechanics);
	const inside = plane === 'My-Mz' ? insideAt(elastic, mechanics, N) : { a: 0, b: 0 };
	if (inside === null) return null;
	const slice = sliceOf(elastic, plane, N, inside);
	const { squash, reach } = mechanics;
	const units = { a: plane === 'My-Mz' ? squash * reach : squash, b: squash * reach };
	const cast = (a: number, b: number): PlanePoint => {
		const factor = castRay(slice, a, b);
		return { a: inside.a + factor * a, b: inside.b + factor * b };
	};
	return {
		start: directionsOf(slice, units).map(({ a, b }) => cast(a, b)),
		between: (from, to) => cast((from.a + to.a) / 2 - inside.a, (from.b + to.b) / 2 - inside.b)
	};
}

function sliceOf(
	{ bodies, planeOf }: ElasticSection,
	plane: InteractionPlane,
	N: number,
	inside: PlanePoint
): Slice {
	const axes = { N: planeOf(1, 0, 0), My: planeOf(0, 1, 0), Mz: planeOf(0, 0, 1) };
	switch (plane) {
		case 'N-My':
			return { bodies, origin: noStrain, a: axes.N, b: axes.My };
		case 'N-Mz':
			return { bodies, origin: noStrain, a: axes.N, b: axes.Mz };
		case 'My-Mz':
			return { bodies, origin: planeOf(N, inside.a, inside.b), a: axes.My, b: axes.Mz };
	}
}

const noStrain: Plane = { e0: 0, ky: 0, kz: 0 };

/** Moments with which N is borne elastically: none where that will do. */
function insideAt(elastic: ElasticSection, mechanics: Mechanics, N: number): PlanePoint | null {
	const alone = elastic.planeOf(N, 0, 0);
	if (fibreUse(elastic.bodies, alone, noStrain).use < 1) return { a: 0, b: 0 };
	const furthest = furthestForce(elastic, mechanics, Math.sign(N));
	if (!(Math.abs(N) < Math.abs(furthest.N))) return null;
	const share = N / furthest.N;
	return { a: share * furthest.My, b: share * furthest.Mz };
}

/** Directions to the corners and along both axes, anticlockwise. */
function directionsOf(slice: Slice, units: PlanePoint): PlanePoint[] {
	const axes = [
		{ a: units.a, b: 0 },
		{ a: 0, b: units.b },
		{ a: -units.a, b: 0 },
		{ a: 0, b: -units.b }
	];
	const sides = slice.bodies.flatMap(({ corners, tension, compression }) =>
		corners.flatMap((corner) =>
			[tension, -compression].map((bears) => {
				const left = 1 - strainAt(slice.origin, corner) / bears;
				return {
					a: ((strainAt(slice.a, corner) / bears) * units.a) / left,
					b: ((strainAt(slice.b, corner) / bears) * units.b) / left
				};
			})
		)
	);
	const corners = convexCorners(sides).map(({ a, b }) => ({ a: a * units.a, b: b * units.b }));
	const angle = ({ a, b }: PlanePoint) => Math.atan2(b / units.b, a / units.a);
	const ordered = [...axes, ...corners].sort((p, q) => angle(p) - angle(q));
	return ordered.filter((p, i) => i === 0 || angle(p) - angle(ordered[i - 1]!) > 1e-9);
}

/** Multiple of a direction at which a fibre first yields: Newton from outside on a convex use. */
function castRay({ bodies, origin, a, b }: Slice, da: number, db: number): number {
	const ray = sumOf(noStrain, a, da, b, db);
	const own = fibreUse(bodies, ray, ray).use;
	const back = origin === noStrain ? 0 : fibreUse(bodies, sumOf(noStrain, origin, -1), ray).use;
	let factor = (1 + back) / own;
	for (let i = 0; i < 60; i++) {
		const { use, rate } = fibreUse(bodies, sumOf(origin, ray, factor), ray);
		const next = factor - (use - 1) / rate;
		if (!(next < factor)) return factor;
		factor = next;
	}
	return factor;
}

const sumOf = (origin: Plane, a: Plane, da: number, b: Plane = noStrain, db = 0): Plane => ({
	e0: origin.e0 + da * a.e0 + db * b.e0,
	ky: origin.ky + da * a.ky + db * b.ky,
	kz: origin.kz + da * a.kz + db * b.kz
});
