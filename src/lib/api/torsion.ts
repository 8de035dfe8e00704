import { z } from './zod';

const number = (unit: string, description?: string) =>
	z.number().meta({ 'x-unit': unit, ...(description ? { description } : {}) });

const figures = {
	torsionConstant: number('mm⁴').nullable(),
	warpingConstant: number('mm⁶').nullable(),
	shearCentre: z.object({ y: z.number(), z: z.number() }).nullable()
};

const numericalSchema = z.object({
	...figures,
	torsionConstant: number('mm⁴'),
	error: z.object({
		torsionBelow: number('mm⁴', 'The torsion constant is no less than this.'),
		torsionAbove: number('mm⁴', 'The torsion constant is no more than this.'),
		torsionShare: number('', 'Half the distance between the bounds, as a share.')
	}),
	nodes: z.number()
});

/** Torsion by formulas and by the numerical solution, side by side. */
export const torsionSchema = z
	.object({
		handbook: z.object(figures).nullable().meta({
			description: 'By handbook formulas or thin-walled theory; null where none applies.'
		}),
		numerical: numericalSchema.nullable().meta({
			description:
				'Saint-Venant’s problem solved numerically: always for outline and plates, else when numericalTorsion is true.'
		})
	})
	.meta({ id: 'Torsion' });
