import type { Loop, Point } from '../../geometry/boundary';
import { closedLoop, cornerArc, rectangleLoop, roundedLoop } from '../../geometry/loops';
import { fail, ok, type Issue } from '../../result';
import type { ISection } from '../definition';
import type { ShapeResult } from '../shape';
import { conditionIssues, fits, millimetres, needed, optional, radius, sizeIssues } from '../sizes';
import { iTorsion } from '../torsion/i';
import { weldFields, weldIssues, type WeldPlace } from '../weld-leg';

/** Sizes of an I with every default filled in, mm. */
export interface ISizes {
	readonly h: number;
	readonly bTop: number;
	readonly tfTop: number;
	readonly bBottom: number;
	readonly tfBottom: number;
	readonly tw: number;
	/** Root radius; 0 for a welded I, whose fillets are not counted. */
	readonly r: number;
	/** y of the web's middle. */
	readonly middle: number;
}

export function iSizes(definition: ISection): ISizes {
	const { h, b, tw, tf, bBottom = b, tfBottom = tf } = definition;
	const r = definition.fabrication === 'rolled' ? (definition.r ?? 0) : 0;
	return { h, bTop: b, tfTop: tf, bBottom, tfBottom, tw, r, middle: Math.max(b, bBottom) / 2 };
}

/** Rolled or welded I, double or mono-symmetric: flanges at full width, root fillets with the web. */
export function iShape(definition: ISection): ShapeResult {
	const issues = iIssues(definition);
	if (issues.length > 0) return fail(issues);
	const sizes = iSizes(definition);
	const { h, bTop, tfTop, bBottom, tfBottom, tw, middle: c } = sizes;
	const topFlange = rectangleLoop(c - bTop / 2, h - tfTop, c + bTop / 2, h);
	const bottomFlange = rectangleLoop(c - bBottom / 2, 0, c + bBottom / 2, tfBottom);
	return ok({
		parts: [
			{ name: 'topFlange', region: { loops: [topFlange] }, thickness: tfTop },
			{ name: 'web', region: { loops: [webLoop(sizes)] }, thickness: tw },
			{ name: 'bottomFlange', region: { loops: [bottomFlange] }, thickness: tfBottom }
		],
		contours: [outline(sizes)],
		torsion: iTorsion(sizes, definition.fabrication),
		oneThickness: definition.fabrication === 'rolled',
		notes: []
	});
}

function iIssues(definition: ISection): Issue[] {
	const { h, b, tw, tf, bBottom, tfBottom, r, fabrication } = definition;
	const found = sizeIssues([
		needed('h', 'Depth', h),
		needed('b', 'Flange width', b),
		needed('tw', 'Web thickness', tw),
		needed('tf', 'Flange thickness', tf),
		optional('bBottom', 'Bottom flange width', bBottom),
		optional('tfBottom', 'Bottom flange thickness', tfBottom),
		radius('r', 'Root radius', r),
		...weldFields(definition)
	]);
	if (fabrication !== 'rolled' && fabrication !== 'welded')
		found.push({ path: 'fabrication', message: 'Fabrication must be rolled or welded.' });
	return found.length > 0 ? found : fitIssues(definition);
}

function fitIssues(definition: ISection): Issue[] {
	const { h, bTop, tfTop, bBottom, tfBottom, tw, r } = iSizes(definition);
	const clear = h - tfTop - tfBottom;
	const outstand = (Math.min(bTop, bBottom) - tw) / 2;
	const issues = conditionIssues([
		[
			clear > 0,
			'tf',
			`Flange thicknesses ${millimetres(tfTop)} and ${millimetres(tfBottom)} leave no web in a depth of ${millimetres(h)}.`
		],
		[
			fits(tw, bTop),
			'tw',
			`Web thickness ${millimetres(tw)} must not be more than the flange width ${millimetres(bTop)}.`
		],
		[
			fits(tw, bBottom),
			'tw',
			`Web thickness ${millimetres(tw)} must not be more than the bottom flange width ${millimetres(bBottom)}.`
		]
	]);
	if (issues.length > 0) return issues;
	const place: WeldPlace = {
		outstand,
		web: clear / 2,
		webWords: 'half the clear web depth',
		joints: [
			[tw, tfTop],
			[tw, tfBottom]
		]
	};
	return [
		...conditionIssues([
			[
				fits(2 * r, clear),
				'r',
				`Root radius ${millimetres(r)} must not be more than half the clear web depth, ${millimetres(clear / 2)}.`
			],
			[
				fits(r, outstand),
				'r',
				`Root radius ${millimetres(r)} must not be more than the flange outstand, ${millimetres(outstand)}.`
			]
		]),
		...(definition.fabrication === 'welded' ? weldIssues(definition, place) : [])
	];
}

function webLoop({ h, tfTop, tfBottom, tw, r, middle: c }: ISizes): Loop {
	const [left, right] = [c - tw / 2, c + tw / 2];
	const [low, high] = [tfBottom, h - tfTop];
	const arc = (from: Point, y: number, z: number, to: Point) => cornerArc(from, { y, z }, to, r);
	const beyond = h + 2 * r;
	return closedLoop([
		arc({ y: right + beyond, z: low }, right, low, { y: right, z: high }),
		arc({ y: right, z: low }, right, high, { y: right + beyond, z: high }),
		arc({ y: left - beyond, z: high }, left, high, { y: left, z: low }),
		arc({ y: left, z: high }, left, low, { y: left - beyond, z: low })
	]);
}

function outline({ h, bTop, tfTop, bBottom, tfBottom, tw, r, middle: c }: ISizes): Loop {
	const [low, high] = [tfBottom, h - tfTop];
	return roundedLoop([
		{ y: c - bBottom / 2, z: 0 },
		{ y: c + bBottom / 2, z: 0 },
		{ y: c + bBottom / 2, z: low },
		{ y: c + tw / 2, z: low, radius: r },
		{ y: c + tw / 2, z: high, radius: r },
		{ y: c + bTop / 2, z: high },
		{ y: c + bTop / 2, z: h },
		{ y: c - bTop / 2, z: h },
		{ y: c - bTop / 2, z: high },
		{ y: c - tw / 2, z: high, radius: r },
		{ y: c - tw / 2, z: low, radius: r },
		{ y: c - bBottom / 2, z: low }
	]);
}
