import type { QuadraticMesh } from './quadratic-mesh';

/** A point of integration in an element: shape functions and their slopes there. */
export interface Station {
	/** Share of the area that it stands for; not above 0 where the element folds over. */
	weight: number;
	y: number;
	z: number;
	readonly shape: Float64Array;
	readonly slopeY: Float64Array;
	readonly slopeZ: Float64Array;
}

/**
 * Six-point rule for triangles, exact to the fourth degree (Strang & Fix, An Analysis of the Finite
 * Element Method, table 4.1): barycentric coordinate of the two like corners, and weight.
 */
const rule = [
	[0.445948490915965, 0.223381589678011],
	[0.091576213509771, 0.109951743655322]
] as const;

const places = rule.flatMap(([a, weight]) => [
	{ b: a, c: a, weight },
	{ b: 1 - 2 * a, c: a, weight },
	{ b: a, c: 1 - 2 * a, weight }
]);

/** Shape functions of the six-node triangle, and their derivatives by b and c, at each place. */
const shapes = places.map(({ b, c, weight }) => {
	const a = 1 - b - c;
	return {
		weight,
		shape: [a * (2 * a - 1), b * (2 * b - 1), c * (2 * c - 1), 4 * a * b, 4 * b * c, 4 * c * a],
		byB: [1 - 4 * a, 4 * b - 1, 0, 4 * (a - b), 4 * c, -4 * c],
		byC: [1 - 4 * a, 0, 4 * c - 1, -4 * b, 4 * b, 4 * (a - c)]
	};
});

const station: Station = {
	weight: 0,
	y: 0,
	z: 0,
	shape: new Float64Array(6),
	slopeY: new Float64Array(6),
	slopeZ: new Float64Array(6)
};

/** Calls `visit` at each point of integration of element `e`; the station is the same object each time. */
export function atStations(
	{ y, z, elements }: QuadraticMesh,
	e: number,
	visit: (station: Station) => void
): void {
	for (const { weight, shape, byB, byC } of shapes) {
		let [yb, yc, zb, zc] = [0, 0, 0, 0];
		station.y = station.z = 0;
		for (let k = 0; k < 6; k++) {
			const [py, pz] = [y[elements[6 * e + k]!]!, z[elements[6 * e + k]!]!];
			station.y += shape[k]! * py;
			station.z += shape[k]! * pz;
			yb += byB[k]! * py;
			yc += byC[k]! * py;
			zb += byB[k]! * pz;
			zc += byC[k]! * pz;
		}
		const twice = yb * zc - yc * zb;
		for (let k = 0; k < 6; k++) {
			station.shape[k] = shape[k]!;
			station.slopeY[k] = (byB[k]! * zc - byC[k]! * zb) / twice;
			station.slopeZ[k] = (byC[k]! * yb - byB[k]! * yc) / twice;
		}
		station.weight = (weight * twice) / 2;
		visit(station);
	}
}
