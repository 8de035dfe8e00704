import { createHash } from 'node:crypto';

const canonical = (value: unknown): unknown => {
	if (Array.isArray(value)) return value.map(canonical);
	if (typeof value !== 'object' || value === null) return value;
	return Object.fromEntries(
		Object.entries(value)
			.filter(([, inner]) => inner !== undefined)
			.sort(([a], [b]) => (a < b ? -1 : 1))
			.map(([key, inner]) => [key, canonical(inner)])
	);
};

/**
 * SHA-256 of inputs written as JSON with sorted keys: equal inputs give equal hashes whatever the
 * order of their fields.
 */
export const inputHash = (inputs: unknown): string =>
	createHash('sha256')
		.update(JSON.stringify(canonical(inputs)))
		.digest('hex');
