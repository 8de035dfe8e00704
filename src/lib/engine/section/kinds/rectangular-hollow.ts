import { rectangleLoop, reversedLoop } from '../../geometry/loops';
import { fail, ok, type Issue, type Note } from '../../result';
import type { RectangularHollowSection } from '../definition';
import type { ShapeResult } from '../shape';
import { conditionIssues, fits, millimetres, needed, radius, sizeIssues } from '../sizes';
import { rectangularHollowTorsion } from '../torsion/hollow';

/** Outside and inside corner radii, mm. */
export interface CornerRadii {
	readonly ro: number;
	readonly ri: number;
	/** Neither was given: the product standard's nominal radii are taken. */
	readonly assumed: boolean;
}

/**
 * Corner radii of a rectangular tube. One given: the other follows from the thickness
 * (ri = max(ro − t, 0), ro = ri + t). None given: the nominal radii that the product standards
 * take for section properties, never sharp corners, which would add area: EN 10210-2:2006
 * Annex A (ro 1.5t, ri 1.0t) or EN 10219-2:2006 Annex B (2t and t up to 6 mm, 2.5t and 1.5t up
 * to 10 mm, 3t and 2t above).
 */
export function cornerRadii(definition: RectangularHollowSection): CornerRadii {
	const { t, ro, ri, fabrication } = definition;
	if (ro !== undefined) return { ro, ri: ri ?? Math.max(ro - t, 0), assumed: false };
	if (ri !== undefined) return { ro: ri + t, ri, assumed: false };
	if (fabrication === 'hot-finished') return { ro: 1.5 * t, ri: t, assumed: true };
	const times = t <= 6 ? 2 : t <= 10 ? 2.5 : 3;
	return { ro: times * t, ri: (times - 1) * t, assumed: true };
}

/** Rectangular hollow section: one wall between two rounded rectangles. */
export function rectangularHollowShape(definition: RectangularHollowSection): ShapeResult {
	const issues = hollowIssues(definition);
	if (issues.length > 0) return fail(issues);
	const { h, b, t } = definition;
	const { ro, ri, assumed } = cornerRadii(definition);
	const outer = rectangleLoop(0, 0, b, h, ro);
	const inner = reversedLoop(rectangleLoop(t, t, b - t, h - t, ri));
	return ok({
		parts: [{ name: 'wall', region: { loops: [outer, inner] }, thickness: t }],
		contours: [outer, inner],
		torsion: rectangularHollowTorsion({ h, b, t, ro, ri }),
		oneThickness: true,
		notes: assumed ? [radiiNote(ro, ri)] : []
	});
}

const radiiNote = (ro: number, ri: number): Note => ({
	code: 'corner-radii-assumed',
	message: `No corner radii given: the product standard's nominal ${millimetres(ro)} outside and ${millimetres(ri)} inside are taken.`
});

function hollowIssues(definition: RectangularHollowSection): Issue[] {
	const { h, b, t, ro, ri, fabrication } = definition;
	const found = sizeIssues([
		needed('h', 'Depth', h),
		needed('b', 'Width', b),
		needed('t', 'Wall thickness', t),
		radius('ro', 'Outside corner radius', ro),
		radius('ri', 'Inside corner radius', ri)
	]);
	if (fabrication !== 'hot-finished' && fabrication !== 'cold-formed')
		found.push({
			path: 'fabrication',
			message: 'Fabrication must be hot-finished or cold-formed.'
		});
	return found.length > 0 ? found : fitIssues(definition);
}

function fitIssues(definition: RectangularHollowSection): Issue[] {
	const { h, b, t } = definition;
	const { ro, ri } = cornerRadii(definition);
	const half = Math.min(h, b) / 2;
	const issues = conditionIssues([
		[
			t < half,
			't',
			`Wall thickness ${millimetres(t)} must be less than half the smaller side, ${millimetres(half)}.`
		]
	]);
	if (issues.length > 0) return issues;
	return conditionIssues([
		[
			fits(ro, half),
			'ro',
			`Outside corner radius ${millimetres(ro)} must not be more than half the smaller side, ${millimetres(half)}.`
		],
		[
			fits(ri, half - t),
			'ri',
			`Inside corner radius ${millimetres(ri)} must not be more than half the smaller clear width, ${millimetres(half - t)}.`
		],
		[
			cornerHolds(t, ro, ri),
			'ro',
			`Outside corner radius ${millimetres(ro)} cuts through the inside corner of radius ${millimetres(ri)} at a wall of ${millimetres(t)}.`
		]
	]);
}

/** On the diagonal of a corner the outside arc must stay outside the inside one. */
function cornerHolds(t: number, ro: number, ri: number): boolean {
	const inset = Math.SQRT2 - 1;
	return inset * ro < Math.SQRT2 * t + inset * ri;
}
