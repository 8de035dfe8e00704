import type { Point } from './boundary';

/**
 * A frame turned anticlockwise about an origin: `along` lies on the axis, `across` is its left
 * normal (up, for an axis along y). Bending about the axis strains in proportion to `across`.
 */
export interface Frame {
	readonly origin: Point;
	readonly cos: number;
	readonly sin: number;
}

/** Frame with its axis at `angle` radians from y. Quarter turns are exact. */
export function frameAt(origin: Point, angle: number): Frame {
	const quarter = angle / (Math.PI / 2);
	const whole = Math.round(quarter);
	if (Math.abs(quarter - whole) < 1e-15) return { origin, ...quarterTurns[((whole % 4) + 4) % 4]! };
	return { origin, cos: Math.cos(angle), sin: Math.sin(angle) };
}

const quarterTurns = [
	{ cos: 1, sin: 0 },
	{ cos: 0, sin: 1 },
	{ cos: -1, sin: 0 },
	{ cos: 0, sin: -1 }
] as const;

export const alongOf = ({ origin, cos, sin }: Frame, { y, z }: Point): number =>
	cos * (y - origin.y) + sin * (z - origin.z);

export const acrossOf = ({ origin, cos, sin }: Frame, { y, z }: Point): number =>
	-sin * (y - origin.y) + cos * (z - origin.z);

/** Back to the section's own coordinates. */
export const pointIn = ({ origin, cos, sin }: Frame, along: number, across: number): Point => ({
	y: origin.y + cos * along - sin * across,
	z: origin.z + sin * along + cos * across
});
