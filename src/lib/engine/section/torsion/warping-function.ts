import type { QuadraticMesh } from '../../geometry/mesh/quadratic-mesh';
import { atStations } from '../../geometry/mesh/stations';
import { factorisedStiffness } from '../../geometry/mesh/stiffness';

/**
 * Saint-Venant's warping function ω at the nodes, for twist about the origin: Laplace's equation with
 * ∂ω/∂n = z·n_y − y·n_z on every rim (Timoshenko & Goodier, Theory of Elasticity, art. 104), so that
 * holes need no condition of their own. One node of each piece is held at 0.
 */
export function warpingFunction(
	mesh: QuadraticMesh,
	stiffness: Float64Array,
	order: Int32Array
): Float64Array {
	const { elements, pieceOf, pieces } = mesh;
	const held = new Set<number>();
	for (let piece = 0; piece < pieces; piece++) held.add(elements[6 * pieceOf.indexOf(piece)]!);
	const unknownOf = unknownsWithout(held, order);
	const unknowns = order.length - held.size;
	const right = new Float64Array(unknowns);
	for (let e = 0; e < pieceOf.length; e++)
		atStations(mesh, e, ({ weight, y, z, slopeY, slopeZ }) => {
			for (let k = 0; k < 6; k++) {
				const i = unknownOf[elements[6 * e + k]!]!;
				if (i >= 0) right[i]! += weight * (z * slopeY[k]! - y * slopeZ[k]!);
			}
		});
	const solution = factorisedStiffness(mesh, stiffness, unknownOf, unknowns).solved(right);
	return Float64Array.from(unknownOf, (i) => (i < 0 ? 0 : solution[i]!));
}

/** Unknowns in the given order, −1 for those that are held. */
export function unknownsWithout(held: ReadonlySet<number>, order: Int32Array): Int32Array {
	const byPosition = new Int32Array(order.length);
	order.forEach((position, node) => (byPosition[position] = node));
	const unknownOf = new Int32Array(order.length).fill(-1);
	let next = 0;
	for (const node of byPosition) if (!held.has(node)) unknownOf[node] = next++;
	return unknownOf;
}

/** What the warping function gives, in the mesh's own lengths. */
export interface WarpingFigures {
	/** Torsion constant from above: no other field gives less energy. */
	readonly torsionAbove: number;
	readonly warpingConstant: number;
	readonly shearCentre: { readonly y: number; readonly z: number };
}

/**
 * Torsion constant ∫(∂ω/∂y − z)² + (∂ω/∂z + y)² dA; shear centre by Trefftz's rule (Poisson's ratio
 * 0): the point about which the warping has no moment, ∫ω_s y dA = ∫ω_s z dA = 0, with
 * ω_s = ω + y_s z − z_s y + constant; warping constant ∫ω_s² dA.
 */
export function warpingFigures(mesh: QuadraticMesh, warping: Float64Array): WarpingFigures {
	const sums = new Sums(mesh, warping);
	const { y: cy, z: cz, w: cw } = sums.means();
	const { yy, yz, zz, yw, zw } = sums.moments(cy, cz, cw);
	const root = yy * zz - yz * yz;
	const shearCentre = { y: (yz * yw - yy * zw) / root, z: (zz * yw - yz * zw) / root };
	let warpingConstant = 0;
	sums.each((weight, y, z, w) => {
		const about = w - cw + shearCentre.y * (z - cz) - shearCentre.z * (y - cy);
		warpingConstant += weight * about * about;
	});
	return { torsionAbove: sums.torsionAbove(), warpingConstant, shearCentre };
}

/** Integrals over the mesh with the warping function. */
class Sums {
	constructor(
		private readonly mesh: QuadraticMesh,
		private readonly warping: Float64Array
	) {}

	each(visit: (weight: number, y: number, z: number, w: number) => void): void {
		const { elements } = this.mesh;
		for (let e = 0; e < elements.length / 6; e++)
			atStations(this.mesh, e, ({ weight, y, z, shape }) => {
				let w = 0;
				for (let k = 0; k < 6; k++) w += shape[k]! * this.warping[elements[6 * e + k]!]!;
				visit(weight, y, z, w);
			});
	}

	means() {
		const sum = { area: 0, y: 0, z: 0, w: 0 };
		this.each((weight, y, z, w) => {
			sum.area += weight;
			sum.y += weight * y;
			sum.z += weight * z;
			sum.w += weight * w;
		});
		return { y: sum.y / sum.area, z: sum.z / sum.area, w: sum.w / sum.area };
	}

	moments(cy: number, cz: number, cw: number) {
		const sum = { yy: 0, yz: 0, zz: 0, yw: 0, zw: 0 };
		this.each((weight, py, pz, pw) => {
			const [y, z, w] = [py - cy, pz - cz, pw - cw];
			sum.yy += weight * y * y;
			sum.yz += weight * y * z;
			sum.zz += weight * z * z;
			sum.yw += weight * y * w;
			sum.zw += weight * z * w;
		});
		return sum;
	}

	torsionAbove(): number {
		const { elements } = this.mesh;
		let total = 0;
		for (let e = 0; e < elements.length / 6; e++)
			atStations(this.mesh, e, ({ weight, y, z, slopeY, slopeZ }) => {
				let [byY, byZ] = [-z, y];
				for (let k = 0; k < 6; k++) {
					const w = this.warping[elements[6 * e + k]!]!;
					byY += w * slopeY[k]!;
					byZ += w * slopeZ[k]!;
				}
				total += weight * (byY * byY + byZ * byZ);
			});
		return total;
	}
}
