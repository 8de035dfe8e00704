import { int, json, mysqlEnum, mysqlTable, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import { sectionStates } from '../../../api/section-states';
import type { SectionSettings } from '../../../api/sections';
import type { SectionDefinition } from '../../../engine/section/definition';
import { createdAt, id, idOf, sha256 } from './columns';
import { sections } from './sections';
import { users } from './users';

/** Every saved state of a section, the newest included. */
export const sectionVersions = mysqlTable(
	'section_versions',
	{
		id: id(),
		sectionId: idOf('section_id')
			.notNull()
			.references(() => sections.id),
		version: int('version').notNull(),
		name: varchar('name', { length: 120 }).notNull(),
		standard: varchar('standard', { length: 120 }).notNull().default(''),
		project: varchar('project', { length: 160 }).notNull().default(''),
		remark: varchar('remark', { length: 500 }).notNull().default(''),
		definition: json('definition').$type<SectionDefinition>().notNull(),
		schemaVersion: int('schema_version').notNull(),
		settings: json('settings').$type<SectionSettings>().notNull(),
		inputHash: sha256('input_hash').notNull(),
		status: mysqlEnum('status', sectionStates).notNull(),
		savedBy: idOf('saved_by')
			.notNull()
			.references(() => users.id),
		savedAt: createdAt('saved_at')
	},
	(table) => [uniqueIndex('section_versions_version').on(table.sectionId, table.version)]
);
