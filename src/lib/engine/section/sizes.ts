import type { Issue } from '../result';
import { sizeLimits } from '../tolerances';

/** Name of a field in a sentence, and whether it may be 0 (radii, welds) or left out. */
export interface SizeField {
	readonly path: string;
	readonly name: string;
	readonly value: unknown;
	readonly mayBeZero?: boolean;
	readonly optional?: boolean;
}

const shown = (value: number): string => String(Number(value.toPrecision(6)));

/** A length for a sentence: at most six digits, with its unit. */
export const millimetres = (value: number): string => `${shown(value)} mm`;

export const needed = (path: string, name: string, value: unknown): SizeField => ({
	path,
	name,
	value
});
export const optional = (path: string, name: string, value: unknown): SizeField => ({
	path,
	name,
	value,
	optional: true
});
/** A radius or weld: may be 0 or absent. */
export const radius = (path: string, name: string, value: unknown): SizeField => ({
	path,
	name,
	value,
	optional: true,
	mayBeZero: true
});

/** One issue for every size that is missing, no number, or outside 0.01 mm to 100 m. */
export function sizeIssues(fields: readonly SizeField[]): Issue[] {
	return fields.flatMap((field) => {
		const message = sizeMessage(field);
		return message === null ? [] : [{ path: field.path, message }];
	});
}

function sizeMessage({ name, value, mayBeZero, optional }: SizeField): string | null {
	if (value === undefined || value === null) return optional ? null : `${name} is missing.`;
	if (typeof value !== 'number' || !Number.isFinite(value)) return `${name} must be a number.`;
	if (mayBeZero && value === 0) return null;
	if (value < 0 && mayBeZero) return `${name} must be 0 or more, not ${shown(value)}.`;
	if (value <= 0) return `${name} must be greater than 0.`;
	if (value < sizeLimits.least && !mayBeZero)
		return `${name} must be at least ${millimetres(sizeLimits.least)}, not ${shown(value)}.`;
	if (value > sizeLimits.most)
		return `${name} must be at most ${millimetres(sizeLimits.most)}, not ${shown(value)}.`;
	return null;
}

/** A condition between sizes that must hold, and what to say when it does not. */
export type Condition = readonly [holds: boolean, path: string, message: string];

/** Issues of the conditions that fail. */
export const conditionIssues = (conditions: readonly Condition[]): Issue[] =>
	conditions.flatMap(([holds, path, message]) => (holds ? [] : [{ path, message }]));

/** `a` is no more than `b`, give or take rounding of sums and differences. */
export const fits = (a: number, b: number): boolean =>
	a <= b + 1e-12 * Math.max(Math.abs(a), Math.abs(b));
