import { strengthBasisSchema } from './code';
import { must } from './describe';
import { envelopeFields } from './envelope';
import { listOf, oneOf, strict, wholeWithin, within } from './fields';
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

const unloadSchema = strict('unloadFrom', {
	...atFields(1),
	N: within('Axial force N', 'kN', ranges.force).optional()
})
	.refine((from) => Object.keys(from).filter((field) => field !== 'N').length === 1, {
		error: 'unloadFrom takes exactly one of curvature, moment, curvatureRatio, strainPlanes.'
	})
	.refine(
		(from) => Object.values(from).every((list) => !Array.isArray(list) || list.length === 1),
		{
			error: 'unloadFrom takes exactly one value: its list is empty.'
		}
	);

const cycleSchema = strict('cycle', {
	moments: listOf('moments', within('A moment', 'kNm', ranges.moment), limits.states).optional(),
	curvatures: listOf(
		'curvatures',
		within('A curvature', '1/m', ranges.curvature),
		limits.states
	).optional(),
	pointsPerLeg: wholeWithin('pointsPerLeg', { least: 1, most: limits.states }).optional()
}).refine(({ moments, curvatures }) => (moments === undefined) !== (curvatures === undefined), {
	error: 'cycle takes exactly one of moments and curvatures.'
});

export const responseRequestSchema = z
	.object(
		{
			...targetFields,
			strengthBasis: strengthBasisSchema.optional(),
			axisAngle: within('axisAngle', 'degrees', ranges.angle).optional(),
			transverse: oneOf('transverse', ['curvature-zero', 'moment-zero']).optional(),
			N: within('Axial force N', 'kN', ranges.force).optional(),
			at: atSchema('at', limits.states).optional().meta({
				id: 'At',
				description:
					'Exactly one of the four; curvatureRatio is curvature over that at first yield. May be left out where a cycle is asked for.'
			}),
			law: lawSchema.optional().meta({ description: 'Takes the place of every part’s own law.' }),
			residual: oneOf('residual', ['none', 'rolled', 'welded']).optional(),
			unloadFrom: unloadSchema.optional().meta({
				description:
					'Loaded to this state under its own N (the request’s, when absent), then released to N and at: the states are what is left.'
			}),
			cycle: cycleSchema.optional().meta({
				description:
					'Reversals, one after the other from rest: each leg answers with pointsPerLeg states (20 when absent), the last at the reversal. unloadFrom and at go on from where the cycle ends.'
			})
		},
		{ error: must('The request', 'an object with section or shapeId, and at or cycle') }
	)
	.refine(namesOneTarget, targetMissing)
	.refine(({ at, cycle }) => at !== undefined || cycle !== undefined, {
		path: ['at'],
		error: must('at', 'an object with one of curvature, moment, curvatureRatio, strainPlanes')
	})
	.meta({ id: 'ResponseRequest' });

export type ResponseRequest = z.infer<typeof responseRequestSchema>;

const figure = (unit: string) => z.number().nullable().meta({ 'x-unit': unit });
const resultant = z.object({
	force: z.number().meta({
		'x-unit': 'kN',
		description: 'Tension positive, so that of the compressed side is negative; both add up to N.'
	}),
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
		neutralAxis: z
			.object({
				distance: z.number().meta({
					'x-unit': 'mm',
					description:
						'From the gross centroid along the normal to the left of the axis (up, at 0°).'
				}),
				angle: z.number().meta({ 'x-unit': '°', description: 'From y, in (−90, 90].' })
			})
			.nullable()
			.meta({ description: 'Line of zero strain; null without curvature.' }),
		yieldedShare: figure('').meta({
			description: 'Share of the area past the first line of its law.'
		}),
		extremes: z
			.object({
				strainMin: z.number(),
				strainMax: z.number(),
				stressMin: z.number().meta({ 'x-unit': 'N/mm²' }),
				stressMax: z.number().meta({ 'x-unit': 'N/mm²' })
			})
			.nullable(),
		compression: resultant.nullable(),
		tension: resultant.nullable(),
		leverArm: figure('mm').meta({ description: 'Distance between the two resultants.' }),
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
		legs: z
			.array(z.object({ states: z.array(stateSchema) }))
			.optional()
			.meta({ description: 'One a reversal of the cycle.' }),
		firstYield: z.object({ curvature: figure('1/m'), moment: figure('kNm') }),
		plasticMoment: figure('kNm'),
		ended: z
			.object({
				reason: z.string(),
				curvature: z.number().meta({ 'x-unit': '1/m' }),
				moment: z.number().meta({ 'x-unit': 'kNm' })
			})
			.optional()
			.meta({
				description:
					'Where a fibre comes to the end of its stress–strain law as the curvature grows; states beyond have converged false.'
			})
	})
	.meta({ id: 'ResponseAnswer' });

export type ResponseAnswer = z.infer<typeof responseAnswerSchema>;
