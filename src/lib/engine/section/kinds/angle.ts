import type { Loop } from '../../geometry/boundary';
import { closedLoop, cornerArc, roundedLoop } from '../../geometry/loops';
import { fail, ok, type Issue } from '../../result';
import type { AngleSection } from '../definition';
import type { ShapeResult } from '../shape';
import { conditionIssues, fits, millimetres, needed, radius, sizeIssues } from '../sizes';
import { angleTorsion } from '../torsion/angle';

/** Angle: vertical leg at full height with the root fillet, horizontal leg beside it. */
export function angleShape(definition: AngleSection): ShapeResult {
	const issues = angleIssues(definition);
	if (issues.length > 0) return fail(issues);
	const { h, b, t, r = 0, rToe = 0 } = definition;
	const sizes: AngleSizes = { h, b, t, r, rToe };
	return ok({
		parts: [
			{ name: 'verticalLeg', region: { loops: [verticalLoop(sizes)] }, thickness: t },
			{ name: 'horizontalLeg', region: { loops: [horizontalLoop(sizes)] }, thickness: t }
		],
		contours: [outline(sizes)],
		torsion: angleTorsion(sizes),
		oneThickness: true,
		notes: []
	});
}

interface AngleSizes {
	readonly h: number;
	readonly b: number;
	readonly t: number;
	readonly r: number;
	readonly rToe: number;
}

function angleIssues({ h, b, t, r = 0, rToe = 0 }: AngleSection): Issue[] {
	const found = sizeIssues([
		needed('h', 'Vertical leg', h),
		needed('b', 'Horizontal leg', b),
		needed('t', 'Thickness', t),
		radius('r', 'Root radius', r),
		radius('rToe', 'Toe radius', rToe)
	]);
	if (found.length > 0) return found;
	const leg = Math.min(h, b);
	const issues = conditionIssues([
		[
			t < leg,
			't',
			`Thickness ${millimetres(t)} must be less than the shorter leg, ${millimetres(leg)}.`
		],
		[
			fits(rToe, t),
			'rToe',
			`Toe radius ${millimetres(rToe)} must not be more than the thickness ${millimetres(t)}.`
		]
	]);
	if (issues.length > 0) return issues;
	const message = `Root radius ${millimetres(r)} and toe radius ${millimetres(rToe)} do not fit the shorter leg's inner face, ${millimetres(leg - t)}.`;
	return conditionIssues([[fits(r + rToe, leg - t), 'r', message]]);
}

const cornersOf = ({ h, b, t, r, rToe }: AngleSizes) => ({
	heel: { y: 0, z: 0 },
	tip: { y: b, z: 0 },
	lowerToe: { y: b, z: t, radius: rToe },
	root: { y: t, z: t, radius: r },
	upperToe: { y: t, z: h, radius: rToe },
	top: { y: 0, z: h }
});

function outline(sizes: AngleSizes): Loop {
	const { heel, tip, lowerToe, root, upperToe, top } = cornersOf(sizes);
	return roundedLoop([heel, tip, lowerToe, root, upperToe, top]);
}

function verticalLoop(sizes: AngleSizes): Loop {
	const { heel, lowerToe, root, upperToe, top } = cornersOf(sizes);
	return closedLoop([
		heel,
		{ y: sizes.t, z: 0 },
		{ y: sizes.t, z: sizes.t },
		cornerArc(lowerToe, root, upperToe, sizes.r),
		cornerArc(root, upperToe, top, sizes.rToe),
		top
	]);
}

function horizontalLoop(sizes: AngleSizes): Loop {
	const { tip, lowerToe, root } = cornersOf(sizes);
	return closedLoop([
		{ y: sizes.t, z: 0 },
		tip,
		cornerArc(tip, lowerToe, root, sizes.rToe),
		{ y: sizes.t, z: sizes.t }
	]);
}
