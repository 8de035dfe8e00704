import { issuesOf } from '../../api/issues';
import type { z } from '../../api/zod';
import { fail, ok, type Result } from '../../engine/result';

/** What is wrong with each field of a form, one sentence a field. */
export type FieldFaults = Record<string, string>;

const faultsOf = (error: z.ZodError): FieldFaults => {
	const faults: FieldFaults = {};
	for (const { path, message } of issuesOf(error)) faults[path] ??= message;
	return faults;
};

/** The text fields of a posted form by its schema, or what is wrong with each; files are ignored. */
export const formFields = async <S extends z.ZodType>(
	request: Request,
	schema: S
): Promise<Result<z.infer<S>, { faults: FieldFaults; given: Record<string, string> }>> => {
	const form = await request.formData();
	const entries = [...form].filter(
		(entry): entry is [string, string] => typeof entry[1] === 'string'
	);
	const given = Object.fromEntries(entries);
	const parsed = schema.safeParse(given);
	if (parsed.success) return ok(parsed.data);
	const { password: _password, again: _again, token: _token, ...shown } = given;
	return fail({ faults: faultsOf(parsed.error), given: shown });
};
