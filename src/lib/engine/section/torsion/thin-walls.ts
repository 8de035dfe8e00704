import type { Point } from '../../geometry/boundary';
import { ProfileMatrix } from '../../geometry/mesh/profile-matrix';
import { connectedPieces } from '../../geometry/pieces';
import type { TorsionFigures } from '../shape';
import type { MidLines, Wall } from './mid-lines';

/** A wall with its ends measured from one point, mm, and the warping at them. */
interface WarpedWall extends Wall {
	readonly a: Point;
	readonly b: Point;
	readonly length: number;
	readonly wa: number;
	readonly wb: number;
}

/** Walls whose second moments are this close to those of one straight line have no shear centre by mid-lines. */
const straight = 1e-9;

/**
 * Torsion by thin walls (Vlasov, Thin-Walled Elastic Beams; Bredt 1896 for cells): the warping of the
 * mid-lines is that of least shear energy Σ(t/L)(ω_b − ω_a + y_a z_b − z_a y_b)², which leaves open walls
 * without shear and gives cells Bredt's flows, however many they share. `torsionConstant` is the cells'
 * part alone (mm⁴), 0 for open profiles; warping constant (mm⁶) with the walls' own warping across their
 * thickness, Σt³/12∫s² ds from the foot of the shear centre (Goodier). Shear centre and warping constant are
 * null for pieces apart and for walls all in one line.
 */
export function thinWalls(lines: MidLines): TorsionFigures {
	const origin = lines.nodes[0]!;
	const nodes = lines.nodes.map(({ y, z }) => ({ y: y - origin.y, z: z - origin.z }));
	const pieces = connectedPieces(
		nodes.length,
		lines.walls.map(({ from, to }) => [from, to] as const)
	);
	const warping = leastShear(nodes, lines.walls, new Set(pieces.map((piece) => piece[0]!)));
	const walls = lines.walls.map((wall) => warpedWall(nodes, wall, warping));
	const cells = walls.reduce((sum, { thickness, length, a, b, wa, wb }) => {
		const slip = wb - wa + a.y * b.z - a.z * b.y;
		return sum + (thickness / length) * slip * slip;
	}, 0);
	const about = pieces.length === 1 ? aboutShearCentre(walls) : null;
	return {
		torsionConstant: cells,
		warpingConstant: about?.warpingConstant ?? null,
		shearCentre: about && {
			y: origin.y + about.shearCentre.y,
			z: origin.z + about.shearCentre.z
		}
	};
}

function warpedWall(nodes: readonly Point[], wall: Wall, warping: Float64Array): WarpedWall {
	const [a, b] = [nodes[wall.from]!, nodes[wall.to]!];
	const length = Math.hypot(b.y - a.y, b.z - a.z);
	const { from, to, thickness } = wall;
	return { from, to, thickness, a, b, length, wa: warping[from]!, wb: warping[to]! };
}

function leastShear(
	nodes: readonly Point[],
	walls: readonly Wall[],
	held: ReadonlySet<number>
): Float64Array {
	const matrix = new ProfileMatrix(new Int32Array(nodes.length));
	const right = new Float64Array(nodes.length);
	for (const { from, to, thickness } of walls) {
		const [a, b] = [nodes[from]!, nodes[to]!];
		const stiff = thickness / Math.hypot(b.y - a.y, b.z - a.z);
		const twist = stiff * (a.y * b.z - a.z * b.y);
		for (const node of [from, to]) if (!held.has(node)) matrix.add(node, node, stiff);
		if (!held.has(from) && !held.has(to)) matrix.add(from, to, -stiff);
		if (!held.has(from)) right[from]! += twist;
		if (!held.has(to)) right[to]! -= twist;
	}
	for (const node of held) matrix.add(node, node, 1);
	matrix.factorise();
	return matrix.solved(right);
}

/** ∫f g t ds of two functions linear along a wall. */
const integral = (
	{ thickness, length }: WarpedWall,
	[fa, fb]: readonly [number, number],
	[ga, gb]: readonly [number, number]
): number => ((thickness * length) / 6) * (2 * fa * ga + fa * gb + fb * ga + 2 * fb * gb);

/** Shear centre: ∫ω y t ds and ∫ω z t ds vanish about it; see warping-function.ts for the same rule over an area. */
function aboutShearCentre(walls: readonly WarpedWall[]) {
	const total = (f: (wall: WarpedWall) => readonly [number, number], g = f) =>
		walls.reduce((sum, wall) => sum + integral(wall, f(wall), g(wall)), 0);
	const one = () => [1, 1] as const;
	const area = total(one);
	const mean = (f: (wall: WarpedWall) => readonly [number, number]) => total(f, one) / area;
	const cy = mean(({ a, b }) => [a.y, b.y]);
	const cz = mean(({ a, b }) => [a.z, b.z]);
	const cw = mean(({ wa, wb }) => [wa, wb]);
	const y = ({ a, b }: WarpedWall) => [a.y - cy, b.y - cy] as const;
	const z = ({ a, b }: WarpedWall) => [a.z - cz, b.z - cz] as const;
	const w = ({ wa, wb }: WarpedWall) => [wa - cw, wb - cw] as const;
	const [yy, yz, zz, yw, zw] = [total(y), total(y, z), total(z), total(y, w), total(z, w)];
	const root = yy * zz - yz * yz;
	if (root < straight * (yy + zz) ** 2) return null;
	const [sy, sz] = [(yz * yw - yy * zw) / root, (zz * yw - yz * zw) / root];
	const shearCentre = { y: sy, z: sz };
	const primary = total((wall) => {
		const [[ya, yb], [za, zb], [wa, wb]] = [y(wall), z(wall), w(wall)];
		return [wa + sy * za - sz * ya, wb + sy * zb - sz * yb];
	});
	const across = walls.reduce((sum, wall) => sum + acrossThickness(wall, shearCentre), 0);
	return { shearCentre, warpingConstant: primary + across };
}

/** t³/12∫s² ds along a wall, s from the foot of the shear centre. */
function acrossThickness({ a, b, length, thickness }: WarpedWall, centre: Point): number {
	const from = ((a.y - centre.y) * (b.y - a.y) + (a.z - centre.z) * (b.z - a.z)) / length;
	return ((thickness ** 3 / 12) * ((from + length) ** 3 - from ** 3)) / 3;
}
