/** Path of the first number that JSON cannot hold, or null. JSON would turn it into null unseen. */
export const nonFinitePath = (value: unknown, path = ''): string | null => {
	if (typeof value === 'number') return Number.isFinite(value) ? null : path;
	if (typeof value !== 'object' || value === null) return null;
	for (const key of Object.keys(value)) {
		const inner = (value as Record<string, unknown>)[key];
		const found = typeof inner === 'string' ? null : nonFinitePath(inner, `${path}.${key}`);
		if (found !== null) return found;
	}
	return null;
};

/** The same question without its answer's path: it is asked of every number of every answer. */
const isFinite = (value: unknown): boolean => {
	if (typeof value === 'number') return Number.isFinite(value);
	if (typeof value !== 'object' || value === null) return true;
	if (Array.isArray(value)) return value.every(isFinite);
	for (const key in value) {
		if (!isFinite((value as Record<string, unknown>)[key])) return false;
	}
	return true;
};

/** JSON of a result. Throws when a number is not finite: that is a bug of ours, never an answer. */
export const finiteJson = (value: unknown): string => {
	if (!isFinite(value))
		throw new Error(`The answer holds a number that is not finite at ${nonFinitePath(value)}`);
	return JSON.stringify(value);
};

/** Answer of a compute route or a list. */
export const answer = (value: unknown, headers: Record<string, string> = {}): Response =>
	new Response(finiteJson(value), {
		headers: { 'content-type': 'application/json; charset=utf-8', ...headers }
	});
