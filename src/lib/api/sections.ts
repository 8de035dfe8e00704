import { codeSchema, strengthBasisSchema } from './code';
import { demandSchema } from './demand';
import { limits } from './limits';
import { sectionKinds, sectionSchema } from './section';
import { sectionStates } from './section-states';
import { stiffenersSchema } from './stiffeners';
import { z } from './zod';

export { sectionStates, type SectionState } from './section-states';

/** Longest stored settings, as JSON text. */
const longestSettings = 100_000;

/** What goes with a section on the Bench: code choices, demands, and whatever else it keeps there. */
export const sectionSettings = z
	.looseObject({
		code: codeSchema.optional(),
		strengthBasis: strengthBasisSchema.optional(),
		demands: z.array(demandSchema).max(limits.demands).optional(),
		stiffeners: stiffenersSchema.optional()
	})
	.refine((value) => JSON.stringify(value).length <= longestSettings, {
		error: 'These settings are too long to keep.'
	})
	.meta({ id: 'SectionSettings' });
export type SectionSettings = z.infer<typeof sectionSettings>;

const kind = z.enum(sectionKinds);

const name = z
	.string()
	.trim()
	.min(1, 'Give the section a name.')
	.max(120, 'Keep the name under 120 characters.');
const line = (length: number) =>
	z.string().trim().max(length, `Keep this under ${length} characters.`);

/** POST /api/v1/sections */
export const createSectionRequest = z
	.object({
		name,
		standard: line(120).default(''),
		project: line(160).default(''),
		remark: line(500).default(''),
		definition: sectionSchema,
		settings: sectionSettings.default({})
	})
	.meta({ id: 'CreateSection' });
export type CreateSectionRequest = z.input<typeof createSectionRequest>;
export type NewSection = z.output<typeof createSectionRequest>;

/** PATCH /api/v1/sections/[id]: what changes, and the version that it was read at. */
export const updateSectionRequest = z
	.object({
		version: z.number().int().min(1),
		name: name.optional(),
		standard: line(120).optional(),
		project: line(160).optional(),
		remark: line(500).optional(),
		definition: sectionSchema.optional(),
		settings: sectionSettings.optional(),
		status: z.enum(sectionStates).optional()
	})
	.meta({ id: 'UpdateSection' });
export type UpdateSectionRequest = z.infer<typeof updateSectionRequest>;

export const sectionSorts = ['name', 'kind', 'h', 'b', 'mass', 'updated'] as const;

/** GET /api/v1/sections; a sort with a leading minus runs from the greatest. */
export const sectionListQuery = z.object({
	q: z.string().trim().max(120).default(''),
	kind: kind.optional(),
	status: z.enum(sectionStates).optional(),
	sort: z.templateLiteral([z.enum(['', '-']), z.enum(sectionSorts)]).default('-updated'),
	page: z.coerce.number().int().min(1).max(100_000).default(1),
	pageSize: z.coerce.number().int().min(1).max(200).default(50)
});
export type SectionListQuery = z.output<typeof sectionListQuery>;

const who = z.object({ id: z.string(), name: z.string() });

/** One row of the list. h, b in mm, area in mm², mass in kg/m; instants in ISO 8601, UTC. */
export const sectionSummary = z
	.object({
		id: z.string(),
		name: z.string(),
		standard: z.string(),
		project: z.string(),
		remark: z.string(),
		kind,
		h: z.number(),
		b: z.number(),
		area: z.number(),
		mass: z.number(),
		inputHash: z.string(),
		version: z.number().int(),
		status: z.enum(sectionStates),
		createdBy: who,
		updatedBy: who,
		createdAt: z.string(),
		updatedAt: z.string()
	})
	.meta({ id: 'SavedSectionSummary' });
export type SectionSummary = z.infer<typeof sectionSummary>;

/** A saved section in full. */
export const sectionRecord = sectionSummary
	.extend({
		definition: sectionSchema,
		schemaVersion: z.number().int(),
		settings: sectionSettings
	})
	.meta({ id: 'SavedSection' });
export type SectionRecord = z.infer<typeof sectionRecord>;

const envelope = z.object({ contract: z.literal(1), engineVersion: z.string() });

/** Answer to create, read, update and restore. */
export const sectionResponse = envelope
	.extend({ section: sectionRecord })
	.meta({ id: 'SavedSectionAnswer' });

export const sectionListResponse = envelope
	.extend({
		items: z.array(sectionSummary),
		total: z.number().int(),
		page: z.number().int(),
		pageSize: z.number().int()
	})
	.meta({ id: 'SavedSectionList' });

/** 409 `moved_on`: somebody saved in between; what was sent, and how it stands now. */
export const sectionConflict = z
	.object({
		error: z.object({ code: z.literal('moved_on'), message: z.string() }),
		yours: updateSectionRequest,
		theirs: sectionRecord
	})
	.meta({ id: 'SectionConflict' });
export type SectionConflict = z.infer<typeof sectionConflict>;
