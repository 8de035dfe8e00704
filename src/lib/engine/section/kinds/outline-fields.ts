import type { Point } from '../../geometry/boundary';
import { withoutRepeats } from '../../geometry/rings';
import type { Issue } from '../../result';
import { sizeAndReach } from '../contact-tolerance';
import { coordinateIssues } from '../coordinates';
import type { OutlineSection, Ring } from '../definition';
import { needed, sizeIssues } from '../sizes';

/** Points of a ring in mm, repeated ones dropped. */
export const ringPoints = (ring: Ring): Point[] => withoutRepeats(ring.map(([y, z]) => ({ y, z })));

interface NamedRing {
	readonly path: string;
	readonly name: string;
	readonly ring: Ring;
}

/** What is wrong with an outline's numbers: missing rings, too few points, coordinates, overall size. */
export function outlineFieldIssues(definition: OutlineSection): Issue[] {
	const { regions, outer } = definition;
	if (regions && outer)
		return [{ path: 'outer', message: 'Give either regions or one outer ring, not both.' }];
	if (!outer && (!Array.isArray(regions) || regions.length === 0))
		return [{ path: 'regions', message: 'An outline needs at least one region.' }];
	const rings = namedRings(definition);
	const issues = rings.flatMap(ringFieldIssues);
	return issues.length > 0 ? issues : extentIssues(rings);
}

function namedRings({ regions, outer, holes }: OutlineSection): NamedRing[] {
	const list = regions ?? [{ outer: outer ?? [], holes }];
	return list.flatMap((region, i) => {
		const path = regions ? `regions.${i}.` : '';
		const name = list.length > 1 ? ` of region${i + 1}` : '';
		return [
			{ path: `${path}outer`, name: `Outer ring${name}`, ring: region.outer },
			...(region.holes ?? []).map((ring, k) => ({
				path: `${path}holes.${k}`,
				name: `Hole ${k + 1}${name}`,
				ring
			}))
		];
	});
}

function ringFieldIssues({ path, name, ring }: NamedRing): Issue[] {
	if (!Array.isArray(ring)) return [{ path, message: `${name} must be a list of points.` }];
	const issues = ring.flatMap((point: unknown, i) => {
		const at = `${path}.${i}`;
		if (!Array.isArray(point) || point.length !== 2)
			return [{ path: at, message: `${name}: point ${i + 1} must be two numbers, y and z.` }];
		return [
			...coordinateIssues(`${at}.0`, `${name}: y of point ${i + 1}`, point[0]),
			...coordinateIssues(`${at}.1`, `${name}: z of point ${i + 1}`, point[1])
		];
	});
	if (issues.length > 0) return issues;
	const different = new Set(ring.map(([y, z]) => `${y},${z}`)).size;
	if (different >= 3) return [];
	return [{ path, message: `${name} needs at least 3 different points.` }];
}

function extentIssues(rings: readonly NamedRing[]): Issue[] {
	const outers = rings.filter(({ path }) => path.endsWith('outer'));
	return outers.flatMap(({ path, name, ring }) => {
		const { width, height } = sizeAndReach(ringPoints(ring));
		return sizeIssues([
			needed(path, `${name}: width`, width),
			needed(path, `${name}: height`, height)
		]);
	});
}
