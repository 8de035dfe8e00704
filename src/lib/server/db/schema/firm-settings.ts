import { int, json, mysqlTable } from 'drizzle-orm/mysql-core';
import type { z } from 'zod';
import type { codeSchema } from '../../../api/code';
import type { PlateStock } from '../../../engine/unlock/plate-stock';
import { idOf, instant } from './columns';
import { firms } from './firms';
import { users } from './users';

/** What a firm has settled for all its studies; no row while it keeps the defaults. */
export const firmSettings = mysqlTable('firm_settings', {
	firmId: idOf('firm_id')
		.primaryKey()
		.references(() => firms.id, { onDelete: 'cascade' }),
	version: int('version').notNull(),
	/** Preset of the code; null for the program's defaults. */
	code: json('code').$type<z.infer<typeof codeSchema> | null>(),
	/** Plate stock; null for the default one. */
	stock: json('stock').$type<PlateStock | null>(),
	updatedBy: idOf('updated_by')
		.notNull()
		.references(() => users.id),
	updatedAt: instant('updated_at').notNull()
});
