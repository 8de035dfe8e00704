import { z } from './zod';

export const issueSchema = z
	.object({ path: z.string(), message: z.string() })
	.meta({ id: 'Issue', description: 'One thing wrong: a dotted path and a sentence.' });

/** Every refusal has this shape, whatever its status. */
export const errorSchema = z
	.object({
		error: z.object({
			code: z.string(),
			message: z.string(),
			issues: z.array(issueSchema).optional(),
			id: z.string().optional().meta({ description: 'Ties a 500 to the log.' })
		})
	})
	.meta({ id: 'Error' });

export type ErrorBody = z.infer<typeof errorSchema>;
export type ApiError = ErrorBody['error'] & { status: number };
