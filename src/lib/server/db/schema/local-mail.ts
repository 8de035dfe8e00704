import { index, mysqlTable, text, varchar } from 'drizzle-orm/mysql-core';
import { createdAt, id } from './columns';

/** Mail kept on this machine while no mail server is set up; read at /dev/mail. */
export const localMail = mysqlTable(
	'local_mail',
	{
		id: id(),
		recipient: varchar('recipient', { length: 254 }).notNull(),
		subject: varchar('subject', { length: 250 }).notNull(),
		body: text('body').notNull(),
		sentAt: createdAt('sent_at')
	},
	(table) => [index('local_mail_recipient').on(table.recipient)]
);
