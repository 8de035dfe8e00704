import { boolean, index, mysqlEnum, mysqlTable, uniqueIndex } from 'drizzle-orm/mysql-core';
import { roles } from '../../rights/roles';
import { createdAt, id, idOf } from './columns';
import { firms } from './firms';
import { users } from './users';

/** Who belongs to which firm, and as what. */
export const memberships = mysqlTable(
	'memberships',
	{
		id: id(),
		firmId: idOf('firm_id')
			.notNull()
			.references(() => firms.id, { onDelete: 'cascade' }),
		userId: idOf('user_id')
			.notNull()
			.references(() => users.id, { onDelete: 'cascade' }),
		role: mysqlEnum('role', roles).notNull(),
		active: boolean('active').notNull().default(true),
		createdAt: createdAt()
	},
	(table) => [
		uniqueIndex('memberships_firm_user').on(table.firmId, table.userId),
		index('memberships_user').on(table.userId)
	]
);
