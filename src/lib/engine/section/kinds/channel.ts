import type { Loop, Point } from '../../geometry/boundary';
import {
	closedLoop,
	cornerArc,
	roundedLoop,
	tangentLength,
	type Corner
} from '../../geometry/loops';
import { regionMoments } from '../../geometry/moments';
import { fail, ok, type Issue } from '../../result';
import type { ChannelSection } from '../definition';
import type { ShapeResult } from '../shape';
import { conditionIssues, fits, millimetres, needed, radius, sizeIssues } from '../sizes';
import { channelTorsion } from '../torsion/channel';

/** A channel with its inner flange faces worked out, mm. */
export interface ChannelSizes {
	readonly h: number;
	readonly b: number;
	readonly tw: number;
	readonly tf: number;
	readonly r: number;
	readonly rToe: number;
	/** Rise of the inner face per mm towards the web. */
	readonly slope: number;
	/** Flange thickness at the back of the web (y = 0), at the web's face and at the toe. */
	readonly tBack: number;
	readonly tRoot: number;
	readonly tToe: number;
}

export function channelSizes(definition: ChannelSection): ChannelSizes {
	const { h, b, tw, tf, r = 0, rToe = 0, flangeSlopePercent = 0, tfAt } = definition;
	const slope = flangeSlopePercent / 100;
	const measuredAt = tfAt === 'half-outstand' ? (b + tw) / 2 : b / 2;
	const thickness = (y: number) => tf + slope * (measuredAt - y);
	return {
		h,
		b,
		tw,
		tf,
		r,
		rToe,
		slope,
		tBack: thickness(0),
		tRoot: thickness(tw),
		tToe: thickness(b)
	};
}

/** Channel, web on the left, parallel or tapered flanges; root fillets with the web, toe arcs with the flanges. */
export function channelShape(definition: ChannelSection): ShapeResult {
	const issues = channelIssues(definition);
	if (issues.length > 0) return fail(issues);
	const sizes = channelSizes(definition);
	const contour = outline(sizes);
	const webMiddle = { y: sizes.tw / 2, z: sizes.h / 2 };
	return ok({
		parts: [
			{ name: 'topFlange', region: { loops: [topFlangeLoop(sizes)] }, thickness: sizes.tf },
			{ name: 'web', region: { loops: [webLoop(sizes)] }, thickness: sizes.tw },
			{ name: 'bottomFlange', region: { loops: [bottomFlangeLoop(sizes)] }, thickness: sizes.tf }
		],
		contours: [contour],
		torsion: channelTorsion(sizes, regionMoments({ loops: [contour] }, webMiddle)),
		oneThickness: true,
		notes: []
	});
}

function channelIssues(definition: ChannelSection): Issue[] {
	const { h, b, tw, tf, r, rToe, flangeSlopePercent: slope, tfAt } = definition;
	const found = sizeIssues([
		needed('h', 'Depth', h),
		needed('b', 'Flange width', b),
		needed('tw', 'Web thickness', tw),
		needed('tf', 'Flange thickness', tf),
		radius('r', 'Root radius', r),
		radius('rToe', 'Toe radius', rToe)
	]);
	if (slope !== undefined && !(slope >= 0 && slope <= 100))
		found.push({ path: 'flangeSlopePercent', message: 'Flange slope must be 0 to 100 per cent.' });
	if (tfAt !== undefined && tfAt !== 'half-flange' && tfAt !== 'half-outstand')
		found.push({ path: 'tfAt', message: 'tfAt must be half-flange or half-outstand.' });
	return found.length > 0 ? found : fitIssues(channelSizes(definition));
}

