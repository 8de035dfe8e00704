import { customType, datetime, double, varchar } from 'drizzle-orm/mysql-core';
import { newId } from '../ids';

/** Length of an id made by `newId()`. */
const idLength = 36;

/** Primary key column `id`, made by the app and sortable by time of making. */
export const id = () =>
	varchar('id', { length: idLength })
		.primaryKey()
		.$defaultFn(() => newId());

/** Column holding the id of another row. */
export const idOf = (name: string) => varchar(name, { length: idLength });

/** UTC instant to the millisecond. */
export const instant = (name: string) => datetime(name, { fsp: 3, mode: 'date' });

/** UTC instant filled by the app at insertion. */
export const createdAt = (name = 'created_at') =>
	instant(name)
		.notNull()
		.$defaultFn(() => new Date());

/** Double-precision figure computed by the engine. */
export const figure = (name: string) => double(name);

/** SHA-256 as hexadecimal text. */
export const sha256 = (name: string) => varchar(name, { length: 64 });

/** Text compared byte by byte, so that é and e, or A and a, are never taken for one another. */
export const exactText = customType<{
	data: string;
	driverData: string;
	config: { length: number };
}>({
	dataType: (config) =>
		`varchar(${config?.length ?? 255}) character set utf8mb4 collate utf8mb4_bin`
});
