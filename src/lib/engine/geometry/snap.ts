import type { Point } from './boundary';

/** Side of a cell in tolerances: wide, so that most points are looked for in one cell only. */
const cellSide = 8;

/**
 * Points that lie within `tolerance` of each other made one. Returns the nodes (first point of each
 * group stands for it) and, for every point, the index of its node.
 */
export function snappedPoints(points: readonly Point[], tolerance: number) {
	const origin = points[0] ?? { y: 0, z: 0 };
	const side = cellSide * tolerance;
	const nodes: Point[] = [];
	const cells = new Map<string, number[]>();
	const along = (value: number, from: number) => Math.floor((value - from) / side);
	const nearest = (point: Point): number | undefined => {
		const top = along(point.z + tolerance, origin.z);
		const right = along(point.y + tolerance, origin.y);
		for (let i = along(point.y - tolerance, origin.y); i <= right; i++)
			for (let j = along(point.z - tolerance, origin.z); j <= top; j++)
				for (const node of cells.get(`${i},${j}`) ?? [])
					if (distance(nodes[node]!, point) <= tolerance) return node;
		return undefined;
	};
	const added = (point: Point): number => {
		const key = `${along(point.y, origin.y)},${along(point.z, origin.z)}`;
		const node = nodes.push(point) - 1;
		const cell = cells.get(key);
		if (cell) cell.push(node);
		else cells.set(key, [node]);
		return node;
	};
	const indices = points.map((point) => nearest(point) ?? added(point));
	return { nodes, indices };
}

const distance = (a: Point, b: Point): number => Math.hypot(a.y - b.y, a.z - b.z);
