import { circleLoop, rectangleLoop } from '../../geometry/loops';
import { fail, ok } from '../../result';
import type { FlatSection, RoundSection } from '../definition';
import type { ShapeResult } from '../shape';
import { needed, sizeIssues } from '../sizes';
import { flatTorsion, roundTorsion } from '../torsion/bars';

/** Flat bar, b along y and h along z; its nominal thickness is the smaller. */
export function flatShape({ b, h }: FlatSection): ShapeResult {
	const issues = sizeIssues([needed('b', 'Width', b), needed('h', 'Depth', h)]);
	if (issues.length > 0) return fail(issues);
	const loop = rectangleLoop(0, 0, b, h);
	return ok({
		parts: [{ name: 'bar', region: { loops: [loop] }, thickness: Math.min(b, h) }],
		contours: [loop],
		torsion: flatTorsion(b, h),
		oneThickness: true,
		notes: []
	});
}

/** Round bar; its nominal thickness is the diameter. */
export function roundShape({ d }: RoundSection): ShapeResult {
	const issues = sizeIssues([needed('d', 'Diameter', d)]);
	if (issues.length > 0) return fail(issues);
	const loop = circleLoop({ y: d / 2, z: d / 2 }, d / 2);
	return ok({
		parts: [{ name: 'bar', region: { loops: [loop] }, thickness: d }],
		contours: [loop],
		torsion: roundTorsion(d),
		oneThickness: true,
		notes: []
	});
}
