import { issuesOf } from '../../api/issues';
import type { z } from '../../api/zod';
import { fail, ok, type Result } from '../../engine/result';
import { invalid, type Refusal } from './refusal';

/** The request as its schema has it, or a 400 that names every field that is wrong. */
export const parsed = <S extends z.ZodType>(
	schema: S,
	input: unknown
): Result<z.infer<S>, Refusal> => {
	const result = schema.safeParse(input);
	return result.success ? ok(result.data) : fail(invalid(issuesOf(result.error)));
};
