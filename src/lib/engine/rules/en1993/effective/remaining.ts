import type { GrossProperties } from '../../../section/prepared';
import type { Strip } from './strip';

/** Area, centroid and second moments about it of what counts; mm and its powers. */
export interface Remaining {
	readonly area: number;
	readonly y: number;
	readonly z: number;
	readonly secondY: number;
	readonly secondZ: number;
	readonly product: number;
}

/** The gross section less the strips that are taken out, exactly; without strips the gross figures themselves. */
export function remainingOf(gross: GrossProperties, strips: readonly Strip[]): Remaining {
	const { area, centroid, secondMomentY, secondMomentZ, productYZ } = gross;
	let [left, firstY, firstZ] = [area, 0, 0];
	let [secondY, secondZ, product] = [secondMomentY, secondMomentZ, productYZ];
	for (const strip of strips) {
		const [y, z] = [strip.middle.y - centroid.y, strip.middle.z - centroid.z];
		left -= strip.area;
		firstY -= strip.area * z;
		firstZ -= strip.area * y;
		secondY -= strip.ownY + strip.area * z * z;
		secondZ -= strip.ownZ + strip.area * y * y;
		product -= strip.ownProduct + strip.area * y * z;
	}
	const size = Math.sqrt((secondMomentY + secondMomentZ) / area);
	const shiftY = withoutNoise(firstZ / left, size);
	const shiftZ = withoutNoise(firstY / left, size);
	return {
		area: left,
		y: centroid.y + shiftY,
		z: centroid.z + shiftZ,
		secondY: secondY - left * shiftZ * shiftZ,
		secondZ: secondZ - left * shiftY * shiftY,
		product: withoutNoise(product - left * shiftY * shiftZ, secondMomentY + secondMomentZ)
	};
}

/** What symmetry makes zero is zero: rounding beside the scale is taken out. */
const withoutNoise = (value: number, scale: number): number =>
	Math.abs(value) < 1e-14 * scale ? 0 : value;