function fitIssues(sizes: ChannelSizes): Issue[] {
	const { h, b, tw, tf, tRoot, tToe } = sizes;
	const issues = conditionIssues([
		[
			tw < b,
			'tw',
			`Web thickness ${millimetres(tw)} must be less than the flange width ${millimetres(b)}.`
		],
		[
			2 * tf < h,
			'tf',
			`Flange thickness ${millimetres(tf)} must be less than half the depth, ${millimetres(h / 2)}.`
		],
		[
			tToe > 0,
			'flangeSlopePercent',
			`Flange slope leaves no thickness at the toe (${millimetres(tToe)}).`
		],
		[
			2 * tRoot < h,
			'flangeSlopePercent',
			`Flange thickness at the web, ${millimetres(tRoot)}, must be less than half the depth, ${millimetres(h / 2)}.`
		]
	]);
	return issues.length > 0 ? issues : radiusIssues(sizes);
}

function radiusIssues(sizes: ChannelSizes): Issue[] {
	const { h, b, tw, r, rToe, tRoot, tToe, slope } = sizes;
	const { toe, root } = bottomCorners(sizes);
	const tip: Point = { y: b, z: 0 };
	const atToe = tangentLength(tip, toe, root, rToe);
	const atRoot = tangentLength(toe, root, { y: tw, z: h }, r);
	const face = (b - tw) * Math.hypot(1, slope);
	const clear = h / 2 - tRoot;
	return conditionIssues([
		[
			fits(atToe, tToe),
			'rToe',
			`Toe radius ${millimetres(rToe)} does not fit the flange thickness at the toe, ${millimetres(tToe)}.`
		],
		[
			fits(atRoot, clear),
			'r',
			`Root radius ${millimetres(r)} does not fit half the clear web depth, ${millimetres(clear)}.`
		],
		[
			fits(atRoot + atToe, face),
			'r',
			`Root radius ${millimetres(r)} and toe radius ${millimetres(rToe)} do not fit the flange outstand, ${millimetres(b - tw)}.`
		]
	]);
}

const bottomCorners = ({ b, tw, tToe, tRoot, rToe, r }: ChannelSizes) => ({
	toe: { y: b, z: tToe, radius: rToe } satisfies Corner,
	root: { y: tw, z: tRoot, radius: r } satisfies Corner
});

const topCorners = ({ h, b, tw, tToe, tRoot, rToe, r }: ChannelSizes) => ({
	toe: { y: b, z: h - tToe, radius: rToe } satisfies Corner,
	root: { y: tw, z: h - tRoot, radius: r } satisfies Corner
});

function outline(sizes: ChannelSizes): Loop {
	const [bottom, top] = [bottomCorners(sizes), topCorners(sizes)];
	return roundedLoop([
		{ y: 0, z: 0 },
		{ y: sizes.b, z: 0 },
		bottom.toe,
		bottom.root,
		top.root,
		top.toe,
		{ y: sizes.b, z: sizes.h },
		{ y: 0, z: sizes.h }
	]);
}

function bottomFlangeLoop(sizes: ChannelSizes): Loop {
	const { toe, root } = bottomCorners(sizes);
	const tip: Point = { y: sizes.b, z: 0 };
	return closedLoop([
		{ y: 0, z: 0 },
		tip,
		cornerArc(tip, toe, root, sizes.rToe),
		{ y: 0, z: sizes.tBack }
	]);
}

function topFlangeLoop(sizes: ChannelSizes): Loop {
	const { toe, root } = topCorners(sizes);
	const tip: Point = { y: sizes.b, z: sizes.h };
	return closedLoop([
		tip,
		{ y: 0, z: sizes.h },
		{ y: 0, z: sizes.h - sizes.tBack },
		cornerArc(root, toe, tip, sizes.rToe)
	]);
}

function webLoop(sizes: ChannelSizes): Loop {
	const [bottom, top] = [bottomCorners(sizes), topCorners(sizes)];
	return closedLoop([
		{ y: 0, z: sizes.tBack },
		cornerArc(bottom.toe, bottom.root, top.root, sizes.r),
		cornerArc(bottom.root, top.root, top.toe, sizes.r),
		{ y: 0, z: sizes.h - sizes.tBack }
	]);
}
