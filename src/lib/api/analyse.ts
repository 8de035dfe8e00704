import { codeSchema, standardSchema } from './code';
import { demandSchema } from './demand';
import { must } from './describe';
import { effectiveSchema } from './effective';
import { envelopeFields, noteSchema } from './envelope';
import { listOf } from './fields';
import { grossSchema } from './gross';
import { limits } from './limits';
import { reducedSchema } from './reduced';
import { stiffenersSchema } from './stiffeners';
import { namesOneTarget, targetFields, targetMissing } from './target';
import { torsionSchema } from './torsion';
import { z } from './zod';

export const analyseRequestSchema = z
	.object(
		{
			...targetFields,
			code: codeSchema.optional(),
			demand: demandSchema.optional(),
			demands: listOf('demands', demandSchema, limits.demands).optional(),
			numericalTorsion: z
				.boolean({ error: must('numericalTorsion', 'true or false') })
				.optional()
				.meta({ description: 'Solve torsion numerically too; outlines and plates always are.' }),
			stiffeners: stiffenersSchema.optional()
		},
		{ error: must('The request', 'an object with section or shapeId') }
	)
	.refine(namesOneTarget, targetMissing)
	.meta({ id: 'AnalyseRequest' });

export type AnalyseRequest = z.infer<typeof analyseRequestSchema>;

const figure = (unit: string) => z.number().nullable().meta({ 'x-unit': unit });
const sectionClass = z.union([
	z.literal([1, 2, 3, 4]),
	z.enum(['compact', 'noncompact', 'slender'])
]);

const classBasis = z.enum(['+My', '−My', 'N', 'demand']);
const resistanceBasis = z.enum([
	'plastic',
	'effective-class-2',
	'interpolated',
	'elastic',
	'effective'
]);

const momentSchema = z.object({
	firstYieldY: figure('kNm'),
	firstYieldZ: figure('kNm'),
	plasticY: figure('kNm'),
	plasticZ: figure('kNm'),
	plasticNeutralAxisZ: figure('mm'),
	plasticNeutralAxisY: figure('mm'),
	shapeFactorY: figure(''),
	shapeFactorZ: figure('')
});

const elementSchema = z.object({
	part: z.string(),
	element: z
		.string()
		.optional()
		.meta({ description: 'Which element of the part is the worst: `topFlange.left`.' }),
	type: z.enum(['internal', 'outstand', 'tubular', 'angle']),
	stress: z.enum(['compression', 'bending', 'combined', 'tension']),
	c: z.number().meta({ 'x-unit': 'mm' }),
	t: z.number().meta({ 'x-unit': 'mm' }),
	slenderness: z.number(),
	epsilon: z.number(),
	alpha: z.number().optional(),
	psi: z.number().optional(),
	limits: z.array(z.number()),
	class: sectionClass,
	clause: z.string()
});

const classificationSchema = z.object({
	standard: standardSchema,
	overall: sectionClass,
	basis: classBasis,
	elements: z.array(elementSchema),
	governing: z.string(),
	byCase: z.object({
		plusMy: sectionClass.nullable(),
		minusMy: sectionClass.nullable(),
		plusMz: sectionClass.nullable(),
		minusMz: sectionClass.nullable(),
		compression: sectionClass.nullable()
	})
});

const checkSchema = z.object({
	demand: z.string(),
	name: z.string(),
	clause: z.string(),
	value: z.number(),
	limit: z.number(),
	utilisation: z.number().meta({ description: 'value / limit' })
});

const resistanceSchema = z.object({
	standard: standardSchema,
	basis: resistanceBasis,
	MyRd: figure('kNm'),
	MyRdNegative: figure('kNm'),
	MzRd: figure('kNm'),
	NRd: figure('kN'),
	NtRd: figure('kN'),
	VyRd: figure('kN'),
	VzRd: figure('kN'),
	VbRd: figure('kN').optional(),
	MbRd: figure('kNm').optional(),
	MyVRd: figure('kNm').optional(),
	MyNRd: figure('kNm').optional(),
	MzNRd: figure('kNm').optional(),
	checks: z.array(checkSchema),
	utilisation: z
		.object({ governing: z.string(), value: z.number() })
		.nullable()
		.meta({ description: 'Null when a check that applies is missing.' })
});

const limitedBy = z.enum([
	'section',
	'shear',
	'web-shear',
	'lateral-torsional',
	'flange-induced-buckling'
]);

const elasticSchema = z.object({
	value: z.number().meta({ description: '√(σ² + 3τ²)/fyd, for information' }),
	part: z.string(),
	sigma: z.number().meta({ 'x-unit': 'N/mm²' }),
	tau: z.number().meta({ 'x-unit': 'N/mm²' })
});

