import { createConnection } from 'mysql2/promise';
import { inject } from 'vitest';

/** Does something in the app's database behind its back. */
export const behindItsBack = async (statement: string, values: string[] = []): Promise<void> => {
	const connection = await createConnection({ uri: inject('databaseUrl') });
	try {
		await connection.execute(statement, values);
	} finally {
		await connection.end();
	}
};
