import { z } from './zod';

/** Resistances beside a demand’s own N and V. */
export const reducedSchema = z.object({
	MyVRd: z.number().optional().meta({ 'x-unit': 'kNm' }),
	MzVRd: z.number().optional().meta({ 'x-unit': 'kNm' }),
	MyNRd: z.number().optional().meta({ 'x-unit': 'kNm', description: 'By the code’s formula.' }),
	MyNRdExact: z.number().optional().meta({
		'x-unit': 'kNm',
		description: 'The exact plastic block under the same N.'
	}),
	MzNRd: z.number().optional().meta({ 'x-unit': 'kNm' }),
	MzNRdExact: z.number().optional().meta({ 'x-unit': 'kNm' }),
	MNRd: z.number().optional().meta({
		'x-unit': 'kNm',
		description: 'Plastic block along the moment’s own direction beside N.'
	}),
	MNVRd: z.number().optional().meta({ 'x-unit': 'kNm' }),
	NVRd: z.number().optional().meta({ 'x-unit': 'kN' }),
	alpha: z.number().optional(),
	beta: z.number().optional(),
	deltaMy: z.number().optional().meta({ 'x-unit': 'kNm' }),
	deltaMz: z.number().optional().meta({ 'x-unit': 'kNm' }),
	MbRd: z.number().optional().meta({ 'x-unit': 'kNm' }),
	Mcr: z.number().optional().meta({ 'x-unit': 'kNm' }),
	lambdaLT: z.number().optional(),
	chiLT: z.number().optional(),
	VbRd: z.number().optional().meta({ 'x-unit': 'kN' })
});
