import type { Edge, Loop, Point } from '$lib/engine/geometry/boundary';

const number = (value: number) => String(Math.round(value * 1e4) / 1e4 + 0);

/**
 * SVG path of closed loops with true arcs, in mm from `origin`, y to the right and z upward
 * (so the path's own y runs down). Loops are joined in one path: fill it with the even–odd rule.
 */
export function loopsPath(loops: readonly Loop[], origin: Point = { y: 0, z: 0 }): string {
	return loops.map((loop) => loopPath(loop, origin)).join('');
}

function loopPath(loop: Loop, origin: Point): string {
	const first = loop[0];
	if (!first) return '';
	const begin = `M${place(startOf(first), origin)}`;
	return begin + loop.map((edge) => edgePath(edge, origin)).join('') + 'Z';
}

/** SVG path of a closed polygon, in mm from `origin`, as `loopsPath`. */
export function polygonPath(corners: readonly Point[], origin: Point = { y: 0, z: 0 }): string {
	if (corners.length === 0) return '';
	return `M${corners.map((corner) => place(corner, origin)).join('L')}Z`;
}

const place = ({ y, z }: Point, origin: Point) => `${number(y - origin.y)} ${number(origin.z - z)}`;

function startOf(edge: Edge): Point {
	return edge.kind === 'line' ? edge.from : onArc(edge, edge.start);
}

const onArc = (arc: { centre: Point; radius: number }, angle: number): Point => ({
	y: arc.centre.y + arc.radius * Math.cos(angle),
	z: arc.centre.z + arc.radius * Math.sin(angle)
});

function edgePath(edge: Edge, origin: Point): string {
	if (edge.kind === 'line') return `L${place(edge.to, origin)}`;
	const pieces = Math.abs(edge.sweep) > Math.PI * 0.99 ? 3 : 1;
	const turn = edge.sweep > 0 ? 0 : 1;
	const radius = number(edge.radius);
	return Array.from({ length: pieces }, (_, index) => {
		const to = onArc(edge, edge.start + (edge.sweep * (index + 1)) / pieces);
		return `A${radius} ${radius} 0 0 ${turn} ${place(to, origin)}`;
	}).join('');
}
