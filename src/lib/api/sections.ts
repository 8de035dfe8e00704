import { z } from 'zod';
import type { SectionDefinition, SectionKind } from '../engine/section/definition';

/** A section's standing on the Rack; only approved ones are offered to others. */
export const sectionStates = ['draft', 'approved', 'withdrawn'] as const;
export type SectionState = (typeof sectionStates)[number];

const sectionKinds = [
	'i',
	'channel',
	'tee',
	'angle',
	'rectangular-hollow',
	'circular-hollow',
	'box',
	'flat',
	'round',
	'plates',
	'outline'
] as const satisfies readonly SectionKind[];

/** Longest stored definition or settings, as JSON text. */
const maxDocument = 200_000;

const fits = (value: unknown) => JSON.stringify(value).length <= maxDocument;

/** Shape only; the engine judges the dimensions and names the field that is wrong. */
const definition = z.custom<SectionDefinition>(
	(value) => z.looseObject({ kind: z.enum(sectionKinds) }).safeParse(value).success && fits(value),
	{ message: 'A section needs a kind and its dimensions.' }
);

const figure = z.number().finite();

/** One case of factored design effects: kN, kNm, mm. */
const demand = z.looseObject({
	name: z.string().max(120).optional(),
	N: figure.optional(),
	My: figure.optional(),
	Mz: figure.optional(),
	Vy: figure.optional(),
	Vz: figure.optional()
});

/** What goes with a section on the Bench: code choices, strength basis, demands, and the like. */
export const sectionSettings = z
	.looseObject({
		code: z.looseObject({ standard: z.string().max(40).optional() }).optional(),
		strengthBasis: z.enum(['code-table', 'product-standard']).optional(),
		demands: z.array(demand).max(200).optional()
	})
	.refine(fits, 'These settings are too long to keep.');
export type SectionSettings = z.infer<typeof sectionSettings>;

const name = z
	.string()
	.trim()
	.min(1, 'Give the section a name.')
	.max(120, 'Keep the name under 120 characters.');
const line = (length: number) =>
	z.string().trim().max(length, `Keep this under ${length} characters.`);

/** POST /api/v1/sections */
export const createSectionRequest = z.object({
	name,
	standard: line(120).default(''),
	project: line(160).default(''),
	remark: line(500).default(''),
	definition,
	settings: sectionSettings.default({})
});
export type CreateSectionRequest = z.input<typeof createSectionRequest>;
export type NewSection = z.output<typeof createSectionRequest>;

/** PATCH /api/v1/sections/[id]: what changes, and the version that it was read at. */
export const updateSectionRequest = z.object({
	version: z.number().int().min(1),
	name: name.optional(),
	standard: line(120).optional(),
	project: line(160).optional(),
	remark: line(500).optional(),
	definition: definition.optional(),
	settings: sectionSettings.optional(),
	status: z.enum(sectionStates).optional()
});
export type UpdateSectionRequest = z.infer<typeof updateSectionRequest>;

export const sectionSorts = ['name', 'kind', 'h', 'b', 'mass', 'updated'] as const;

/** GET /api/v1/sections; a sort with a leading minus runs from the greatest. */
export const sectionListQuery = z.object({
	q: z.string().trim().max(120).default(''),
	kind: z.enum(sectionKinds).optional(),
	status: z.enum(sectionStates).optional(),
	sort: z.templateLiteral([z.enum(['', '-']), z.enum(sectionSorts)]).default('-updated'),
	page: z.coerce.number().int().min(1).max(100_000).default(1),
	pageSize: z.coerce.number().int().min(1).max(200).default(50)
});
export type SectionListQuery = z.output<typeof sectionListQuery>;

const who = z.object({ id: z.string(), name: z.string() });

/** One row of the list. h, b in mm, area in mm², mass in kg/m; instants in ISO 8601, UTC. */
export const sectionSummary = z.object({
	id: z.string(),
	name: z.string(),
	standard: z.string(),
	project: z.string(),
	remark: z.string(),
	kind: z.enum(sectionKinds),
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
});
export type SectionSummary = z.infer<typeof sectionSummary>;

/** A saved section in full. */
export const sectionRecord = sectionSummary.extend({
	definition,
	schemaVersion: z.number().int(),
	settings: sectionSettings
});
export type SectionRecord = z.infer<typeof sectionRecord>;

const envelope = z.object({ contract: z.literal(1), engineVersion: z.string() });

/** Answer to create, read, update and restore. */
export const sectionResponse = envelope.extend({ section: sectionRecord });

export const sectionListResponse = envelope.extend({
	items: z.array(sectionSummary),
	total: z.number().int(),
	page: z.number().int(),
	pageSize: z.number().int()
});

/** 409 `moved_on`: somebody saved in between; what was sent, and how it stands now. */
export const sectionConflict = z.object({
	error: z.object({ code: z.literal('moved_on'), message: z.string() }),
	yours: updateSectionRequest,
	theirs: sectionRecord
});
export type SectionConflict = z.infer<typeof sectionConflict>;
