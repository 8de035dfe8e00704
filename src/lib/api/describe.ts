/** The part of a zod issue that a sentence needs. */
interface RawIssue {
	readonly code?: string;
	readonly input?: unknown;
	readonly keys?: readonly string[];
}

const longest = 40;

/** A value as a person would read it in a sentence. */
export const shown = (value: unknown): string => {
	if (value === undefined) return 'nothing';
	if (Array.isArray(value)) return 'a list';
	if (typeof value === 'object' && value !== null) return 'an object';
	const text = typeof value === 'number' ? String(value) : JSON.stringify(value);
	return text.length > longest ? `${text.slice(0, longest)}…` : text;
};

/** Says what a field must be: `Web thickness (tw) must be a number in mm, not "12".` */
export const must = (title: string, be: string) => (issue: RawIssue) =>
	issue.input === undefined
		? `${title} is missing: it must be ${be}.`
		: `${title} must be ${be}, not ${shown(issue.input)}.`;

const changesBetween = (a: string, b: string): number => {
	let row = Array.from({ length: b.length + 1 }, (_, i) => i);
	for (let i = 1; i <= a.length; i++) {
		const next = [i];
		for (let j = 1; j <= b.length; j++) {
			const swap = (row[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1);
			next.push(Math.min(swap, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1));
		}
		row = next;
	}
	return row[b.length] ?? 0;
};

/** The word most like the one given, or null when none is near. */
export const nearestWord = (word: string, words: readonly string[]): string | null => {
	const ranked = words
		.map((known) => ({ known, changes: changesBetween(word.toLowerCase(), known.toLowerCase()) }))
		.sort((a, b) => a.changes - b.changes);
	const best = ranked[0];
	return best && best.changes <= Math.max(1, Math.floor(best.known.length / 3)) ? best.known : null;
};

const unknownField = (key: string, fields: readonly string[]) => {
	const near = nearestWord(key, fields);
	return near ? `"${key}" is not known (did you mean "${near}"?)` : `"${key}" is not known`;
};

/** For objects that take no field but their own. `title` reads like "An I section". */
export const mustHold = (title: string, fields: readonly string[]) => (issue: RawIssue) => {
	if (issue.code !== 'unrecognized_keys')
		return must(title, `an object with ${fields.join(', ')}`)(issue);
	const wrong = (issue.keys ?? []).map((key) => unknownField(key, fields)).join(', ');
	return `${title} takes ${fields.join(', ')}; ${wrong}.`;
};
