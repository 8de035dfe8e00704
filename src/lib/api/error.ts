import { z } from './zod';

const mm = z.number().meta({ description: "mm from the definition's origin" });

const mendSchema = z
	.object({
		words: z.string(),
		path: z.string(),
		changes: z.array(z.object({ plate: z.string(), y: mm, z: mm }))
	})
	.meta({
		description: 'A change that has been tried and solves it: plates with their new centres.'
	});

export const issueSchema = z
	.object({
		path: z.string(),
		message: z.string(),
		mend: mendSchema.optional(),
		at: z.object({ y: mm, z: mm }).optional().meta({ description: 'Where it is.' })
	})
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
