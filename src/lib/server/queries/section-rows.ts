import { alias } from 'drizzle-orm/mysql-core';
import { eq } from 'drizzle-orm';
import { sectionSettings, type SectionRecord, type SectionSummary } from '../../api/sections';
import { sectionSchema } from '../../api/section';
import type { SectionKind } from '../../engine/section/definition';
import { migratedDefinition } from '../../engine/section/migrate';
import { schemaVersion } from '../../engine/version';
import type { Writer } from '../db/connection';
import { sections, users } from '../db/schema';

const creators = alias(users, 'creators');
const updaters = alias(users, 'updaters');

const summaryColumns = {
	id: sections.id,
	firmId: sections.firmId,
	name: sections.name,
	standard: sections.standard,
	project: sections.project,
	remark: sections.remark,
	kind: sections.kind,
	h: sections.h,
	b: sections.b,
	area: sections.area,
	mass: sections.mass,
	inputHash: sections.inputHash,
	version: sections.version,
	status: sections.status,
	createdBy: { id: creators.id, name: creators.name },
	updatedBy: { id: updaters.id, name: updaters.name },
	createdAt: sections.createdAt,
	updatedAt: sections.updatedAt,
	deletedAt: sections.deletedAt
};

const recordColumns = {
	...summaryColumns,
	definition: sections.definition,
	schemaVersion: sections.schemaVersion,
	settings: sections.settings
};

/** Rows of the list, people named. */
export const summaryRows = (reader: Writer) =>
	reader
		.select(summaryColumns)
		.from(sections)
		.innerJoin(creators, eq(creators.id, sections.createdBy))
		.innerJoin(updaters, eq(updaters.id, sections.updatedBy));

/** Rows in full, people named. */
export const recordRows = (reader: Writer) =>
	reader
		.select(recordColumns)
		.from(sections)
		.innerJoin(creators, eq(creators.id, sections.createdBy))
		.innerJoin(updaters, eq(updaters.id, sections.updatedBy));

type SummaryRow = Awaited<ReturnType<typeof summaryRows>>[number];
type RecordRow = Awaited<ReturnType<typeof recordRows>>[number];

const who = ({ id, name }: { id: string; name: string | null }) => ({ id, name: name ?? '' });

/** A row as the API gives it: instants as text, nothing of the firm's id. */
export const summaryOf = (row: SummaryRow): SectionSummary => ({
	id: row.id,
	name: row.name,
	standard: row.standard,
	project: row.project,
	remark: row.remark,
	kind: row.kind as SectionKind,
	h: row.h,
	b: row.b,
	area: row.area,
	mass: row.mass,
	inputHash: row.inputHash,
	version: row.version,
	status: row.status,
	createdBy: who(row.createdBy),
	updatedBy: who(row.updatedBy),
	createdAt: row.createdAt.toISOString(),
	updatedAt: row.updatedAt.toISOString()
});

/** The stored definition in today's form; one that cannot be brought there is a fault of ours. */
const definitionOf = (row: RecordRow) => {
	const today = migratedDefinition(row);
	if (!today.ok) throw new Error(`Section ${row.id}: ${today.error}`);
	return sectionSchema.parse(today.value);
};

/** A row in full; what was stored is held against the schema again, as everything that comes in. */
export const recordOf = (row: RecordRow): SectionRecord => ({
	...summaryOf(row),
	definition: definitionOf(row),
	schemaVersion,
	settings: sectionSettings.parse(row.settings)
});
