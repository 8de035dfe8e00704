import type { Note } from '../../../engine/result';

type Fields = Readonly<Record<string, unknown>>;

const isObject = (value: unknown): value is Fields =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

const note = (path: string): Note => ({
	code: 'ignored_field',
	message: `"${path}" is not a field of this request and was ignored.`
});

const unknownKeys = (body: unknown, known: Fields, before: string): Note[] =>
	isObject(body)
		? Object.keys(body)
				.filter((key) => !(key in known))
				.map((key) => note(before + key))
		: [];

/** Fields of an object (path given) that its schema does not know: accepted, but not unseen. */
export type KnownFields = Readonly<{ self: Fields } & Record<string, Fields>>;

/**
 * A note for every field of the request that nothing reads: at the top (`self`), and inside the
 * named objects or lists of objects.
 */
export const ignoredFields = (body: unknown, known: KnownFields): Note[] => {
	if (!isObject(body)) return [];
	const inner = Object.entries(known)
		.filter(([name]) => name !== 'self')
		.flatMap(([name, fields]) => {
			const value = body[name];
			return Array.isArray(value)
				? value.flatMap((one, i) => unknownKeys(one, fields, `${name}.${i}.`))
				: unknownKeys(value, fields, `${name}.`);
		});
	return [...unknownKeys(body, known.self, ''), ...inner];
};
