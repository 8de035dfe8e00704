import type { GradeDefinition, LawDefinition } from '$lib/engine/material/material';
import { must } from './describe';
import { listOf, oneOf, strict, text, within } from './fields';
import { limits } from './limits';
import { ranges } from './ranges';
import { z } from './zod';

const strength = (title: string) => within(title, 'N/mm²', ranges.strength);
const curve = (title: string) =>
	listOf(
		title,
		z.tuple(
			[within('Strain', '', ranges.curveStrain), within('Stress', 'N/mm²', ranges.curveStress)],
			{
				error: must('A point of the curve', 'a pair [strain, stress]')
			}
		),
		limits.curvePoints
	);

const strainLimit = within('strainLimit', '', ranges.strainLimit)
	.optional()
	.meta({ description: 'No fibre is followed beyond this strain, in either sense.' });

const lawKinds = [
	strict('An elastic–plastic law', { type: z.literal('elastic-plastic'), strainLimit }),
	strict('A bilinear law', {
		type: z.literal('bilinear'),
		Eh: within('Hardening modulus Eh', 'N/mm²', ranges.hardening),
		fu: strength('Tensile strength fu').optional(),
		strainLimit
	}),
	strict('A quad-linear law', { type: z.literal('quad-linear'), strainLimit }),
	strict('A Ramberg–Osgood law', {
		type: z.literal('ramberg-osgood'),
		n: within('Exponent n', '', ranges.exponent),
		m: within('Exponent m', '', ranges.exponent).optional(),
		epsilonU: within('Ultimate strain epsilonU', '', ranges.strainLimit).optional(),
		stages: z
			.union([z.literal(1), z.literal(2)], { error: must('stages', '1 or 2') })
			.optional()
			.meta({ description: 'Two where fu is known (stainless), one throughout (aluminium).' }),
		variant: oneOf('variant', ['EN1993-1-4:2006', 'later'])
			.optional()
			.meta({ description: 'm = 1 + 3.5 f0.2/fu, or 1 + 2.8 f0.2/fu in the later one.' }),
		family: oneOf('family', ['austenitic', 'duplex', 'ferritic']).optional(),
		strainLimit
	}),
	strict('A law by curve', {
		type: z.literal('curve'),
		tension: curve('tension'),
		compression: curve('compression').optional(),
		beyond: oneOf('beyond', ['flat', 'zero']),
		strainLimit
	})
] as const;

const lawNames = lawKinds.map((kind) => [...kind.shape.type.values][0]).join(', ');
const typeOf = (input: unknown) =>
	typeof input === 'object' && input !== null && 'type' in input ? input.type : input;

/** Stress–strain law; strengths come from the grade. */
export const lawSchema = z
	.discriminatedUnion('type', lawKinds, {
		error: (issue) => must('The type of law', `one of ${lawNames}`)({ input: typeOf(issue.input) })
	})
	.meta({ id: 'Law', description: 'Stress–strain law; elastic–perfectly plastic when absent.' });

const strengths = strict('A grade', {
	fy: strength('Yield strength fy'),
	fyc: strength('Yield strength in compression fyc').optional(),
	fu: strength('Tensile strength fu').optional(),
	E: within('Modulus of elasticity E', 'N/mm²', ranges.modulus).optional(),
	density: within('Density', 'kg/m³', ranges.density).optional(),
	law: lawSchema.optional()
});

/** A name such as "S355", a plain fy in N/mm² at any thickness, or strengths in full. */
export const gradeSchema = z
	.union([text('Name of a grade', limits.name), strength('Grade, a number fy,'), strengths], {
		error: must('Grade', 'a name such as "S355", a number fy in N/mm², or an object with fy')
	})
	.meta({
		id: 'Grade',
		description:
			'A name such as "S355"; a plain number, meaning fy in N/mm² at any thickness; or strengths in full. Density 7850 kg/m³ and E as the code says unless given.'
	});

type Holds<T extends true> = T;
type Fits<A, B> = A extends B ? true : false;
/** The schemas give what the engine takes; a difference is a compile error. */
export type GradeFitsEngine = [
	Holds<Fits<z.infer<typeof gradeSchema>, GradeDefinition>>,
	Holds<Fits<z.infer<typeof lawSchema>, LawDefinition>>
];
