import { regionMoments, type AreaMoments } from '../geometry/moments';
import type { PreparedSection } from '../section/prepared';
import type { WorkingInput } from './working';

/** Area figures of one part about its own centroid, mm and its powers. */
export interface PartArea {
	readonly name: string;
	readonly area: number;
	readonly y: number;
	readonly z: number;
	readonly secondY: number;
	readonly secondZ: number;
	readonly product: number;
	readonly fy: number;
	readonly fyc: number;
	readonly density: number;
}

/** Every part about its own centroid, measured about the section's to keep all digits. */
export function partAreas({ parts, gross: { centroid } }: PreparedSection): PartArea[] {
	return parts.map(({ name, region, material: { fy, fyc, density } }) => {
		const about = regionMoments(region, centroid);
		return { name, ...own(about, centroid), fy, fyc, density };
	});
}

function own(m: AreaMoments, centroid: { y: number; z: number }) {
	const [y, z] = [m.firstZ / m.area, m.firstY / m.area];
	return {
		area: m.area,
		y: centroid.y + y,
		z: centroid.z + z,
		secondY: m.secondY - m.area * z * z,
		secondZ: m.secondZ - m.area * y * y,
		product: m.product - m.area * y * z
	};
}

/** `A_1`, `A_2` … with the part's name as source. */
export const partInputs = (
	parts: readonly PartArea[],
	symbol: string,
	unit: string,
	value: (part: PartArea) => number
): WorkingInput[] =>
	parts.map((part, i) => ({
		symbol: `${symbol}_${i + 1}`,
		value: value(part),
		unit,
		from: part.name
	}));

/** Terms of all parts joined by plus signs. */
export const partSum = (parts: readonly PartArea[], term: (place: number) => string): string =>
	parts.map((_, i) => term(i + 1)).join(' + ');
