import type { Loop, Point } from '../../geometry/boundary';
import { closedLoop, cornerArc, rectangleLoop, roundedLoop } from '../../geometry/loops';
import { fail, ok, type Issue } from '../../result';
import type { TeeSection } from '../definition';
import type { ShapeResult } from '../shape';
import { conditionIssues, fits, millimetres, needed, radius, sizeIssues } from '../sizes';
import { teeTorsion } from '../torsion/tee';
import { weldFields, weldIssues } from '../weld-leg';

const rootRadius = ({ fabrication, r = 0 }: TeeSection): number =>
	fabrication === 'rolled' ? r : 0;

/** Tee, flange on top at full width; root fillets with the web. */
export function teeShape(definition: TeeSection): ShapeResult {
	const issues = teeIssues(definition);
	if (issues.length > 0) return fail(issues);
	const { h, b, tw, tf, fabrication } = definition;
	const flange = rectangleLoop(0, h - tf, b, h);
	return ok({
		parts: [
			{ name: 'flange', region: { loops: [flange] }, thickness: tf },
			{ name: 'web', region: { loops: [webLoop(definition)] }, thickness: tw }
		],
		contours: [outline(definition)],
		torsion: teeTorsion({ h, b, tw, tf, r: rootRadius(definition) }, fabrication),
		oneThickness: fabrication === 'rolled',
		notes: []
	});
}

function teeIssues(definition: TeeSection): Issue[] {
	const { h, b, tw, tf, r, fabrication } = definition;
	const found = sizeIssues([
		needed('h', 'Depth', h),
		needed('b', 'Flange width', b),
		needed('tw', 'Web thickness', tw),
		needed('tf', 'Flange thickness', tf),
		radius('r', 'Root radius', r),
		...weldFields(definition)
	]);
	if (fabrication !== 'rolled' && fabrication !== 'welded')
		found.push({ path: 'fabrication', message: 'Fabrication must be rolled or welded.' });
	return found.length > 0 ? found : fitIssues(definition);
}

function fitIssues(definition: TeeSection): Issue[] {
	const { h, b, tw, tf } = definition;
	const r = rootRadius(definition);
	const [clear, outstand] = [h - tf, (b - tw) / 2];
	return [
		...conditionIssues([
			[
				clear > 0,
				'tf',
				`Flange thickness ${millimetres(tf)} must be less than the depth ${millimetres(h)}.`
			],
			[
				outstand >= 0,
				'tw',
				`Web thickness ${millimetres(tw)} must not be more than the flange width ${millimetres(b)}.`
			],
			[
				clear <= 0 || fits(r, clear),
				'r',
				`Root radius ${millimetres(r)} must not be more than the web depth below the flange, ${millimetres(clear)}.`
			],
			[
				outstand < 0 || fits(r, outstand),
				'r',
				`Root radius ${millimetres(r)} must not be more than the flange outstand, ${millimetres(outstand)}.`
			]
		]),
		...weldedIssues(definition, clear, outstand)
	];
}

function weldedIssues(definition: TeeSection, clear: number, outstand: number): Issue[] {
	const { tw, tf, fabrication } = definition;
	if (fabrication !== 'welded' || clear <= 0 || outstand < 0) return [];
	const webWords = 'the web depth below the flange';
	return weldIssues(definition, { outstand, web: clear, webWords, joints: [[tw, tf]] });
}

function webLoop(definition: TeeSection): Loop {
	const { h, b, tw, tf } = definition;
	const r = rootRadius(definition);
	const [left, right, under] = [(b - tw) / 2, (b + tw) / 2, h - tf];
	const far = h + b;
	const root = (y: number, from: Point, to: Point) => cornerArc(from, { y, z: under }, to, r);
	return closedLoop([
		{ y: left, z: 0 },
		{ y: right, z: 0 },
		root(right, { y: right, z: 0 }, { y: right + far, z: under }),
		root(left, { y: left - far, z: under }, { y: left, z: 0 })
	]);
}

function outline(definition: TeeSection): Loop {
	const { h, b, tw, tf } = definition;
	const r = rootRadius(definition);
	const [left, right, under] = [(b - tw) / 2, (b + tw) / 2, h - tf];
	return roundedLoop([
		{ y: left, z: 0 },
		{ y: right, z: 0 },
		{ y: right, z: under, radius: r },
		{ y: b, z: under },
		{ y: b, z: h },
		{ y: 0, z: h },
		{ y: 0, z: under },
		{ y: left, z: under, radius: r }
	]);
}
