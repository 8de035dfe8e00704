import {
	index,
	int,
	json,
	mysqlEnum,
	mysqlTable,
	uniqueIndex,
	varchar
} from 'drizzle-orm/mysql-core';
import { sectionStates } from '../../../api/section-states';
import type { SectionSettings } from '../../../api/sections';
import type { SectionDefinition } from '../../../engine/section/definition';
import { createdAt, exactText, figure, id, idOf, instant, sha256 } from './columns';
import { firms } from './firms';
import { users } from './users';

/** The firm's own sections on its Rack. */
export const sections = mysqlTable(
	'sections',
	{
		id: id(),
		firmId: idOf('firm_id')
			.notNull()
			.references(() => firms.id),
		name: varchar('name', { length: 120 }).notNull(),
		standard: varchar('standard', { length: 120 }).notNull().default(''),
		/** Building or job that it was made for. */
		project: varchar('project', { length: 160 }).notNull().default(''),
		remark: varchar('remark', { length: 500 }).notNull().default(''),
		/** Folded name and standard while the section stands; null once deleted, so the name is free again. */
		identity: exactText('identity', { length: 250 }),
		kind: varchar('kind', { length: 32 }).notNull(),
		definition: json('definition').$type<SectionDefinition>().notNull(),
		schemaVersion: int('schema_version').notNull(),
		settings: json('settings').$type<SectionSettings>().notNull(),
		inputHash: sha256('input_hash').notNull(),
		/** mm² */
		area: figure('area').notNull(),
		/** kg/m */
		mass: figure('mass').notNull(),
		/** mm */
		h: figure('h').notNull(),
		/** mm */
		b: figure('b').notNull(),
		version: int('version').notNull().default(1),
		status: mysqlEnum('status', sectionStates).notNull().default('draft'),
		createdBy: idOf('created_by')
			.notNull()
			.references(() => users.id),
		updatedBy: idOf('updated_by')
			.notNull()
			.references(() => users.id),
		createdAt: createdAt(),
		updatedAt: createdAt('updated_at'),
		deletedAt: instant('deleted_at')
	},
	(table) => [
		uniqueIndex('sections_identity').on(table.firmId, table.identity),
		index('sections_firm_updated').on(table.firmId, table.deletedAt, table.updatedAt)
	]
);
