import type { Issue } from '../result';
import { coordinateLimit } from '../tolerances';

/** A coordinate must be a number no further than 1 km from the origin. */
export function coordinateIssues(path: string, name: string, value: unknown): Issue[] {
	if (typeof value !== 'number' || !Number.isFinite(value))
		return [{ path, message: `${name} must be a number.` }];
	if (Math.abs(value) <= coordinateLimit) return [];
	return [
		{ path, message: `${name} must be within ${coordinateLimit} mm of the origin, not ${value}.` }
	];
}
