import type { Point } from './boundary';

/** Pairs of segments whose bounding boxes meet within `slack` mm, by sweeping upwards; each pair once, indices into the list. */
export function* segmentPairs(
	segments: readonly (readonly [Point, Point])[],
	slack: number
): Generator<readonly [number, number]> {
	const boxes = segments.map(([p, q], index) => ({
		index,
		left: Math.min(p.y, q.y),
		right: Math.max(p.y, q.y),
		low: Math.min(p.z, q.z),
		high: Math.max(p.z, q.z)
	}));
	boxes.sort((a, b) => a.low - b.low);
	for (const [i, a] of boxes.entries()) {
		for (let j = i + 1; j < boxes.length; j++) {
			const b = boxes[j]!;
			if (b.low > a.high + slack) break;
			if (a.left <= b.right + slack && b.left <= a.right + slack) yield [a.index, b.index];
		}
	}
}
