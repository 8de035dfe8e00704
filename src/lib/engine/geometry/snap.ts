import type { Point } from './boundary';

/**
 * Points that lie within `tolerance` of each other made one. Returns the nodes (first point of each
 * group stands for it) and, for every point, the index of its node.
 */
export function snappedPoints(points: readonly Point[], tolerance: number) {
	const origin = points[0] ?? { y: 0, z: 0 };
	const nodes: Point[] = [];
	const cells = new Map<string, number[]>();
	const cell = ({ y, z }: Point) => [
		Math.floor((y - origin.y) / tolerance),
		Math.floor((z - origin.z) / tolerance)
	];
	const nearest = (point: Point): number | undefined => {
		const [i, j] = cell(point) as [number, number];
		return around(i, j)
			.flatMap((key) => cells.get(key) ?? [])
			.find((node) => distance(nodes[node]!, point) <= tolerance);
	};
	const added = (point: Point): number => {
		const key = cell(point).join();
		const node = nodes.push(point) - 1;
		cells.set(key, [...(cells.get(key) ?? []), node]);
		return node;
	};
	const indices = points.map((point) => nearest(point) ?? added(point));
	return { nodes, indices };
}

const distance = (a: Point, b: Point): number => Math.hypot(a.y - b.y, a.z - b.z);

const around = (i: number, j: number): string[] =>
	[-1, 0, 1].flatMap((di) => [-1, 0, 1].map((dj) => `${i + di},${j + dj}`));
