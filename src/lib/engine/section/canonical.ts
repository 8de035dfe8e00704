import { sha256 } from './sha256';

/**
 * JSON that depends on what a value says, not on how it was built: keys sorted, absent fields left
 * out, −0 as 0, and 1.0, 1e0 and 1 alike. Numbers that are no numbers become null, as in JSON.
 */
export function canonicalJson(value: unknown): string {
	return JSON.stringify(ordered(value)) ?? 'null';
}

function ordered(value: unknown): unknown {
	if (typeof value === 'number') return value === 0 ? 0 : value;
	if (Array.isArray(value)) return value.map(ordered);
	if (typeof value !== 'object' || value === null) return value;
	const entries = Object.entries(value).filter(([, field]) => field !== undefined);
	const sorted = entries.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
	return Object.fromEntries(sorted.map(([key, field]) => [key, ordered(field)]));
}

/** Hash of inputs, 64 hexadecimal digits; equal inputs give equal hashes in browser and server. */
export const inputHash = (value: unknown): string => sha256(canonicalJson(value));
