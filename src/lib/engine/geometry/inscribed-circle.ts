import type { Point } from './boundary';
import { distanceToSegment } from './segments';

interface Cell extends Point {
	readonly half: number;
	/** Clear distance at the middle (negative outside) and the most it can be within the cell. */
	readonly clear: number;
	readonly most: number;
}

const enough = 1.01;
/** Work that one search may take: probes times edges. */
const workAtMost = 2e6;

/**
 * Diameter of the largest circle within rings (outer and holes), mm: quartered cells, most promising
 * first, until nothing more than 1 % larger can be left, then a walk uphill towards the exact place.
 * A shape too intricate to settle gives the most that it can be: thicker is never the stronger.
 */
export function inscribedDiameter(rings: readonly (readonly Point[])[]): number {
	const cellAt = cellsOver(rings);
	const cells = firstCells(rings).map(([y, z, half]) => cellAt(y, z, half));
	let best = cells.reduce((a, b) => (b.clear > a.clear ? b : a));
	cells.sort((a, b) => a.most - b.most);
	const edges = rings.reduce((sum, ring) => sum + ring.length, 0);
	const probesAtMost = Math.max(1000, workAtMost / edges);
	for (let probes = 0; ; probes++) {
		const cell = cells.pop();
		if (!cell || cell.most <= best.clear * enough) break;
		if (probes >= probesAtMost) return 2 * cell.most;
		const half = cell.half / 2;
		for (const [sy, sz] of corners) {
			const quarter = cellAt(cell.y + sy * half, cell.z + sz * half, half);
			if (quarter.clear > best.clear) best = quarter;
			if (quarter.most > best.clear * enough) insert(cells, quarter);
		}
	}
	return 2 * polished(best, cellAt);
}

/** Keeps the cells in the order of what they promise. */
function insert(cells: Cell[], cell: Cell): void {
	let [low, high] = [0, cells.length];
	while (low < high) {
		const middle = (low + high) >> 1;
		if (cells[middle]!.most < cell.most) low = middle + 1;
		else high = middle;
	}
	cells.splice(low, 0, cell);
}

const corners = [
	[-1, -1],
	[1, -1],
	[1, 1],
	[-1, 1]
] as const;

type CellAt = (y: number, z: number, half: number) => Cell;

function cellsOver(rings: readonly (readonly Point[])[]): CellAt {
	return (y, z, half) => {
		const clear = clearance(rings, { y, z });
		return { y, z, half, clear, most: clear + half * Math.SQRT2 };
	};
}

function firstCells(rings: readonly (readonly Point[])[]): [number, number, number][] {
	const all = rings.flat();
	const [left, right] = [least(all, 'y', 1), -least(all, 'y', -1)];
	const [low, high] = [least(all, 'z', 1), -least(all, 'z', -1)];
	const [width, height] = [right - left, high - low];
	const half = Math.max(Math.min(width, height), Math.max(width, height) / 64) / 2;
	const [columns, rows] = [Math.ceil(width / half / 2), Math.ceil(height / half / 2)];
	return Array.from({ length: columns * rows }, (_, k) => [
		(left + right) / 2 + half * (2 * (k % columns) + 1 - columns),
		(low + high) / 2 + half * (2 * Math.floor(k / columns) + 1 - rows),
		half
	]);
}

const least = (points: readonly Point[], axis: 'y' | 'z', sign: number): number =>
	points.reduce((value, point) => Math.min(value, sign * point[axis]), Infinity);

function clearance(rings: readonly (readonly Point[])[], point: Point): number {
	let inside = false;
	let nearest = Infinity;
	for (const ring of rings) {
		for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
			const [a, b] = [ring[j]!, ring[i]!];
			nearest = Math.min(nearest, distanceToSegment(point, a, b));
			const spans = a.z > point.z !== b.z > point.z;
			if (spans && point.y < a.y + ((point.z - a.z) / (b.z - a.z)) * (b.y - a.y)) inside = !inside;
		}
	}
	return inside ? nearest : -nearest;
}

const polishingStepsAtMost = 400;

/** Walks uphill in eight directions with halving steps; a ridge that runs askew ends the walk early, never below the start. */
function polished(start: Cell, cellAt: CellAt): number {
	let best = start;
	let step = start.clear;
	for (let k = 0; k < polishingStepsAtMost && step > 1e-11 * start.clear; k++) {
		const around = [...corners, [1, 0], [0, 1], [-1, 0], [0, -1]] as const;
		const tried = around.map(([sy, sz]) => cellAt(best.y + sy! * step, best.z + sz! * step, 0));
		const top = tried.reduce((a, b) => (b.clear > a.clear ? b : a));
		if (top.clear > best.clear) best = top;
		else step /= 2;
	}
	return best.clear;
}
