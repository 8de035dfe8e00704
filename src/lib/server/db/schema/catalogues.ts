import { int, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, id, sha256 } from './columns';

/** Lists of shapes shipped with the program; re-seeded when the content hash changes. */
export const catalogues = mysqlTable('catalogues', {
	id: id(),
	/** Stable short name, as in `en10365-i`. */
	slug: varchar('slug', { length: 64 }).notNull().unique('catalogues_slug'),
	standard: varchar('standard', { length: 120 }).notNull(),
	title: varchar('title', { length: 200 }).notNull(),
	source: varchar('source', { length: 500 }).notNull().default(''),
	shapeCount: int('shape_count').notNull(),
	contentHash: sha256('content_hash').notNull(),
	seededAt: createdAt('seeded_at')
});
