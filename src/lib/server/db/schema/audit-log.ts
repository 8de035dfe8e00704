import { index, json, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, id, idOf } from './columns';

/** Who did what, when. Written once, never changed; it outlives the rows that it names. */
export const auditLog = mysqlTable(
	'audit_log',
	{
		id: id(),
		firmId: idOf('firm_id'),
		userId: idOf('user_id'),
		action: varchar('action', { length: 64 }).notNull(),
		subjectKind: varchar('subject_kind', { length: 32 }).notNull(),
		subjectId: varchar('subject_id', { length: 120 }).notNull(),
		detail: json('detail').$type<Record<string, unknown>>().notNull(),
		at: createdAt('at')
	},
	(table) => [
		index('audit_log_firm').on(table.firmId, table.id),
		index('audit_log_subject').on(table.subjectKind, table.subjectId)
	]
);
