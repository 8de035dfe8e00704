import { strict } from './fields';
import { grossSchema } from './gross';
import { limits } from './limits';
import { sectionSchema } from './section';
import { z } from './zod';

export const shapeSummarySchema = z
	.object({
		id: z.string(),
		designation: z.string(),
		family: z.string(),
		standard: z.string(),
		catalogue: z.string(),
		kind: z.string(),
		version: z.int(),
		mass: z.number().meta({ 'x-unit': 'kg/m' }),
		height: z.number().meta({ 'x-unit': 'mm' }),
		width: z.number().meta({ 'x-unit': 'mm' }),
		area: z.number().meta({ 'x-unit': 'mm²' })
	})
	.meta({ id: 'ShapeSummary' });

export const shapeSchema = z
	.object({
		...shapeSummarySchema.shape,
		definition: sectionSchema,
		properties: grossSchema
	})
	.meta({ id: 'Shape' });

export const catalogueSchema = z
	.object({
		id: z.string(),
		standard: z.string(),
		title: z.string(),
		source: z.string(),
		count: z.int().meta({ description: 'Number of shapes.' }),
		families: z.array(z.string())
	})
	.meta({ id: 'Catalogue' });

const listOf = <T extends z.ZodType>(item: T) =>
	z.object({
		items: z.array(item),
		total: z.int(),
		page: z.int(),
		pageSize: z.int()
	});

export const shapeListSchema = listOf(shapeSummarySchema).meta({ id: 'ShapeList' });
export const catalogueListSchema = listOf(catalogueSchema).meta({ id: 'CatalogueList' });

const whole = (title: string, most: number, absent: number) =>
	z.coerce
		.number({ error: `${title} must be a whole number from 1 to ${most}.` })
		.int({ error: `${title} must be a whole number from 1 to ${most}.` })
		.min(1, { error: `${title} must be 1 or more.` })
		.max(most, { error: `${title} must be ${most} or less.` })
		.default(absent);

export const shapeSorts = ['designation', 'mass', 'height', 'width', 'area'] as const;

/**
 * Query of a list of shapes; a minus before `sort` turns the order round. Parameters that it does
 * not know are refused: a filter left out unseen would give the wrong shapes.
 */
export const shapeQuerySchema = strict('The query', {
	q: z.string().max(limits.name, { error: 'q may have at most 80 characters.' }).default(''),
	family: z.string().max(limits.name).optional(),
	catalogue: z.string().max(limits.name).optional(),
	standard: z.string().max(limits.name).optional(),
	kind: z.string().max(limits.name).optional(),
	sort: z
		.enum([...shapeSorts, ...shapeSorts.map((sort) => `-${sort}` as const)], {
			error: `sort must be one of ${shapeSorts.join(', ')}, with a minus before it for descending.`
		})
		.optional(),
	page: whole('page', 1_000_000, 1),
	pageSize: whole('pageSize', limits.pageSize, 50)
});

export type ShapeSummary = z.infer<typeof shapeSummarySchema>;
export type Shape = z.infer<typeof shapeSchema>;
export type Catalogue = z.infer<typeof catalogueSchema>;
export type ShapeQuery = z.infer<typeof shapeQuerySchema>;
