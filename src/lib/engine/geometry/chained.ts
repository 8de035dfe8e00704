import type { Edge, Loop, Point } from './boundary';
import { edgeEnd, edgeStart } from './bounds';

/** Edges in any order joined into closed loops, each end to the nearest beginning: for drawing. */
export function chainedLoops(edges: readonly Edge[]): Loop[] {
	const left = [...edges];
	const loops: Loop[] = [];
	while (left.length > 0) {
		const loop = [left.pop()!];
		const first = edgeStart(loop[0]!);
		for (;;) {
			const end = edgeEnd(loop.at(-1)!);
			const next = nearest(left, end);
			if (next < 0 || apart(first, end) <= apart(edgeStart(left[next]!), end)) break;
			loop.push(...left.splice(next, 1));
		}
		loops.push(loop);
	}
	return loops;
}

function nearest(edges: readonly Edge[], point: Point): number {
	let [at, least] = [-1, Infinity];
	edges.forEach((edge, i) => {
		const distance = apart(edgeStart(edge), point);
		if (distance < least) [at, least] = [i, distance];
	});
	return at;
}

const apart = (a: Point, b: Point): number => Math.hypot(a.y - b.y, a.z - b.z);
