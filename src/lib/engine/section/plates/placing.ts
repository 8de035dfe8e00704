import { cornersOf, plateGap, type TurnedRectangle } from '../../geometry/plate-contact';
import { contactTolerance } from '../contact-tolerance';
import type { Plate } from '../definition';

/** Two plates (indices) nearer to each other than the tolerance; negative gap: they overlap by that much, mm. */
export interface TouchingPair {
	readonly a: number;
	readonly b: number;
	readonly gap: number;
}

/** Plates as rectangles in their places, and which of them touch. */
export interface PlacedPlates {
	readonly boxes: readonly TurnedRectangle[];
	/** How far apart edges may be and still touch, mm. */
	readonly tolerance: number;
	readonly touching: readonly TouchingPair[];
}

/** Rectangles of checked plates and every pair that touches or overlaps, each pair once. */
export function placedPlates(plates: readonly Plate[]): PlacedPlates {
	const boxes = plates.map(turnedRectangle);
	const least = Math.min(...plates.map(({ width, thickness }) => Math.min(width, thickness)));
	const tolerance = contactTolerance(boxes.flatMap(cornersOf), least);
	return { boxes, tolerance, touching: touchingPairs(boxes, tolerance) };
}

export function turnedRectangle({ width, thickness, y, z, angle }: Plate): TurnedRectangle {
	return {
		centre: { y, z },
		along: direction(angle),
		halfWidth: width / 2,
		halfThickness: thickness / 2
	};
}

/** Unit vector of an angle in degrees; exact at quarter turns. */
function direction(degrees: number) {
	const turned = ((degrees % 360) + 360) % 360;
	const quarters = [
		{ y: 1, z: 0 },
		{ y: 0, z: 1 },
		{ y: -1, z: 0 },
		{ y: 0, z: -1 }
	];
	const radians = (turned * Math.PI) / 180;
	return quarters[turned / 90] ?? { y: Math.cos(radians), z: Math.sin(radians) };
}

/** Only rectangles whose bounding boxes meet are measured. */
function touchingPairs(boxes: readonly TurnedRectangle[], tolerance: number): TouchingPair[] {
	const spans = boxes.map(halfSpans);
	const pairs: TouchingPair[] = [];
	for (let a = 0; a < boxes.length; a++)
		for (let b = a + 1; b < boxes.length; b++) {
			const [p, q] = [boxes[a]!.centre, boxes[b]!.centre];
			if (Math.abs(p.y - q.y) > spans[a]!.y + spans[b]!.y + 2 * tolerance) continue;
			if (Math.abs(p.z - q.z) > spans[a]!.z + spans[b]!.z + 2 * tolerance) continue;
			const gap = plateGap(boxes[a]!, boxes[b]!);
			if (gap <= tolerance) pairs.push({ a, b, gap });
		}
	return pairs;
}

/** Half the width and height of a rectangle's bounding box, mm. */
const halfSpans = ({ along, halfWidth, halfThickness }: TurnedRectangle) => ({
	y: Math.abs(along.y) * halfWidth + Math.abs(along.z) * halfThickness,
	z: Math.abs(along.z) * halfWidth + Math.abs(along.y) * halfThickness
});
