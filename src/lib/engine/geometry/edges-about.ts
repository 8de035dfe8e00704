import type { Edge, Loop, Point } from './boundary';

/** The edges of loops, measured from a point. */
export const edgesAbout = (loops: readonly Loop[], { y, z }: Point): Edge[] =>
	loops.flat().map((edge): Edge => {
		const moved = (p: Point): Point => ({ y: p.y - y, z: p.z - z });
		if (edge.kind === 'arc') return { ...edge, centre: moved(edge.centre) };
		return { kind: 'line', from: moved(edge.from), to: moved(edge.to) };
	});
