import type { Point } from '../../geometry/boundary';
import { contactTolerance, sizeAndReach } from '../contact-tolerance';
import { coordinateRounding, sameLength } from '../../tolerances';
import type { RegionRings } from './outline-rings';

const pointsOf = (regions: readonly RegionRings[]): Point[] =>
	regions.flatMap(({ outer, holes }) => [...outer, ...holes.flat()]);

/** Within one region points are the same when only rounding tells them apart, mm. */
export function ringTolerance(regions: readonly RegionRings[]): number {
	const { size, reach } = sizeAndReach(pointsOf(regions));
	return sameLength * size + coordinateRounding * reach;
}

/** Between regions edges touch as plates do, the smallest side of a region standing for the thickness, mm. */
export function regionTolerance(regions: readonly RegionRings[]): number {
	if (regions.length < 2) return ringTolerance(regions);
	const sides = regions.map(({ outer }) => sizeAndReach(outer).least);
	return contactTolerance(pointsOf(regions), Math.min(...sides));
}
