import { z } from './zod';

/** How one instance is. */
export const healthSchema = z
	.object({
		status: z.enum(['ok', 'degraded']),
		version: z.string(),
		engineVersion: z.string(),
		uptime: z.number().meta({ 'x-unit': 's' }),
		database: z.object({
			reachable: z.boolean(),
			latencyMs: z.number().nullable().meta({ 'x-unit': 'ms' })
		}),
		migration: z.object({ applied: z.string().nullable(), latest: z.string().nullable() })
	})
	.meta({ id: 'Health' });
