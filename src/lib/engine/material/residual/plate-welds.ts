import type { Point } from '../../geometry/boundary';
import { contactTolerance } from '../../section/contact-tolerance';
import type { Plate, PlatesSection } from '../../section/definition';
import type { WeldedPlate } from './welded';

/** A plate with its width and thickness directions as unit vectors. */
interface Placed {
	readonly plate: Plate;
	readonly u: Point;
	readonly v: Point;
	readonly corners: readonly Point[];
}

/**
 * Where free plates are welded: at the ends of their width that touch another plate, and where another
 * plate's end stands on them. A sentence where plates lie flat on each other or where the welds of a
 * plate do not lie evenly about its middle: no published pattern then balances it.
 */
export function plateWelds(
	{ plates, joins }: PlatesSection,
	centroid: Point
): readonly WeldedPlate[] | string {
	const placed = plates.map(placedPlate);
	const thinnest = Math.min(...plates.map(({ width, thickness }) => Math.min(width, thickness)));
	const tolerance = contactTolerance(
		placed.flatMap(({ corners }) => corners),
		thinnest
	);
	const found: WeldedPlate[] = [];
	for (const own of placed) {
		const welds: number[] = [];
		for (const other of placed) {
			if (other === own || !isJoined(joins, own.plate.name, other.plate.name)) continue;
			const weld = weldOn(own, other, tolerance);
			if (weld === 'lapped') return lapped(own.plate, other.plate);
			if (weld !== null) welds.push(weld);
		}
		const even = evenWelds(welds, own.plate.width);
		if (!even) return uneven(own.plate);
		found.push(aboutCentroid(own, even, centroid));
	}
	return found;
}

const lapped = (a: Plate, b: Plate) =>
	`Plates “${a.name}” and “${b.name}” lie flat on each other: no published residual stresses cover that.`;

const uneven = ({ name }: Plate) =>
	`The welds of plate “${name}” do not lie evenly about its middle: no published residual stresses balance it.`;

function placedPlate(plate: Plate): Placed {
	const angle = (plate.angle * Math.PI) / 180;
	const u = { y: Math.cos(angle), z: Math.sin(angle) };
	const v = { y: -u.z, z: u.y };
	const at = (a: number, b: number): Point => ({
		y: plate.y + (a * plate.width * u.y + b * plate.thickness * v.y) / 2,
		z: plate.z + (a * plate.width * u.z + b * plate.thickness * v.z) / 2
	});
	return { plate, u, v, corners: [at(-1, -1), at(1, -1), at(1, 1), at(-1, 1)] };
}

const isJoined = (joins: PlatesSection['joins'], a: string, b: string): boolean =>
	!joins || joins.some((join) => (join.a === a && join.b === b) || (join.a === b && join.b === a));

/** Place of a point in the width and thickness of a plate, mm from its middle. */
function placeIn({ plate, u, v }: Placed, { y, z }: Point) {
	const [dy, dz] = [y - plate.y, z - plate.z];
	return { along: dy * u.y + dz * u.z, through: dy * v.y + dz * v.z };
}

function isIn(own: Placed, point: Point, tolerance: number): boolean {
	const { along, through } = placeIn(own, point);
	const { width, thickness } = own.plate;
	return Math.abs(along) <= width / 2 + tolerance && Math.abs(through) <= thickness / 2 + tolerance;
}

/** Where another plate is welded to this one along its width; null where they do not touch. */
function weldOn(own: Placed, other: Placed, tolerance: number): number | 'lapped' | null {
	const touching = [
		...other.corners.filter((corner) => isIn(own, corner, tolerance)),
		...own.corners.filter((corner) => isIn(other, corner, tolerance))
	];
	if (touching.length === 0) return null;
	const places = touching.map((point) => placeIn(own, point).along);
	const [low, high] = [Math.min(...places), Math.max(...places)];
	const thicker = Math.max(own.plate.thickness, other.plate.thickness);
	if (high - low > 1.5 * thicker + tolerance) return 'lapped';
	const half = own.plate.width / 2;
	if (low >= half - tolerance) return half;
	if (high <= -half + tolerance) return -half;
	return (low + high) / 2;
}

/** The different weld lines of a plate in order; null when they do not mirror each other about the middle. */
function evenWelds(welds: readonly number[], width: number): number[] | null {
	const same = 1e-6 * width;
	const lines = [...welds]
		.sort((a, b) => a - b)
		.filter((weld, i, all) => i === 0 || weld - all[i - 1]! > same);
	const mirrored = lines.every((weld, i) => Math.abs(weld + lines.at(-1 - i)!) <= same);
	return mirrored ? lines : null;
}

function aboutCentroid(
	{ plate, u }: Placed,
	welds: readonly number[],
	{ y, z }: Point
): WeldedPlate {
	const middle = (plate.y - y) * u.y + (plate.z - z) * u.z;
	return {
		angle: (plate.angle * Math.PI) / 180,
		from: middle - plate.width / 2,
		to: middle + plate.width / 2,
		welds: welds.map((weld) => middle + weld)
	};
}
