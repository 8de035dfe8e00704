import type { Demand } from '$lib/engine/rules/result';
import { must } from './describe';
import { quantity, text } from './fields';
import { limits } from './limits';
import { z } from './zod';

/** Factored design effects; tension positive, My positive puts the bottom in tension. */
export const demandSchema = z
	.object(
		{
			name: text('Name of a demand', limits.name).optional(),
			N: quantity('Axial force N', 'kN').optional(),
			My: quantity('Moment My', 'kNm').optional(),
			Mz: quantity('Moment Mz', 'kNm').optional(),
			Vy: quantity('Shear Vy', 'kN').optional(),
			Vz: quantity('Shear Vz', 'kN').optional(),
			unbracedLength: quantity('Unbraced length', 'mm').optional(),
			C1: quantity('Moment factor C1', '').optional(),
			zg: quantity('Height of the load above the shear centre zg', 'mm').optional()
		},
		{ error: must('A demand', 'an object with N, My, Mz, Vy, Vz') }
	)
	.meta({
		id: 'Demand',
		description:
			'Factored design effects. Tension positive; My positive puts the bottom in tension, Mz positive the right.'
	}) satisfies z.ZodType<Demand>;