const rulerFields = {
	axisAngle: z.number().meta({ 'x-unit': '°', description: 'Axis of the moment, from y.' }),
	countable: figure('kNm'),
	firstYield: figure('kNm'),
	fullPlastic: figure('kNm')
};

const token = z.union([
	z.object({ text: z.string() }),
	z.object({
		quantity: z.enum(['moment', 'force']),
		value: z.number(),
		figure: z.string().optional()
	}),
	z.object({
		quantity: z.literal('ratio'),
		value: z.number(),
		decimals: z.number(),
		figure: z.string()
	})
]);

const verdictSchema = z.object({
	sentence: z.string(),
	detail: z.string(),
	sentenceTokens: z.array(token).meta({ description: 'The sentence with its numbers apart.' }),
	detailTokens: z.array(token),
	countable: z.object({
		moment: figure('kNm'),
		force: figure('kN').meta({ 'x-unit': 'kN', description: 'A size; where N acts alone.' }),
		basis: resistanceBasis.nullable()
	}),
	governing: z.string().nullable(),
	notChecked: z.array(z.string()),
	status: z.enum(['passes', 'fails', 'incomplete', 'no-figure']),
	clear: z.boolean().meta({
		description:
			'Every demand passes and nothing that may apply, member buckling included, is unchecked.'
	}),
	demand: z.string().nullable(),
	ruler: z.object({ ...rulerFields, demand: figure('kNm') })
});

const demandStateSchema = z.object({
	demand: z.string(),
	class: sectionClass,
	governing: z.string(),
	basis: classBasis,
	elements: z.array(elementSchema),
	N: z.number().meta({ 'x-unit': 'kN' }),
	...rulerFields,
	moment: z.number().meta({ 'x-unit': 'kNm' }),
	countableBasis: resistanceBasis.nullable(),
	countableForce: figure('kN').meta({ 'x-unit': 'kN', description: 'A size; where N acts alone.' }),
	limitedBy: limitedBy.nullable(),
	together: z.enum(['alone', 'sum', 'curve', 'fibre']).nullable(),
	besideShear: z.boolean(),
	reduced: reducedSchema.meta({ description: 'Resistances beside this demand’s own N and V.' }),
	elastic: elasticSchema.nullable(),
	withheld: z
		.array(z.string())
		.meta({ description: 'Codes of the missing checks for which nothing is counted.' }),
	utilisation: figure(''),
	missing: z.array(noteSchema).meta({ description: 'Checks that apply and are not built.' })
});

const workingSchema = z.object({
	title: z.string(),
	clause: z.string(),
	edition: z.string(),
	formula: z.string(),
	inputs: z
		.array(
			z.object({
				symbol: z.string(),
				value: z.number(),
				unit: z.string(),
				from: z.string().optional()
			})
		)
		.readonly(),
	result: z.object({ value: z.number(), unit: z.string() }),
	notes: z.array(z.string()).readonly().optional()
});

/** `?explain=1` asks for the workings. */
export const analyseQuerySchema = z.object({
	explain: z
		.enum(['0', '1'])
		.optional()
		.meta({ description: '1: the answer carries `explain`, how each figure came about.' })
});

/** The code and its choices, defaults filled in. */
const codeChosen = z.object({
	standard: standardSchema,
	gammaM0: z.number(),
	gammaM1: z.number(),
	gammaM2: z.number(),
	eta: z.number(),
	method: z.enum(['LRFD', 'ASD']),
	classAlpha: z.enum(['actual-N', 'proportional']),
	allowEffectiveClass2: z.boolean(),
	useStressLevel: z.boolean(),
	ltbCurves: z.enum(['general', 'rolled-or-equivalent'])
});

export const analyseAnswerSchema = z
	.object({
		...envelopeFields,
		code: codeChosen,
		gross: grossSchema,
		torsion: torsionSchema,
		moment: momentSchema,
		squashLoad: figure('kN'),
		classification: classificationSchema.nullable(),
		effective: effectiveSchema.nullable(),
		resistance: resistanceSchema.nullable(),
		demands: z
			.array(demandStateSchema)
			.meta({ description: 'One for each demand, in their order.' }),
		explain: z
			.record(z.string(), workingSchema)
			.optional()
			.meta({ description: 'With ?explain=1: how each figure came about, by its place.' }),
		verdict: verdictSchema.nullable().meta({ description: 'The same in plain words.' })
	})
	.meta({ id: 'AnalyseAnswer' });

export type AnalyseAnswer = z.infer<typeof analyseAnswerSchema>;
