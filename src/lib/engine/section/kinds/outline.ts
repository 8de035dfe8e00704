import { arrangementOf } from '../../geometry/arrangement';
import type { Point } from '../../geometry/boundary';
import { inscribedDiameter } from '../../geometry/inscribed-circle';
import { closedLoop } from '../../geometry/loops';
import { wound } from '../../geometry/rings';
import { mergedLoops } from '../../geometry/trace';
import { fail, ok, type Note } from '../../result';
import type { OutlineRegion, OutlineSection } from '../definition';
import type { ShapePart, ShapeResult } from '../shape';
import { outlineFieldIssues, ringPoints } from './outline-fields';
import { regionTolerance, ringTolerance } from './outline-tolerance';
import { regionIssues, regionsIssues, type RegionRings } from './outline-rings';

/** Polygons with holes, each region its own material; keeps its own coordinates. */
export function outlineShape(definition: OutlineSection): ShapeResult {
	const fields = outlineFieldIssues(definition);
	if (fields.length > 0) return fail(fields);
	const given = outlineRegions(definition);
	const regions = given.map(({ outer, holes = [] }) => ({
		outer: ringPoints(outer),
		holes: holes.map(ringPoints)
	}));
	const tolerance = ringTolerance(regions);
	const alone = regions.flatMap((region, i) =>
		regionIssues(region, regionLabel(definition, i), tolerance)
	);
	if (alone.length > 0) return fail(alone);
	const turned = regions.map(oriented);
	const together = regionsIssues(turned, regionTolerance(regions));
	if (together.length > 0) return fail(together);
	return ok({
		parts: turned.map((region, i) => regionPart(region, given[i]!, i)),
		contours: outlineContours(turned, regionTolerance(regions)),
		torsion: { torsionConstant: null, warpingConstant: null, shearCentre: null },
		oneThickness: false,
		notes: [thicknessNote]
	});
}

/** The regions of an outline, the short form counting as one. */
export const outlineRegions = ({ regions, outer, holes }: OutlineSection): OutlineRegion[] =>
	regions ? [...regions] : [{ outer: outer ?? [], ...(holes ? { holes } : {}) }];

/** How issues call a region and where they point. */
const regionLabel = ({ regions }: OutlineSection, i: number) =>
	regions && regions.length > 1
		? { name: ` of region${i + 1}`, path: `regions.${i}.` }
		: { name: '', path: regions ? `regions.${i}.` : '' };

const oriented = ({ outer, holes }: RegionRings): RegionRings => ({
	outer: wound(outer, true),
	holes: holes.map((hole) => wound(hole, false))
});

function regionPart({ outer, holes }: RegionRings, given: OutlineRegion, i: number): ShapePart {
	const rings: (readonly Point[])[] = [outer, ...holes];
	return {
		name: `region${i + 1}`,
		region: { loops: rings.map((points) => closedLoop(points)) },
		thickness: Number(inscribedDiameter(rings).toPrecision(9)),
		...(given.grade === undefined ? {} : { grade: given.grade })
	};
}

function outlineContours(regions: readonly RegionRings[], tolerance: number) {
	const rings = regions.flatMap(({ outer, holes }, owner) =>
		[outer, ...holes].map((points) => ({ points, owner }))
	);
	return mergedLoops(arrangementOf(rings, tolerance));
}

const thicknessNote: Note = {
	code: 'outline-thickness',
	message:
		'An outline has no plate thickness: nominal strengths are taken at the diameter of the largest circle within each region.'
};
