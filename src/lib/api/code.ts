import type { CodeChoice } from '$lib/engine/rules/result';
import { must } from './describe';
import { oneOf, strict, within } from './fields';
import { ranges } from './ranges';
import { z } from './zod';

const factor = (title: string) => within(title, '', ranges.partialFactor);

const shearEta = z
	.number({ error: must('eta', '1 or 1.2') })
	.refine((value) => [1, 1.2].includes(value), { error: must('eta', '1 or 1.2') })
	.meta({ title: 'eta', enum: [1, 1.2] });

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
export const codeSchema = strict('code', {
	standard: standardSchema.optional(),
	strengthBasis: strengthBasisSchema.optional(),
	gammaM0: factor('gammaM0').optional(),
	gammaM1: factor('gammaM1').optional(),
	gammaM2: factor('gammaM2').optional(),
	eta: shearEta.optional(),
	method: oneOf('method', ['LRFD', 'ASD']).optional(),
	classAlpha: oneOf('classAlpha', ['actual-N', 'proportional']).optional(),
	allowEffectiveClass2: z
		.boolean({ error: must('allowEffectiveClass2', 'true or false') })
		.optional(),
	useStressLevel: z.boolean({ error: must('useStressLevel', 'true or false') }).optional(),
	ltbCurves: oneOf('ltbCurves', ['general', 'rolled-or-equivalent']).optional()
}).meta({ id: 'Code', description: 'Code of practice and the choices it leaves open.' });

/** The code's fields all fit what the engine takes; a difference is a compile error. */
export const codeChoiceOf = ({
	strengthBasis: _basis,
	...choice
}: z.infer<typeof codeSchema>): Partial<CodeChoice> => choice;
