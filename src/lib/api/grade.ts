import type { GradeDefinition, LawDefinition } from '$lib/engine/material/material';
import { must } from './describe';
import { listOf, oneOf, quantity, strict } from './fields';
import { limits } from './limits';
import { z } from './zod';

const stress = (title: string) => quantity(title, 'N/mm²');
const curve = (title: string) =>
	listOf(
		title,
		z.tuple([quantity('Strain', ''), stress('Stress')], {
			error: must('A point of the curve', 'a pair [strain, stress]')
		}),
		limits.curvePoints
	);

const lawKinds = [
	strict('An elastic–plastic law', { type: z.literal('elastic-plastic') }),
	strict('A bilinear law', {
		type: z.literal('bilinear'),
		Eh: stress('Hardening modulus Eh'),
		fu: stress('Tensile strength fu').optional()
	}),
	strict('A quad-linear law', { type: z.literal('quad-linear') }),
	strict('A Ramberg–Osgood law', {
		type: z.literal('ramberg-osgood'),
		n: quantity('Exponent n', ''),
		m: quantity('Exponent m', '').optional(),
		epsilonU: quantity('Ultimate strain epsilonU', '').optional()
	}),
	strict('A law by curve', {
		type: z.literal('curve'),
		tension: curve('tension'),
		compression: curve('compression').optional(),
		beyond: oneOf('beyond', ['flat', 'zero'])
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
	fy: stress('Yield strength fy'),
	fyc: stress('Yield strength in compression fyc').optional(),
	fu: stress('Tensile strength fu').optional(),
	E: stress('Modulus of elasticity E').optional(),
	density: quantity('Density', 'kg/m³').optional(),
	law: lawSchema.optional()
});

/** A name such as "S355", a plain fy in N/mm² at any thickness, or strengths in full. */
export const gradeSchema = z
	.union([z.string().max(limits.name), z.number(), strengths], {
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
