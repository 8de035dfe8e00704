import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const statements = readdirSync('drizzle')
	.filter((name) => name.endsWith('.sql'))
	.flatMap((name) => readFileSync(`drizzle/${name}`, 'utf8').split('--> statement-breakpoint'))
	.map((statement) => statement.trim());
const tables = statements
	.filter((statement) => /^CREATE TABLE/i.test(statement))
	.map((statement) => [/`(\w+)`/.exec(statement)?.[1] ?? '', statement] as const);

it('the migrations make tables at all', () => {
	expect(tables.length).toBeGreaterThan(10);
});

describe.each(tables)('table %s, as replicated and clustered servers need it,', (_, statement) => {
	it('names InnoDB and utf8mb4, whatever the server or its database defaults to', () => {
		expect(statement).toMatch(/ENGINE=InnoDB DEFAULT CHARSET=utf8mb4/);
	});

	it('has a primary key that the app makes', () => {
		expect(statement).toMatch(/PRIMARY KEY/);
		expect(statement).not.toMatch(/AUTO_INCREMENT/i);
	});
});
