import type { GradeDefinition } from '$lib/engine/material/material';
import type { OutlineRegion, OutlineSection, Ring } from '$lib/engine/section/definition';
import { outlineRegions } from '$lib/engine/section/kinds/outline';

/** A ring of an outline: the outer one of a region, or one of its holes. */
export interface RingPlace {
	readonly region: number;
	/** Null for the outer ring. */
	readonly hole: number | null;
}

/** A ring as it is offered for editing. */
export interface NamedRing extends RingPlace {
	readonly key: string;
	readonly title: string;
	readonly points: Ring;
}

/** All rings of an outline in order, each region's outer one first. */
export function namedRings(section: OutlineSection): NamedRing[] {
	const regions = outlineRegions(section);
	const several = regions.length > 1;
	return regions.flatMap(({ outer, holes = [] }, region) => {
		const name = several ? `Region ${region + 1}, ` : '';
		const titled = (text: string) => (several ? name + text.toLowerCase() : text);
		return [
			{ region, hole: null, key: `${region}`, title: titled('Outer ring'), points: outer },
			...holes.map((points, hole) => ({
				...{ region, hole, points },
				key: `${region}.${hole}`,
				title: titled(`Hole ${hole + 1}`)
			}))
		];
	});
}

/** The outline with other regions; the short form of one region is left behind. */
export function withRegions(
	{ outer: _outer, holes: _holes, ...rest }: OutlineSection,
	regions: readonly OutlineRegion[]
): OutlineSection {
	return { ...rest, regions };
}

const changedRegion = (
	section: OutlineSection,
	index: number,
	change: (region: OutlineRegion) => OutlineRegion
): OutlineSection =>
	withRegions(
		section,
		outlineRegions(section).map((region, at) => (at === index ? change(region) : region))
	);

/** The outline with other points in one ring. */
export const withRing = (
	section: OutlineSection,
	{ region, hole }: RingPlace,
	points: Ring
): OutlineSection =>
	changedRegion(section, region, (one) =>
		hole === null
			? { ...one, outer: points }
			: { ...one, holes: one.holes?.map((ring, at) => (at === hole ? points : ring)) }
	);

/** The outline without a ring; the outer ring takes its region with it, the last region stays. */
export function withoutRing(section: OutlineSection, { region, hole }: RingPlace): OutlineSection {
	const regions = outlineRegions(section);
	if (hole !== null)
		return changedRegion(section, region, ({ holes = [], ...one }) => {
			const left = holes.filter((_, at) => at !== hole);
			return left.length > 0 ? { ...one, holes: left } : one;
		});
	if (regions.length === 1) return section;
	return withRegions(
		section,
		regions.filter((_, at) => at !== region)
	);
}

/** The outline with a square hole in the middle of a region, a tenth of its size. */
export function withHole(section: OutlineSection, region: number): OutlineSection {
	return changedRegion(section, region, (one) => {
		const box = boxOf(one.outer);
		return { ...one, holes: [...(one.holes ?? []), square(box.y, box.z, box.size / 20)] };
	});
}

/** The outline with a square region more, a fifth of its size, touching on the right. */
export function withRegion(section: OutlineSection): OutlineSection {
	const regions = outlineRegions(section);
	const points = regions.flatMap(({ outer }) => outer);
	const half = boxOf(points).size / 10;
	const right = points.reduce((best, point) => (point[0] > best[0] ? point : best));
	return withRegions(section, [
		...regions,
		{ outer: square(right[0] + half, right[1] + half, half) }
	]);
}

/** The outline with one region in a grade of its own; the section's own grade is left out. */
export const withRegionGrade = (
	section: OutlineSection,
	region: number,
	grade: GradeDefinition
): OutlineSection =>
	changedRegion(section, region, ({ grade: _before, ...one }) =>
		grade === section.grade ? one : { ...one, grade }
	);

function boxOf(points: Ring): { y: number; z: number; size: number } {
	const reach = (axis: 0 | 1) => {
		const values = points.map((point) => point[axis]);
		return [Math.min(...values), Math.max(...values)] as const;
	};
	const [[left, right], [bottom, top]] = [reach(0), reach(1)];
	const size = Math.max(right - left, top - bottom);
	return { y: (left + right) / 2, z: (bottom + top) / 2, size };
}

const square = (y: number, z: number, half: number): Ring => [
	[y - half, z - half],
	[y + half, z - half],
	[y + half, z + half],
	[y - half, z + half]
];

/** Points with one more after `index`, half way to the next. */
export function withPointAfter(points: Ring, index: number): Ring {
	const [from, to] = [points[index], points[(index + 1) % points.length]];
	if (!from || !to) return points;
	const middle = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2] as const;
	return [...points.slice(0, index + 1), middle, ...points.slice(index + 1)];
}
