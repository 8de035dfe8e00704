import { circleLoop, reversedLoop } from '../../geometry/loops';
import { fail, ok, type Issue } from '../../result';
import type { CircularHollowSection } from '../definition';
import type { ShapeResult } from '../shape';
import { conditionIssues, millimetres, needed, sizeIssues } from '../sizes';
import { circularHollowTorsion } from '../torsion/hollow';

/** Circular hollow section: one wall between two circles. */
export function circularHollowShape({ d, t }: CircularHollowSection): ShapeResult {
	const issues = tubeIssues(d, t);
	if (issues.length > 0) return fail(issues);
	const centre = { y: d / 2, z: d / 2 };
	const loops = [circleLoop(centre, d / 2), reversedLoop(circleLoop(centre, d / 2 - t))];
	return ok({
		parts: [{ name: 'wall', region: { loops }, thickness: t }],
		contours: loops,
		torsion: circularHollowTorsion(d, t),
		oneThickness: true,
		notes: []
	});
}

function tubeIssues(d: number, t: number): Issue[] {
	const found = sizeIssues([needed('d', 'Diameter', d), needed('t', 'Wall thickness', t)]);
	const message = `Wall thickness ${millimetres(t)} must be less than half the diameter, ${millimetres(d / 2)}.`;
	return found.length > 0 ? found : conditionIssues([[2 * t < d, 't', message]]);
}
