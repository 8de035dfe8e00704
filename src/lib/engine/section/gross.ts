import type { Loop, Point } from '../geometry/boundary';
import { loopBounds } from '../geometry/bounds';
import { frameAt } from '../geometry/frame';
import { momentCount } from '../geometry/flank-moments';
import { regionMoments } from '../geometry/moments';
import { momentsBelow, profileOf, type Profile } from '../geometry/profile';
import { weightedLevel } from '../geometry/weighted-level';
import type { GrossProperties, Part } from './prepared';

/** What no integral over the area gives: perimeter (mm), torsion (mm⁴), warping (mm⁶), shear centre. */
export interface GrossExtra {
	perimeter: number;
	torsionConstant: number | null;
	warpingConstant: number | null;
	shearCentre: Point | null;
}

/**
 * Properties of the gross section by exact integration over its parts (units: mm and its powers,
 * mass kg/m, angle degrees). Plastic moduli are geometric: equal areas, whatever the grades.
 */
export function grossProperties(parts: readonly Part[], extra: GrossExtra): GrossProperties {
	const loops = parts.flatMap(({ region }) => region.loops);
	const centroid = areaCentroid(loops);
	const upright = profileOf(loops, frameAt(centroid, 0));
	const sideways = profileOf(loops, frameAt(centroid, Math.PI / 2));
	const [area, , , secondMomentY, product] = upright.total as unknown as number[];
	const secondMomentZ = sideways.total[3]!;
	const productYZ = withoutNoise(product!, secondMomentY! + secondMomentZ);
	return {
		area: area!,
		mass: massOf(parts, area!),
		centroid,
		secondMomentY: secondMomentY!,
		secondMomentZ,
		productYZ,
		...principalMoments(secondMomentY!, secondMomentZ, productYZ),
		elasticModulusYTop: secondMomentY! / upright.high,
		elasticModulusYBottom: secondMomentY! / -upright.low,
		// across, in the frame turned a quarter, points to the left
		elasticModulusZLeft: secondMomentZ / sideways.high,
		elasticModulusZRight: secondMomentZ / -sideways.low,
		radiusOfGyrationY: Math.sqrt(secondMomentY! / area!),
		radiusOfGyrationZ: Math.sqrt(secondMomentZ / area!),
		plasticModulusY: equalAreaModulus(upright),
		plasticModulusZ: equalAreaModulus(sideways),
		torsionConstant: extra.torsionConstant,
		warpingConstant: extra.warpingConstant,
		shearCentre: extra.shearCentre,
		perimeter: extra.perimeter,
		height: upright.high - upright.low,
		width: sideways.high - sideways.low
	};
}

/** Centroid of the area, integrated about the middle of the bounding box to keep all digits. */
export function areaCentroid(loops: readonly Loop[]): Point {
	const { left, right, bottom, top } = loopBounds(loops);
	const middle = { y: (left + right) / 2, z: (bottom + top) / 2 };
	const { area, firstY, firstZ } = regionMoments({ loops }, middle);
	const size = Math.hypot(right - left, top - bottom);
	const offset = (first: number) => withoutNoise(first / area, size);
	return { y: middle.y + offset(firstZ), z: middle.z + offset(firstY) };
}

/** Rounding that is left where symmetry makes a value zero is taken as zero. */
const withoutNoise = (value: number, scale: number): number =>
	Math.abs(value) < 1e-14 * scale ? 0 : value;

/** kg/m; where all parts weigh the same, the whole area counts at once. */
function massOf(parts: readonly Part[], area: number): number {
	const density = parts[0]!.material.density;
	if (parts.every(({ material }) => material.density === density)) return area * density * 1e-6;
	return parts.reduce((sum, part) => sum + partMass(part), 0);
}

function partMass({ region, material }: Part): number {
	const { left, right, bottom, top } = loopBounds(region.loops);
	const middle = { y: (left + right) / 2, z: (bottom + top) / 2 };
	return regionMoments(region, middle).area * material.density * 1e-6;
}

function principalMoments(Iy: number, Iz: number, Iyz: number) {
	const middle = (Iy + Iz) / 2;
	const half = (Iy - Iz) / 2;
	const radius = Math.hypot(half, Iyz);
	const round = radius < 1e-12 * middle;
	const angle = round ? 0 : (Math.atan2(-Iyz, half) / 2) * (180 / Math.PI);
	return {
		secondMomentU: middle + radius,
		secondMomentV: middle - radius,
		principalAngle: angle <= -90 ? angle + 180 : angle + 0
	};
}

/** ∫|across − c| dA about the level c that halves the area, mm³. */
function equalAreaModulus(profile: Profile): number {
	const [area, first] = profile.total as unknown as [number, number];
	const level = weightedLevel([profile], [1], area / 2);
	const below = new Float64Array(momentCount);
	momentsBelow(profile, level, below);
	return first - 2 * below[1]! + level * (2 * below[0]! - area);
}
