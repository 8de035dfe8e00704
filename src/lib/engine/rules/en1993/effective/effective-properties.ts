import type { Point } from '../../../geometry/boundary';
import type { PreparedSection } from '../../../section/prepared';
import type { ElementWidth } from './element-width';
import type { Reduced } from './reduce';
import { farthestFibre } from './remaining-fibres';
import { stripCorners, type Strip } from './strip';

/** A part of a plate that does not count. */
export interface RemovedStrip {
	readonly part: string;
	readonly element: string;
	/** Along the plate from the definition's origin, mm: z of an upright plate, y of a level one, otherwise distance from the element's `from` end; `from` is the lesser. */
	readonly from: number;
	readonly to: number;
	/** Anticlockwise. */
	readonly corners: readonly Point[];
}

/** Effective width of a compressed element, EN 1993-1-5 Tables 4.1 and 4.2; mm. */
export interface EffectiveElement {
	readonly element: string;
	readonly part: string;
	readonly psi: number;
	readonly kSigma: number;
	/** λp */
	readonly slenderness: number;
	readonly rho: number;
	readonly width: number;
	/** bc; the whole width where all of it is compressed. */
	readonly compressedWidth: number;
	/** beff, of the compressed width. */
	readonly effective: number;
	/** be1 at the more compressed edge and be2; of an outstand [beff, 0], from its supported edge. */
	readonly edges: readonly [number, number];
}

/**
 * Properties of what counts, mm and its powers, about the effective centroid and axes parallel to y and
 * z. Moduli are I over the distance to the extreme fibre that remains.
 */
export interface EffectiveProperties {
	readonly area: number;
	readonly centroid: Point;
	readonly secondMomentY: number;
	readonly secondMomentZ: number;
	/** +∫(y−yc)(z−zc)dA */
	readonly productYZ: number;
	readonly elasticModulusYTop: number;
	readonly elasticModulusYBottom: number;
	readonly elasticModulusZLeft: number;
	readonly elasticModulusZRight: number;
	/** Effective minus gross: to the right and upwards positive. */
	readonly centroidShiftY: number;
	readonly centroidShiftZ: number;
	readonly removed: readonly RemovedStrip[];
	readonly elements: readonly EffectiveElement[];
}

export function effectiveProperties(
	section: PreparedSection,
	reduced: Reduced
): EffectiveProperties {
	const { remaining, strips, widths } = reduced;
	const { area, y, z, secondY, secondZ, product } = remaining;
	const { centroid } = section.gross;
	return {
		area,
		centroid: { y, z },
		secondMomentY: secondY,
		secondMomentZ: secondZ,
		productYZ: product,
		...moduli(section, reduced),
		centroidShiftY: y - centroid.y,
		centroidShiftZ: z - centroid.z,
		removed: strips.map(removedStrip),
		elements: widths.map(effectiveElement)
	};
}

function moduli({ gross, parts }: PreparedSection, { remaining, strips }: Reduced) {
	if (strips.length === 0)
		return {
			elasticModulusYTop: gross.elasticModulusYTop,
			elasticModulusYBottom: gross.elasticModulusYBottom,
			elasticModulusZLeft: gross.elasticModulusZLeft,
			elasticModulusZRight: gross.elasticModulusZRight
		};
	const { y, z, secondY, secondZ } = remaining;
	return {
		elasticModulusYTop: secondY / (farthestFibre(parts, strips, 0, 1) - z),
		elasticModulusYBottom: secondY / (farthestFibre(parts, strips, 0, -1) + z),
		elasticModulusZLeft: secondZ / (farthestFibre(parts, strips, -1, 0) + y),
		elasticModulusZRight: secondZ / (farthestFibre(parts, strips, 1, 0) - y)
	};
}

/** Directions closer to an axis than this are along it. */
const sameDirection = 1e-9;

function removedStrip(strip: Strip): RemovedStrip {
	const { element, along } = strip;
	const [from, to] = [strip.start, strip.end].map((distance) => {
		if (Math.abs(along.y) <= sameDirection) return element.from.z + along.z * distance;
		if (Math.abs(along.z) <= sameDirection) return element.from.y + along.y * distance;
		return distance;
	}) as [number, number];
	return {
		part: element.part,
		element: element.id,
		from: Math.min(from, to),
		to: Math.max(from, to),
		corners: stripCorners(strip)
	};
}

const effectiveElement = (width: ElementWidth): EffectiveElement => ({
	element: width.element.id,
	part: width.element.part,
	psi: width.psi,
	kSigma: width.kSigma,
	slenderness: width.slenderness,
	rho: width.rho,
	width: width.element.c,
	compressedWidth: width.compressedWidth,
	effective: width.effective,
	edges: width.edges
});
