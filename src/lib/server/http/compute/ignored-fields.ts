import { nearestWord } from '../../../api/describe';
import type { Note } from '../../../engine/result';

const noteOf = (field: string, known: readonly string[]): Note => {
	const near = nearestWord(field, known);
	const hint = near ? ` Did you mean "${near}"?` : '';
	return {
		code: 'ignored_field',
		message: `"${field}" is not a field of this request and was ignored.${hint}`
	};
};

/**
 * A note for every field at the top of a request that nothing reads: accepted, but not unseen.
 * Objects inside refuse such fields themselves.
 */
export const ignoredFields = (body: unknown, known: readonly string[]): Note[] =>
	typeof body === 'object' && body !== null
		? Object.keys(body)
				.filter((field) => !known.includes(field))
				.map((field) => noteOf(field, known))
		: [];
