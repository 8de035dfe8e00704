import { createConnection, type RowDataPacket } from 'mysql2/promise';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { startInstance, type Instance } from '../setup/instance';
import { openFreshDatabase } from '../setup/test-database';

let database: Awaited<ReturnType<typeof openFreshDatabase>>;
let instances: Instance[] = [];

beforeAll(async () => {
	database = await openFreshDatabase(inject('databaseUrl'));
	const env = { DATABASE_URL: database.url };
	instances = await Promise.all([startInstance(env), startInstance(env)]);
});

afterAll(async () => {
	await Promise.all(instances.map((instance) => instance.stop()));
	await database.release();
});

const rows = async (sql: string) => {
	const connection = await createConnection(database.url);
	try {
		const [found] = await connection.query<RowDataPacket[]>(sql);
		return found;
	} finally {
		await connection.end();
	}
};

test('two instances started at once on an empty database are both healthy', async () => {
	const answers = await Promise.all(instances.map(({ url }) => fetch(`${url}/api/v1/health`)));
	expect(answers.map(({ status }) => status)).toEqual([200, 200]);
	const bodies = await Promise.all(answers.map((answer) => answer.json()));
	for (const body of bodies) expect(body.migration.applied).toBe(body.migration.latest);
});

test('every table is InnoDB and has a primary key', async () => {
	const tables = await rows(
		`SELECT t.table_name AS name, t.engine AS engine, count(k.column_name) AS keyed
		FROM information_schema.tables t
		LEFT JOIN information_schema.key_column_usage k ON k.table_schema = t.table_schema
			AND k.table_name = t.table_name AND k.constraint_name = 'PRIMARY'
		WHERE t.table_schema = database() GROUP BY t.table_name, t.engine`
	);
	expect(tables.length).toBeGreaterThan(5);
	expect(tables.filter(({ engine, keyed }) => engine !== 'InnoDB' || keyed === 0)).toEqual([]);
});

test('an instance ends within three seconds of SIGTERM, with its pool and a connection open', async () => {
	const [instance] = instances;
	if (!instance) throw new Error('no instance');
	await fetch(`${instance.url}/api/v1/health`);
	const asked = performance.now();
	process.kill(instance.pid, 'SIGTERM');
	expect(await instance.ended).toBe(0);
	expect(performance.now() - asked).toBeLessThan(3000);
});
