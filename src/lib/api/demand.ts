import type { Demand } from '$lib/engine/rules/result';
import { strict, text, within } from './fields';
import { limits } from './limits';
import { ranges } from './ranges';
import type { z } from './zod';

/** Factored design effects; tension positive, My positive puts the bottom in tension. */
export const demandSchema = strict('A demand', {
	name: text('Name of a demand', limits.name).optional(),
	N: within('Axial force N', 'kN', ranges.force).optional(),
	My: within('Moment My', 'kNm', ranges.moment).optional(),
	Mz: within('Moment Mz', 'kNm', ranges.moment).optional(),
	Vy: within('Shear Vy', 'kN', ranges.force).optional(),
	Vz: within('Shear Vz', 'kN', ranges.force).optional(),
	unbracedLength: within('Unbraced length', 'mm', ranges.unbracedLength).optional(),
	C1: within('Moment factor C1', '', ranges.momentFactor).optional(),
	zg: within('Height of the load above the shear centre zg', 'mm', ranges.loadHeight).optional()
}).meta({
	id: 'Demand',
	description:
		'Factored design effects. Tension positive; My positive puts the bottom in tension, Mz positive the right.'
}) satisfies z.ZodType<Demand>;
