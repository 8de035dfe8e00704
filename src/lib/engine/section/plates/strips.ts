import type { Point } from '../../geometry/boundary';
import type { Plate } from '../definition';
import { turnedRectangle } from './placing';

/**
 * A plate seen along its longer side, mm. `u` runs along the mid-line from the middle, to the right
 * (upwards for a steep plate); `v` across it, a quarter turn anticlockwise from `u`.
 */
export interface Strip {
	readonly name: string;
	readonly centre: Point;
	/** Unit vector of `u`. */
	readonly along: Point;
	readonly half: number;
	readonly halfThickness: number;
}

export function stripOf(plate: Plate): Strip {
	const { centre, along, halfWidth, halfThickness } = turnedRectangle(plate);
	const long = halfWidth >= halfThickness;
	const axis = long ? along : { y: -along.z, z: along.y };
	return {
		name: plate.name,
		centre,
		along: rightOrUp(axis),
		half: long ? halfWidth : halfThickness,
		halfThickness: long ? halfThickness : halfWidth
	};
}

/** Slack of a direction at 45°, so that rounding does not turn it about. */
const diagonal = 1e-9;

function rightOrUp({ y, z }: Point): Point {
	const level = Math.abs(y) >= Math.abs(z) - diagonal;
	return (level ? y : z) < 0 ? { y: -y, z: -z } : { y, z };
}

/** A point in a strip's own coordinates, mm. */
export function inStrip({ centre, along }: Strip, point: Point): { u: number; v: number } {
	const [dy, dz] = [point.y - centre.y, point.z - centre.z];
	return { u: dy * along.y + dz * along.z, v: dz * along.y - dy * along.z };
}

/** The point at given coordinates of a strip, mm. */
export const pointOfStrip = ({ centre, along }: Strip, u: number, v = 0): Point => ({
	y: centre.y + (u * along.y - v * along.z),
	z: centre.z + (u * along.z + v * along.y)
});
