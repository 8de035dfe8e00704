import type { Point } from '../../../geometry/boundary';
import type { PlateElement } from '../elements/element';

/** A rectangle taken out of an element: along its mid-line, at its thickness. mm and its powers. */
export interface Strip {
	readonly element: PlateElement;
	/** Distances from the element's `from` end. */
	readonly start: number;
	readonly end: number;
	readonly middle: Point;
	/** Unit vector from the element's `from` to its `to`. */
	readonly along: Point;
	readonly area: number;
	/** ∫z², ∫y², ∫yz about its own middle. */
	readonly ownY: number;
	readonly ownZ: number;
	readonly ownProduct: number;
}

export function stripOf(element: PlateElement, start: number, end: number): Strip {
	const { from, to, c, t } = element;
	const along = { y: (to.y - from.y) / c, z: (to.z - from.z) / c };
	const length = end - start;
	const half = (start + end) / 2;
	const area = length * t;
	const [l2, t2] = [(area * length * length) / 12, (area * t * t) / 12];
	return {
		element,
		start,
		end,
		middle: { y: from.y + along.y * half, z: from.z + along.z * half },
		along,
		area,
		ownY: l2 * along.z * along.z + t2 * along.y * along.y,
		ownZ: l2 * along.y * along.y + t2 * along.z * along.z,
		ownProduct: (l2 - t2) * along.y * along.z
	};
}

/** Corners in order, anticlockwise: two at the start of the strip, two at its end. */
export function stripCorners({ element, start, end, along }: Strip): Point[] {
	const { from, t } = element;
	const at = (distance: number, side: number): Point => ({
		y: from.y + along.y * distance - (side * along.z * t) / 2,
		z: from.z + along.z * distance + (side * along.y * t) / 2
	});
	return [at(start, 1), at(start, -1), at(end, -1), at(end, 1)];
}

/** Rounding of corners against the strip that ends at them, as a share of the thickness. */
const onEdge = 1e-6;

/** Whether a point lies in a strip or on its edge. */
export function inStrip({ element, start, end, along }: Strip, { y, z }: Point): boolean {
	const { from, t } = element;
	const [dy, dz] = [y - from.y, z - from.z];
	const distance = dy * along.y + dz * along.z;
	const slack = onEdge * t;
	if (distance < start - slack || distance > end + slack) return false;
	return Math.abs(dz * along.y - dy * along.z) <= t / 2 + slack;
}
