import { z } from './zod';

const point = z.object({ y: z.number(), z: z.number() });

const removedSchema = z.object({
	part: z.string(),
	element: z.string(),
	from: z.number().meta({
		'x-unit': 'mm',
		description:
			'Along the plate from the origin: z of an upright plate, y of a level one, otherwise from the end of its element.'
	}),
	to: z.number().meta({ 'x-unit': 'mm' }),
	corners: z.array(point).readonly()
});

const effectiveElementSchema = z.object({
	element: z.string(),
	part: z.string(),
	psi: z.number(),
	kSigma: z.number(),
	slenderness: z.number(),
	rho: z.number(),
	width: z.number(),
	compressedWidth: z.number(),
	effective: z.number(),
	edges: z.array(z.number()).readonly()
});

const effectiveFields = {
	area: z.number(),
	centroid: point,
	secondMomentY: z.number(),
	secondMomentZ: z.number(),
	productYZ: z.number(),
	elasticModulusYTop: z.number(),
	elasticModulusYBottom: z.number(),
	elasticModulusZLeft: z.number(),
	elasticModulusZRight: z.number(),
	centroidShiftY: z.number().meta({ 'x-unit': 'mm', description: 'Effective minus gross.' }),
	centroidShiftZ: z.number().meta({ 'x-unit': 'mm', description: 'Effective minus gross.' }),
	removed: z.array(removedSchema).readonly(),
	elements: z.array(effectiveElementSchema).readonly()
};

const effectiveCase = z.object({ ...effectiveFields, converged: z.object(effectiveFields) });

/** The contract’s `effective`: one pass and converged, with every class 4 case. */
export const effectiveSchema = z.object({
	basis: z.enum(['+My', '−My', 'Mz', 'N']),
	...effectiveFields,
	converged: z.object(effectiveFields),
	byCase: z
		.object({
			'+My': effectiveCase.optional(),
			'−My': effectiveCase.optional(),
			'+Mz': effectiveCase.optional(),
			'−Mz': effectiveCase.optional(),
			N: effectiveCase.optional()
		})
		.meta({ description: 'Every pure case that is class 4.' })
});
