import { strengthBasisSchema } from './code';
import { z } from './zod';

export const noteSchema = z
	.object({ code: z.string(), message: z.string(), clause: z.string().optional() })
	.meta({ id: 'Note', description: 'Why a figure is absent or must be read with care.' });

/** What every computed answer carries. */
export const envelopeFields = {
	contract: z.literal(1),
	engineVersion: z.string(),
	strengthBasis: strengthBasisSchema,
	notes: z.array(noteSchema)
};
