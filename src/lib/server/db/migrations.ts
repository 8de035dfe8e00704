import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { z } from 'zod';

/** One step of the schema: a file of `drizzle/` cut into statements. */
export interface Migration {
	tag: string;
	hash: string;
	statements: string[];
}

const journal = z.object({ entries: z.array(z.object({ idx: z.number(), tag: z.string() })) });

const migrationOf = async (folder: string, tag: string): Promise<Migration> => {
	const text = await readFile(path.join(folder, `${tag}.sql`), 'utf8');
	const statements = text
		.split('--> statement-breakpoint')
		.map((statement) => statement.trim())
		.filter((statement) => statement.length > 0);
	return { tag, hash: createHash('sha256').update(text).digest('hex'), statements };
};

/** The migrations of a folder in the order of its journal. */
export const readMigrations = async (folder: string): Promise<Migration[]> => {
	const text = await readFile(path.join(folder, 'meta', '_journal.json'), 'utf8');
	const { entries } = journal.parse(JSON.parse(text));
	entries.sort((a, b) => a.idx - b.idx);
	return Promise.all(entries.map(({ tag }) => migrationOf(folder, tag)));
};

/** Where the migrations lie: beside the working directory, unless MIGRATIONS_FOLDER says else. */
export const migrationsFolder = (): string =>
	path.resolve(process.env.MIGRATIONS_FOLDER || 'drizzle');
