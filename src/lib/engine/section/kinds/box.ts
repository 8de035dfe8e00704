import type { Loop } from '../../geometry/boundary';
import { rectangleLoop, reversedLoop, roundedLoop } from '../../geometry/loops';
import { fail, ok, type Issue } from '../../result';
import type { BoxSection } from '../definition';
import type { ShapeResult } from '../shape';
import { conditionIssues, fits, millimetres, needed, optional, sizeIssues } from '../sizes';
import { boxTorsion } from '../torsion/box';
import { weldFields, weldIssues, type WeldPlace } from '../weld-leg';

/** Sizes of a box with every default filled in, mm. */
export interface BoxSizes {
	readonly h: number;
	readonly bTop: number;
	readonly bBottom: number;
	readonly tw: number;
	readonly tfTop: number;
	readonly tfBottom: number;
	readonly webGap: number;
	/** y of the line of symmetry. */
	readonly middle: number;
}

export function boxSizes(definition: BoxSection): BoxSizes {
	const { h, b, bBottom = b, tw, tfTop, tfBottom, webGap } = definition;
	return { h, bTop: b, bBottom, tw, tfTop, tfBottom, webGap, middle: Math.max(b, bBottom) / 2 };
}

/** Welded box girder: two webs between two flanges. Welds set plate edges only. */
export function boxShape(definition: BoxSection): ShapeResult {
	const issues = boxIssues(definition);
	if (issues.length > 0) return fail(issues);
	const sizes = boxSizes(definition);
	const { tw, tfTop, tfBottom } = sizes;
	const { topFlange, bottomFlange, leftWeb, rightWeb, hollow } = boxLoops(sizes);
	return ok({
		parts: [
			{ name: 'topFlange', region: { loops: [topFlange] }, thickness: tfTop },
			{ name: 'leftWeb', region: { loops: [leftWeb] }, thickness: tw },
			{ name: 'rightWeb', region: { loops: [rightWeb] }, thickness: tw },
			{ name: 'bottomFlange', region: { loops: [bottomFlange] }, thickness: tfBottom }
		],
		contours: [outline(sizes), reversedLoop(hollow)],
		torsion: boxTorsion(sizes),
		oneThickness: false,
		notes: []
	});
}

function boxIssues(definition: BoxSection): Issue[] {
	const { h, b, bBottom, tw, tfTop, tfBottom, webGap } = definition;
	const found = sizeIssues([
		needed('h', 'Depth', h),
		needed('b', 'Flange width', b),
		optional('bBottom', 'Bottom flange width', bBottom),
		needed('tw', 'Web thickness', tw),
		needed('tfTop', 'Top flange thickness', tfTop),
		needed('tfBottom', 'Bottom flange thickness', tfBottom),
		needed('webGap', 'Clear distance between webs', webGap),
		...weldFields(definition)
	]);
	return found.length > 0 ? found : fitIssues(definition);
}

function fitIssues(definition: BoxSection): Issue[] {
	const sizes = boxSizes(definition);
	const { h, bTop, bBottom, tw, tfTop, tfBottom, webGap } = sizes;
	const clear = h - tfTop - tfBottom;
	const overWebs = webGap + 2 * tw;
	const issues = conditionIssues([
		[
			clear > 0,
			'tfTop',
			`Flange thicknesses ${millimetres(tfTop)} and ${millimetres(tfBottom)} leave no web in a depth of ${millimetres(h)}.`
		],
		[
			fits(overWebs, bTop),
			'webGap',
			`Width over the webs, ${millimetres(overWebs)}, must not be more than the top flange width ${millimetres(bTop)}.`
		],
		[
			fits(overWebs, bBottom),
			'webGap',
			`Width over the webs, ${millimetres(overWebs)}, must not be more than the bottom flange width ${millimetres(bBottom)}.`
		]
	]);
	return issues.length > 0 ? issues : weldIssues(definition, outsideWeld(sizes));
}

/** Fillets stand outside the webs, on the outstands of both flanges; flush flanges give them nothing to shorten. */
function outsideWeld({ h, bTop, bBottom, tw, tfTop, tfBottom, webGap }: BoxSizes): WeldPlace {
	const outstand = (Math.min(bTop, bBottom) - webGap) / 2 - tw;
	const flush = fits(2 * outstand, 1e-9 * bTop);
	return {
		outstand: flush ? Infinity : outstand,
		web: (h - tfTop - tfBottom) / 2,
		webWords: 'half the clear web depth',
		joints: [
			[tw, tfTop],
			[tw, tfBottom]
		]
	};
}

function boxLoops({ h, bTop, bBottom, tw, tfTop, tfBottom, webGap, middle: c }: BoxSizes) {
	const [low, high, inner] = [tfBottom, h - tfTop, webGap / 2];
	return {
		topFlange: rectangleLoop(c - bTop / 2, high, c + bTop / 2, h),
		bottomFlange: rectangleLoop(c - bBottom / 2, 0, c + bBottom / 2, low),
		leftWeb: rectangleLoop(c - inner - tw, low, c - inner, high),
		rightWeb: rectangleLoop(c + inner, low, c + inner + tw, high),
		hollow: rectangleLoop(c - inner, low, c + inner, high)
	};
}

function outline({ h, bTop, bBottom, tw, tfTop, tfBottom, webGap, middle: c }: BoxSizes): Loop {
	const [low, high] = [tfBottom, h - tfTop];
	const web = webGap / 2 + tw;
	return roundedLoop([
		{ y: c - bBottom / 2, z: 0 },
		{ y: c + bBottom / 2, z: 0 },
		{ y: c + bBottom / 2, z: low },
		{ y: c + web, z: low },
		{ y: c + web, z: high },
		{ y: c + bTop / 2, z: high },
		{ y: c + bTop / 2, z: h },
		{ y: c - bTop / 2, z: h },
		{ y: c - bTop / 2, z: high },
		{ y: c - web, z: high },
		{ y: c - web, z: low },
		{ y: c - bBottom / 2, z: low }
	]);
}
