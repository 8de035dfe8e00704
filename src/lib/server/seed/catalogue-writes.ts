import { and, eq, notInArray, sql } from 'drizzle-orm';
import type { Transaction } from '../db/connection';
import { catalogues, shapes } from '../db/schema';
import type { ShapeRow } from './shape-row';

/** Rows a statement: large enough to be fast, small enough for a modest max_allowed_packet. */
const rowsAtOnce = 500;

/** Columns that take what comes in when the shape is known already. */
const incoming = (column: string) => sql.raw(`values(\`${column}\`)`);
const renewed = {
	catalogueId: incoming('catalogue_id'),
	position: incoming('position'),
	designation: incoming('designation'),
	standard: incoming('standard'),
	family: incoming('family'),
	kind: incoming('kind'),
	aliases: incoming('aliases'),
	searchText: incoming('search_text'),
	definition: incoming('definition'),
	schemaVersion: incoming('schema_version'),
	properties: incoming('properties'),
	area: incoming('area'),
	mass: incoming('mass'),
	h: incoming('h'),
	b: incoming('b'),
	secondMomentY: incoming('second_moment_y'),
	elasticModulusY: incoming('elastic_modulus_y'),
	plasticModulusY: incoming('plastic_modulus_y'),
	contentHash: incoming('content_hash')
};

/** Writes the rows: new shapes appear, known ones are brought up to date, ids stay. */
export const writeShapes = async (tx: Transaction, rows: readonly ShapeRow[]): Promise<void> => {
	for (let from = 0; from < rows.length; from += rowsAtOnce)
		await tx
			.insert(shapes)
			.values(rows.slice(from, from + rowsAtOnce))
			.onDuplicateKeyUpdate({ set: renewed });
};

/** Takes away shapes that the catalogue no longer has. */
export const dropOtherShapes = async (
	tx: Transaction,
	catalogueId: string,
	keptIds: readonly string[]
): Promise<void> => {
	const ours = eq(shapes.catalogueId, catalogueId);
	await tx
		.delete(shapes)
		.where(keptIds.length > 0 ? and(ours, notInArray(shapes.id, [...keptIds])) : ours);
};

/** What is written of a catalogue itself. */
export interface CatalogueRow {
	slug: string;
	standard: string;
	title: string;
	source: string;
	shapeCount: number;
	contentHash: string;
}

/** Writes the catalogue's own row. */
export const writeCatalogue = async (
	tx: Transaction,
	id: string,
	row: CatalogueRow
): Promise<void> => {
	const seededAt = new Date();
	await tx
		.insert(catalogues)
		.values({ id, ...row, seededAt })
		.onDuplicateKeyUpdate({ set: { ...row, seededAt } });
};
