import type { SectionDefinition } from '$lib/engine/section/definition';
import { codeSchema } from './code';
import { demandSchema } from './demand';
import { must } from './describe';
import { envelopeFields } from './envelope';
import { listOf } from './fields';
import { plateStockSchema } from './firm-settings';
import { limits } from './limits';
import { sectionSchema } from './section';
import { stiffenersSchema } from './stiffeners';
import { namesOneTarget, targetFields, targetMissing } from './target';
import { z } from './zod';

/** POST /api/v1/unlock */
export const unlockRequestSchema = z
	.object(
		{
			...targetFields,
			code: codeSchema.optional(),
			demand: demandSchema.optional(),
			demands: listOf('demands', demandSchema, limits.demands).optional(),
			stiffeners: stiffenersSchema.optional(),
			stock: plateStockSchema
				.optional()
				.meta({ description: 'Plates that changes may use; the default stock when absent.' })
		},
		{ error: must('The request', 'an object with section or shapeId') }
	)
	.refine(namesOneTarget, targetMissing)
	.meta({ id: 'UnlockRequest' });
export type UnlockRequest = z.infer<typeof unlockRequestSchema>;

const figure = (unit: string) => z.number().nullable().meta({ 'x-unit': unit });
const length = z.number().meta({ 'x-unit': 'mm' });

const optionSchema = z.object({
	changes: z.array(z.object({ part: z.string(), field: z.string(), from: length, to: length })),
	class: z.literal([1, 2, 3, 4]),
	basis: z.string(),
	MyRd: figure('kNm'),
	countable: figure('kNm').meta({
		description: 'What may be counted along the moment of the demand that decides, N held.'
	}),
	mass: z.number().meta({ 'x-unit': 'kg/m' }),
	addedMass: z.number().meta({ 'x-unit': 'kg/m', description: 'Negative for less steel.' }),
	utilisation: figure(''),
	section: sectionSchema,
	stiffeners: stiffenersSchema.nullable()
});

export const unlockAnswerSchema = z
	.object({
		...envelopeFields,
		goal: z.enum(['demand', 'class']).nullable().meta({
			description: 'What is asked for: demands met, or a better class. Null: nothing is locked.'
		}),
		options: z.array(optionSchema).meta({ description: 'Least added steel first.' })
	})
	.meta({ id: 'UnlockAnswer' });
type Answer = z.infer<typeof unlockAnswerSchema>;

/** As it is sent; the section is the engine's own definition. */
export type UnlockAnswer = Omit<Answer, 'options'> & {
	options: (Omit<Answer['options'][number], 'section'> & { section: SectionDefinition })[];
};
