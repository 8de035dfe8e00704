import type { QuadraticMesh } from '../../geometry/mesh/quadratic-mesh';
import { atStations } from '../../geometry/mesh/stations';
import { factorisedStiffness } from '../../geometry/mesh/stiffness';
import { unknownsWithout } from './warping-function';

/**
 * Torsion constant from below by Prandtl's stress function φ: ∇²φ = −2, φ = 0 on the outer rim of
 * each piece and one unknown value on the rim of each hole; J = 2∫φ dA + 2 Σ φ_hole A_hole
 * (Timoshenko & Goodier, Theory of Elasticity, art. 104 and 115). Any such field gives no more than J.
 */
export function torsionBelow(
	mesh: QuadraticMesh,
	stiffness: Float64Array,
	order: Int32Array
): number {
	const { elements, rims } = mesh;
	const holes = rims.filter(({ area }) => area < 0);
	const onRims = new Set(rims.flatMap(({ nodes }) => nodes));
	const unknownOf = unknownsWithout(onRims, order);
	const free = order.length - onRims.size;
	holes.forEach(({ nodes }, k) => nodes.forEach((node) => (unknownOf[node] = free + k)));
	const right = new Float64Array(free + holes.length);
	for (let e = 0; e < elements.length / 6; e++)
		atStations(mesh, e, ({ weight, shape }) => {
			for (let k = 0; k < 6; k++) {
				const i = unknownOf[elements[6 * e + k]!]!;
				if (i >= 0) right[i]! += 2 * weight * shape[k]!;
			}
		});
	holes.forEach(({ area }, k) => (right[free + k]! -= 2 * area));
	if (right.length === 0) return 0;
	const solution = factorisedStiffness(mesh, stiffness, unknownOf, right.length).solved(right);
	return solution.reduce((sum, value, i) => sum + value * right[i]!, 0);
}
