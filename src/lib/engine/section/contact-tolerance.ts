import type { Point } from '../geometry/boundary';
import { contact, coordinateRounding } from '../tolerances';

/** How far apart edges may be, mm, and still touch: relative to size and thickness, and never less than the coordinates' own rounding. */
export function contactTolerance(points: readonly Point[], thickness: number): number {
	const { size, reach } = sizeAndReach(points);
	const share = Math.min(contact.ofSize * size, contact.ofThickness * thickness);
	return share + coordinateRounding * reach;
}

/** Width, height, least side and diagonal of the bounding box, and furthest coordinate, mm. */
export function sizeAndReach(points: readonly Point[]) {
	const box = { left: Infinity, right: -Infinity, low: Infinity, high: -Infinity };
	for (const { y, z } of points) {
		box.left = Math.min(box.left, y);
		box.right = Math.max(box.right, y);
		box.low = Math.min(box.low, z);
		box.high = Math.max(box.high, z);
	}
	const ends = [box.left, box.right, box.low, box.high].map(Math.abs);
	return {
		width: box.right - box.left,
		height: box.high - box.low,
		least: Math.min(box.right - box.left, box.high - box.low),
		size: Math.hypot(box.right - box.left, box.high - box.low),
		reach: Math.max(...ends)
	};
}
