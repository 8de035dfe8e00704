import { ProfileMatrix } from './profile-matrix';
import type { QuadraticMesh } from './quadratic-mesh';
import { atStations } from './stations';

/** ∫∇Nᵢ·∇Nⱼ dA of every element, 36 numbers each; null when an element folds over. */
export function elementStiffness(mesh: QuadraticMesh): Float64Array | null {
	const count = mesh.elements.length / 6;
	const all = new Float64Array(36 * count);
	let sound = true;
	for (let e = 0; e < count; e++)
		atStations(mesh, e, ({ weight, slopeY, slopeZ }) => {
			if (!(weight > 0)) sound = false;
			for (let i = 0; i < 6; i++)
				for (let j = 0; j < 6; j++)
					all[36 * e + 6 * i + j]! += weight * (slopeY[i]! * slopeY[j]! + slopeZ[i]! * slopeZ[j]!);
		});
	return sound ? all : null;
}

/** The whole matrix, factorised; `unknownOf` gives each node's unknown, −1 where its value is 0. */
export function factorisedStiffness(
	{ elements }: QuadraticMesh,
	stiffness: Float64Array,
	unknownOf: Int32Array,
	unknowns: number
): ProfileMatrix {
	const first = Int32Array.from({ length: unknowns }, (_, i) => i);
	eachPair(elements, unknownOf, (i, j) => {
		if (j < first[i]!) first[i] = j;
	});
	const matrix = new ProfileMatrix(first);
	eachPair(elements, unknownOf, (i, j, at) => {
		if (j <= i) matrix.add(i, j, stiffness[at]!);
	});
	matrix.factorise();
	return matrix;
}

function eachPair(
	elements: Int32Array,
	unknownOf: Int32Array,
	visit: (i: number, j: number, at: number) => void
): void {
	for (let e = 0; e < elements.length / 6; e++)
		for (let a = 0; a < 6; a++) {
			const i = unknownOf[elements[6 * e + a]!]!;
			if (i < 0) continue;
			for (let b = 0; b < 6; b++) {
				const j = unknownOf[elements[6 * e + b]!]!;
				if (j >= 0) visit(i, j, 36 * e + 6 * a + b);
			}
		}
}
