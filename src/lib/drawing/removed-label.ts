import type { Point } from '$lib/engine/geometry/boundary';
import { depthToPx, sideToPx, type BlockLayout } from './block-layout';
import { depthOf, sideOf, type TurnedFrame } from './turned-frame';

/** Where the words beside a strip begin or end, and where their lead touches the strip, px. */
export interface RemovedLabelPlace {
	readonly x: number;
	readonly y: number;
	readonly anchor: 'start' | 'middle';
	readonly lead: { readonly x: number; readonly y: number };
}

interface Box {
	readonly left: number;
	readonly right: number;
	readonly top: number;
	readonly bottom: number;
}

const gap = 10;
const line = 15;

/**
 * Place of the words for the largest of the strips that do not count: beside an upright one, within the
 * section's outline side of a level one. `taken`: heights of other words beside the steel, px. Null
 * where no strip is on the drawing.
 */
export function removedLabelPlace(
	strips: readonly (readonly Point[])[],
	frame: TurnedFrame,
	layout: BlockLayout,
	words: number,
	taken: readonly number[] = []
): RemovedLabelPlace | null {
	const boxes = strips.flatMap((corners) => boxOf(corners, frame, layout) ?? []);
	const [first, ...rest] = boxes;
	if (!first) return null;
	const largest = rest.reduce((a, b) => (areaOf(b) > areaOf(a) * 1.001 ? b : a), first);
	const right = layout.section.x + layout.section.width - 2;
	const { top, bottom } = largest;
	const middle = { x: (largest.left + largest.right) / 2, y: (top + bottom) / 2 };
	if (bottom - top >= line && largest.right + gap + words <= right) {
		const y = clearOf(middle.y, taken, top, bottom);
		return { x: largest.right + gap, y: y + 4, anchor: 'start', lead: { x: largest.right, y } };
	}
	const upper = middle.y < (layout.top + layout.bottom) / 2;
	const x = Math.max(layout.gutterX + words / 2, Math.min(right - words / 2, middle.x));
	const y = upper ? bottom + line + 6 : top - line;
	return { x, y, anchor: 'middle', lead: { x: middle.x, y: upper ? bottom : top } };
}

const areaOf = ({ left, right, top, bottom }: Box) => (right - left) * (bottom - top);

/** The height nearest to the middle of the strip that keeps a line away from what is taken. */
function clearOf(middle: number, taken: readonly number[], top: number, bottom: number): number {
	const free = (y: number) => taken.every((other) => Math.abs(other - y) >= line + 3);
	if (free(middle)) return middle;
	const others = taken.flatMap((other) => [other - line - 4, other + line + 4]).filter(free);
	const inside = others.filter((y) => y > top && y < bottom);
	const [near] = inside.sort((a, b) => Math.abs(a - middle) - Math.abs(b - middle));
	return near ?? middle;
}

function boxOf(corners: readonly Point[], frame: TurnedFrame, layout: BlockLayout): Box | null {
	const depths = corners.map((corner) => depthToPx(layout, depthOf(frame, corner)));
	const sides = corners.map((corner) => sideToPx(layout, sideOf(frame, corner)));
	if (sides.some((side) => side === null)) return null;
	const shown = sides.filter((side) => side !== null);
	return {
		left: Math.min(...shown),
		right: Math.max(...shown),
		top: Math.min(...depths),
		bottom: Math.max(...depths)
	};
}
