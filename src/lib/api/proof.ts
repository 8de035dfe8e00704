import { strict } from './fields';
import { limits } from './limits';
import { z } from './zod';

export const proofFamilySchema = z.enum(
	[
		'catalogue',
		'section-properties',
		'classification',
		'effective',
		'shear',
		'resistance',
		'interaction',
		'bending',
		'closed-form'
	],
	{ error: 'family must be one of those that the answer counts.' }
);

const value = z.union([z.number(), z.string()]);

/** One published value held against the engine's own. */
export const proofCheckSchema = z
	.object({
		id: z.string(),
		family: proofFamilySchema,
		source: z.string(),
		standard: z.string(),
		clause: z.string().nullable(),
		fromMemory: z.boolean().meta({ description: 'Written down without the source at hand.' }),
		memoryConfidence: z.enum(['high', 'medium']).nullable(),
		case: z.string(),
		quantity: z.string(),
		unit: z.string().meta({ description: 'Of both values; empty for plain numbers and words.' }),
		published: value,
		printed: z.string(),
		ours: value.nullable().meta({ description: 'Null where the engine gives no figure.' }),
		difference: z.number().nullable().meta({ description: 'Ours less published, in the unit.' }),
		relativeDifference: z.number().nullable(),
		allowed: z
			.number()
			.nullable()
			.meta({ description: 'Largest size of the difference that passes, in the unit.' }),
		tolerance: z.enum(['exact', 'relative', 'absolute', 'relative-or-half-digit']),
		why: z.string().meta({ description: 'Why that much is allowed.' }),
		use: z
			.number()
			.nullable()
			.meta({ description: 'Size of the difference over what is allowed.' }),
		pass: z.boolean(),
		remark: z.string().nullable()
	})
	.meta({ id: 'ProofCheck', description: 'A published value and the engine’s own.' });

export const proofFamilyCountSchema = z
	.object({
		family: proofFamilySchema,
		title: z.string(),
		values: z.int(),
		passed: z.int(),
		failed: z.int(),
		fromMemory: z.int()
	})
	.meta({ id: 'ProofFamilyCount' });

export const proofListSchema = z
	.object({
		engineVersion: z.string(),
		families: z
			.array(proofFamilyCountSchema)
			.meta({ description: 'Counts of all values, whatever the query asks for.' }),
		items: z.array(proofCheckSchema),
		total: z.int(),
		page: z.int(),
		pageSize: z.int()
	})
	.meta({ id: 'ProofList' });

const whole = (title: string, most: number, absent: number) => {
	const error = `${title} must be a whole number from 1 to ${most}.`;
	return z.coerce
		.number({ error })
		.int({ error })
		.min(1, { error })
		.max(most, { error })
		.default(absent);
};

/** What of the published values is asked for; an unknown parameter is refused. */
export const proofQuerySchema = strict('The query', {
	q: z
		.string()
		.max(limits.name, { error: 'q may have at most 80 characters.' })
		.default('')
		.meta({ description: 'Words that the case, source, quantity or clause must all have.' }),
	family: proofFamilySchema.optional(),
	standard: z.string().max(limits.name).optional(),
	memory: z
		.enum(['only', 'without'], { error: 'memory must be only or without.' })
		.optional()
		.meta({ description: 'Only what was written down from memory, or only the rest.' }),
	result: z.enum(['passed', 'failed'], { error: 'result must be passed or failed.' }).optional(),
	sort: z
		.enum(['difference'], { error: 'sort must be difference.' })
		.optional()
		.meta({ description: 'What uses most of its tolerance first; failures before all.' }),
	page: whole('page', 1_000_000, 1),
	pageSize: whole('pageSize', limits.pageSize, 50)
});

export type ProofFamily = z.infer<typeof proofFamilySchema>;
export type ProofCheck = z.infer<typeof proofCheckSchema>;
export type ProofFamilyCount = z.infer<typeof proofFamilyCountSchema>;
export type ProofList = z.infer<typeof proofListSchema>;
export type ProofQuery = z.infer<typeof proofQuerySchema>;
