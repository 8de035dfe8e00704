import { arrangementOf, type Arrangement } from '../../geometry/arrangement';
import type { Point } from '../../geometry/boundary';
import { connectedPieces } from '../../geometry/pieces';
import { ringArea, wound } from '../../geometry/rings';
import { segmentGap } from '../../geometry/segments';
import { windingFault } from '../../geometry/winding';
import type { Issue } from '../../result';
import { sameLength } from '../../tolerances';
import { millimetres } from '../sizes';

/** Rings of one region, mm. */
export interface RegionRings {
	readonly outer: readonly Point[];
	readonly holes: readonly (readonly Point[])[];
}

/** How a region is called in a sentence (` of region2`, or nothing) and the path of its fields. */
interface Label {
	readonly name: string;
	readonly path: string;
}

const place = ({ y, z }: Point): string =>
	`(${Number(y.toPrecision(6))}, ${Number(z.toPrecision(6))})`;

/** Rings that enclose nothing or cross themselves, holes outside the outer ring or over each other. */
export function regionIssues(region: RegionRings, label: Label, tolerance: number): Issue[] {
	const rings = [region.outer, ...region.holes];
	const alone = rings.flatMap((points, i) => {
		const name = ringName(i);
		const fault = ringFault(
			points,
			`${name[0]!.toUpperCase()}${name.slice(1)}${label.name}`,
			tolerance
		);
		return fault === null ? [] : [{ path: ringPath(label, i), ...fault }];
	});
	if (alone.length > 0) return alone;
	const holes = holeIssues(rings, label, tolerance);
	return holes.length > 0 ? holes : steelIssues(region, label);
}

/** Holes that together take away all that the outer ring encloses. */
function steelIssues({ outer, holes }: RegionRings, label: Label): Issue[] {
	const whole = Math.abs(ringArea(outer));
	const taken = holes.reduce((sum, hole) => sum + Math.abs(ringArea(hole)), 0);
	if (whole - taken > sameLength * whole) return [];
	const message =
		holes.length === 1
			? `The hole${label.name} fills the whole outer ring and leaves no steel.`
			: `The holes${label.name} fill the whole outer ring and leave no steel.`;
	return [{ path: ringPath(label, 1), message }];
}

const ringName = (i: number): string => (i === 0 ? 'outer ring' : `hole ${i}`);
const ringPath = ({ path }: Label, i: number): string =>
	i === 0 ? `${path}outer` : `${path}holes.${i - 1}`;

function ringFault(
	points: readonly Point[],
	name: string,
	tolerance: number
): Pick<Issue, 'message' | 'at'> | null {
	const arrangement = arrangementOf([{ points, owner: 0 }], tolerance);
	const area = ringArea(points);
	const at = arrangement.crossing?.at ?? windingFault(arrangement, Math.sign(area) || 1)?.at;
	if (at) return { message: `${name} crosses itself near ${place(at)}.`, at };
	return area === 0 ? { message: `${name} encloses no area.` } : null;
}

function holeIssues(
	rings: readonly (readonly Point[])[],
	label: Label,
	tolerance: number
): Issue[] {
	const owned = rings.map((points, owner) => ({ points: wound(points, owner === 0), owner }));
	const arrangement = arrangementOf(owned, tolerance);
	const { crossing } = arrangement;
	if (crossing) return [crossedIssue(crossing.owners, crossing.at, label)];
	const fault = windingFault(arrangement, 1);
	if (!fault) return [];
	const holes = [...fault.turns].filter(([owner, turn]) => owner > 0 && turn !== 0);
	const [first, second] = holes.map(([owner]) => owner).sort((a, b) => a - b);
	if (first !== undefined && second !== undefined)
		return [crossedIssue([first, second], fault.at, label)];
	const hole = first ?? 1;
	const message = `Hole ${hole}${label.name} lies outside the outer ring.`;
	return [{ path: ringPath(label, hole), message }];
}

function crossedIssue(owners: readonly [number, number], at: Point, label: Label): Issue {
	const [a, b] = [Math.min(...owners), Math.max(...owners)];
	const message =
		a === 0
			? `Hole ${b}${label.name} crosses the outer ring near ${place(at)}.`
			: `Holes ${a} and ${b}${label.name} overlap near ${place(at)}.`;
	return { path: ringPath(label, b), message, at };
}

/** Regions that overlap, or hang together nowhere. Rings are wound: outer anticlockwise, holes clockwise. */
export function regionsIssues(regions: readonly RegionRings[], tolerance: number): Issue[] {
	if (regions.length < 2) return [];
	const rings = regions.flatMap(({ outer, holes }, owner) =>
		[outer, ...holes].map((points) => ({ points, owner }))
	);
	const arrangement = arrangementOf(rings, tolerance);
	return overlapIssue(arrangement) ?? apartIssues(regions, arrangement);
}

function overlapIssue(arrangement: Arrangement): Issue[] | null {
	const { crossing } = arrangement;
	if (crossing) return [overlap(crossing.owners, crossing.at)];
	const fault = windingFault(arrangement, 1);
	if (!fault) return null;
	const [a = 0, b = 0] = [...fault.turns].flatMap(([owner, turn]) => (turn > 0 ? [owner] : []));
	return [overlap([a, b], fault.at)];
}

function overlap(owners: readonly [number, number], at: Point): Issue {
	const [a, b] = [Math.min(...owners), Math.max(...owners)];
	return {
		path: `regions.${b}`,
		message: `Regions region${a + 1} and region${b + 1} overlap near ${place(at)}.`,
		at
	};
}

function apartIssues(regions: readonly RegionRings[], { pieces }: Arrangement): Issue[] {
	const firstAt = new Map<number, number>();
	const links = pieces.flatMap(({ from, owner }): [number, number][] => {
		const first = firstAt.get(from);
		if (first === undefined) firstAt.set(from, owner);
		return first === undefined || first === owner ? [] : [[first, owner]];
	});
	const [first, second] = connectedPieces(regions.length, links);
	if (!first || !second) return [];
	const gap = Math.min(
		...first.flatMap((i) => second.map((j) => outerGap(regions[i]!, regions[j]!)))
	);
	const names = (list: readonly number[]) => list.map((i) => `region${i + 1}`).join(', ');
	const message = `Regions ${names(first)} and ${names(second)} do not touch: the gap is ${millimetres(gap)}. Regions of one outline must touch.`;
	return [{ path: `regions.${second[0]}`, message }];
}

function outerGap(a: RegionRings, b: RegionRings): number {
	let gap = Infinity;
	const edges = (region: RegionRings) =>
		[region.outer, ...region.holes].flatMap((ring) =>
			ring.map((p, i) => [p, ring[(i + 1) % ring.length]!] as const)
		);
	const others = edges(b);
	for (const [p, q] of edges(a))
		for (const [r, s] of others) gap = Math.min(gap, segmentGap(p, q, r, s));
	return gap;
}
