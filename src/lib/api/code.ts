import type { CodeChoice } from '$lib/engine/rules/result';
import { must } from './describe';
import { oneOf, quantity } from './fields';
import { z } from './zod';

const factor = (title: string) =>
	quantity(title, '').refine((value) => value > 0, {
		error: (issue) => `${title} must be greater than 0, not ${String(issue.input)}.`
	});

export const strengthBasisSchema = oneOf('strengthBasis', ['code-table', 'product-standard']);

export const standardSchema = oneOf('standard', [
	'EN1993-1-1:2005',
	'EN1993-1-1:2022',
	'AISC360-22',
	'CSA-S16:19',
	'AS4100',
	'IS800'
]);

/** The code of practice and the choices it leaves open; what is absent takes its default. */
export const codeSchema = z
	.object(
		{
			standard: standardSchema.optional(),
			strengthBasis: strengthBasisSchema.optional(),
			gammaM0: factor('gammaM0').optional(),
			gammaM1: factor('gammaM1').optional(),
			gammaM2: factor('gammaM2').optional(),
			eta: factor('eta').optional(),
			method: oneOf('method', ['LRFD', 'ASD']).optional(),
			classAlpha: oneOf('classAlpha', ['actual-N', 'proportional']).optional(),
			allowEffectiveClass2: z
				.boolean({ error: must('allowEffectiveClass2', 'true or false') })
				.optional()
		},
		{ error: must('code', 'an object with a standard') }
	)
	.meta({ id: 'Code', description: 'Code of practice and the choices it leaves open.' });

/** The code's fields all fit what the engine takes; a difference is a compile error. */
export const codeChoiceOf = ({
	strengthBasis: _basis,
	...choice
}: z.infer<typeof codeSchema>): Partial<CodeChoice> => choice;
