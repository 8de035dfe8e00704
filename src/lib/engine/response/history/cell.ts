import type { Edge } from '../../geometry/boundary';
import { extentAcross, loopBounds } from '../../geometry/bounds';
import { flanksOf } from '../../geometry/flank';
import { momentCount, type Moments } from '../../geometry/flank-moments';
import { addMomentsBelow } from '../../geometry/flank-sums';
import { frameAt, type Frame } from '../../geometry/frame';
import type { Bounds } from '../../section/prepared';
import type { LinearField } from './linear-field';

/**
 * A piece of one part in which the plastic strain of every layer of its law is linear. Coordinates
 * from the gross centroid, mm; edges in any order, steel to their left.
 */
export interface Cell {
	/** Index of its part in the section. */
	readonly part: number;
	readonly edges: readonly Edge[];
	/** About the gross centroid: area, ∫z, ∫y, ∫z², ∫yz, ∫y². */
	readonly moments: Moments;
	readonly box: Bounds;
	/** Plastic strain, one a layer. */
	readonly plastic: readonly LinearField[];
}

const origin = { y: 0, z: 0 };
const upright = frameAt(origin, 0);

/** The cell that edges bound; null when they hold no steel. */
export function cellOf(
	part: number,
	edges: readonly Edge[],
	plastic: readonly LinearField[]
): Cell | null {
	const moments = new Float64Array(momentCount);
	addMomentsBelow(moments, flanksOf([edges], upright), Infinity);
	if (!(moments[0]! > 0)) return null;
	return { part, edges, moments, box: loopBounds([edges]), plastic };
}

/** Frame whose `across` runs down the steepest fall of a field: field = c − size·across. */
export function fallOf({ y, z }: LinearField): { frame: Frame; size: number } {
	const size = Math.hypot(y, z);
	if (size === 0) return { frame: upright, size };
	return { frame: { origin, cos: -z / size + 0, sin: y / size }, size };
}

export interface Spread {
	readonly least: number;
	readonly most: number;
}

/** Bounds of a field over the box of a cell: cheap, and never narrower than the cell's own. */
export function boxSpread({ left, right, bottom, top }: Bounds, { c, y, z }: LinearField): Spread {
	const [y1, y2, z1, z2] = [y * left, y * right, z * bottom, z * top];
	return {
		least: c + Math.min(y1, y2) + Math.min(z1, z2),
		most: c + Math.max(y1, y2) + Math.max(z1, z2)
	};
}

/** Least and greatest value of a field over a cell. */
export function spreadOver({ edges }: Cell, field: LinearField): Spread {
	const { frame, size } = fallOf(field);
	if (size === 0) return { least: field.c, most: field.c };
	const { low, high } = extentAcross([edges], frame);
	return { least: field.c - size * high, most: field.c - size * low };
}
