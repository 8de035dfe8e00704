import { interactionPoints } from '$lib/engine/response/interaction';
import { strengthBasisSchema } from './code';
import { must } from './describe';
import { envelopeFields } from './envelope';
import { oneOf, wholeWithin, within } from './fields';
import { ranges } from './ranges';
import { namesOneTarget, targetFields, targetMissing } from './target';
import { z } from './zod';

export const interactionRequestSchema = z
	.object(
		{
			...targetFields,
			strengthBasis: strengthBasisSchema.optional(),
			limit: oneOf('limit', ['first-yield', 'plastic']),
			plane: oneOf('plane', ['N-My', 'N-Mz', 'My-Mz']),
			N: within('Axial force N', 'kN', ranges.force)
				.optional()
				.meta({ 'x-unit': 'kN', description: 'For My-Mz; 0 when absent.' }),
			points: wholeWithin('points', interactionPoints)
				.optional()
				.meta({ description: `Entries of the loop; ${interactionPoints.usual} when absent.` })
		},
		{ error: must('The request', 'an object with section or shapeId, limit and plane') }
	)
	.refine(namesOneTarget, targetMissing)
	.meta({ id: 'InteractionRequest' });

export type InteractionRequest = z.infer<typeof interactionRequestSchema>;

const force = (unit: string) => z.number().meta({ 'x-unit': unit });

export const interactionAnswerSchema = z
	.object({
		...envelopeFields,
		points: z.array(z.object({ N: force('kN'), My: force('kNm'), Mz: force('kNm') })).meta({
			description:
				'A closed loop: the last point repeats the first. Every point lies on the curve; the moment that is not in the plane is zero.'
		})
	})
	.meta({ id: 'InteractionAnswer' });

export type InteractionAnswer = z.infer<typeof interactionAnswerSchema>;
