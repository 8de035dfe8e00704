import { index, int, json, mysqlTable, text, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import type { SectionDefinition } from '../../../engine/section/definition';
import type { GrossProperties } from '../../../engine/section/prepared';
import { catalogues } from './catalogues';
import { figure, idOf, sha256 } from './columns';

/** Shapes of the shipped catalogues: nominal dims, and properties computed by the engine (mm-based). */
export const shapes = mysqlTable(
	'shapes',
	{
		/** Readable and the same at every seeding: `en10365-ipe-300`. */
		id: varchar('id', { length: 120 }).primaryKey(),
		catalogueId: idOf('catalogue_id')
			.notNull()
			.references(() => catalogues.id, { onDelete: 'cascade' }),
		/** Place in the published list, from 0. */
		position: int('position').notNull(),
		designation: varchar('designation', { length: 80 }).notNull(),
		standard: varchar('standard', { length: 120 }).notNull(),
		family: varchar('family', { length: 60 }).notNull(),
		kind: varchar('kind', { length: 32 }).notNull(),
		/** Other names, one a line. */
		aliases: text('aliases').notNull(),
		/** Designation and aliases folded for searching. */
		searchText: varchar('search_text', { length: 500 }).notNull(),
		definition: json('definition').$type<SectionDefinition>().notNull(),
		schemaVersion: int('schema_version').notNull(),
		properties: json('properties').$type<GrossProperties>().notNull(),
		/** mm² */
		area: figure('area').notNull(),
		/** kg/m */
		mass: figure('mass').notNull(),
		/** mm */
		h: figure('h').notNull(),
		/** mm */
		b: figure('b').notNull(),
		/** mm⁴ */
		secondMomentY: figure('second_moment_y').notNull(),
		/** mm³, the lesser of top and bottom */
		elasticModulusY: figure('elastic_modulus_y').notNull(),
		/** mm³ */
		plasticModulusY: figure('plastic_modulus_y').notNull(),
		contentHash: sha256('content_hash').notNull(),
		/** Raised when a later seeding brings other dims or figures. */
		version: int('version').notNull().default(1)
	},
	(table) => [
		uniqueIndex('shapes_identity').on(table.standard, table.designation),
		index('shapes_catalogue').on(table.catalogueId, table.position),
		index('shapes_family').on(table.family, table.mass),
		index('shapes_mass').on(table.mass)
	]
);
