import { strengthBasisSchema } from './code';
import { must } from './describe';
import { envelopeFields } from './envelope';
import { listOf, oneOf, strict, within } from './fields';
import { lawSchema } from './grade';
import { limits } from './limits';
import { ranges } from './ranges';
import { namesOneTarget, targetFields, targetMissing } from './target';
import { z } from './zod';

const strainPlane = strict('A strain plane', {
	e0: within('Strain at the centroid e0', '', ranges.strain),
	ky: within('Curvature ky', '1/m', ranges.curvature),
	kz: within('Curvature kz', '1/m', ranges.curvature)
});

const atFields = (most: number) => ({
	curvature: listOf('curvature', within('A curvature', '1/m', ranges.curvature), most).optional(),
	moment: listOf('moment', within('A moment', 'kNm', ranges.moment), most).optional(),
	curvatureRatio: listOf(
		'curvatureRatio',
		within('A curvature ratio', '', ranges.curvatureRatio),
		most
	).optional(),
	strainPlanes: listOf('strainPlanes', strainPlane, most).optional()
});

const atSchema = (title: string, most: number) =>
	strict(title, atFields(most)).refine((at) => Object.keys(at).length === 1, {
		error: `${title} takes exactly one of curvature, moment, curvatureRatio, strainPlanes.`
	});

export const responseRequestSchema = z
	.object(
		{
			...targetFields,
			strengthBasis: strengthBasisSchema.optional(),
			axisAngle: within('axisAngle', 'degrees', ranges.angle).optional(),
			transverse: oneOf('transverse', ['curvature-zero', 'moment-zero']).optional(),
			N: within('Axial force N', 'kN', ranges.force).optional(),
			at: atSchema('at', limits.states).meta({
				id: 'At',
				description:
					'Exactly one of the four; curvatureRatio is curvature over that at first yield.'
			}),
			law: lawSchema.optional().meta({ description: 'Takes the place of every part’s own law.' }),
			residual: oneOf('residual', ['none', 'rolled', 'welded']).optional(),
			unloadFrom: atSchema('unloadFrom', 1).optional()
		},
		{ error: must('The request', 'an object with section or shapeId, and at') }
	)
	.refine(namesOneTarget, targetMissing)
	.meta({ id: 'ResponseRequest' });

export type ResponseRequest = z.infer<typeof responseRequestSchema>;

const figure = (unit: string) => z.number().nullable().meta({ 'x-unit': unit });
const resultant = z.object({
	force: z.number().meta({ 'x-unit': 'kN' }),
	y: z.number().meta({ 'x-unit': 'mm' }),
	z: z.number().meta({ 'x-unit': 'mm' })
});

export const stateSchema = z
	.object({
		curvature: figure('1/m'),
		curvatureRatio: figure(''),
		moment: figure('kNm'),
		N: figure('kN'),
		My: figure('kNm'),
		Mz: figure('kNm'),
		e0: figure(''),
		ky: figure('1/m'),
		kz: figure('1/m'),
		neutralAxis: z.object({ distance: z.number(), angle: z.number() }).nullable(),
		yieldedShare: figure(''),
		extremes: z
			.object({
				strainMin: z.number(),
				strainMax: z.number(),
				stressMin: z.number(),
				stressMax: z.number()
			})
			.nullable(),
		compression: resultant.nullable(),
		tension: resultant.nullable(),
		leverArm: figure('mm'),
		converged: z.boolean()
	})
	.meta({
		id: 'State',
		description: 'A state that cannot exist has converged false and null figures.'
	});

export const responseAnswerSchema = z
	.object({
		...envelopeFields,
		states: z.array(stateSchema),
		firstYield: z.object({ curvature: figure('1/m'), moment: figure('kNm') }),
		plasticMoment: figure('kNm')
	})
	.meta({ id: 'ResponseAnswer' });

export type ResponseAnswer = z.infer<typeof responseAnswerSchema>;
