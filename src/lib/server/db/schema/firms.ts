import { boolean, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, id } from './columns';

/** A firm owns a Rack and has a crew. */
export const firms = mysqlTable('firms', {
	id: id(),
	name: varchar('name', { length: 120 }).notNull(),
	/** The invented firm that is shipped for trying things out. */
	demo: boolean('demo').notNull().default(false),
	createdAt: createdAt()
});
