import { createHash } from 'node:crypto';
import { engineVersion, schemaVersion } from '../../engine/version';
import { catalogueShapes, type Catalogue } from '../catalogues/shapes';
import { db } from '../db/connection';
import { newId } from '../db/ids';
import { writeTransaction } from '../db/retry';
import { catalogues } from '../db/schema';
import { log } from '../log';
import { dropOtherShapes, writeCatalogue, writeShapes } from './catalogue-writes';
import { shapeRow, type ShapeRow } from './shape-row';

/** Changes with the shipped content, and with the engine that computes the properties. */
const hashOf = ({ catalogue }: Catalogue) =>
	createHash('sha256')
		.update([catalogue.contentHash, catalogue.source, engineVersion, schemaVersion].join())
		.digest('hex');

const rowsOf = ({ catalogue, shapes }: Catalogue, catalogueId: string): ShapeRow[] =>
	shapes.flatMap((shape, position) => {
		const row = shapeRow(shape, catalogueId, position);
		if (row.ok) return [row.value];
		log.error({ catalogue: catalogue.id, reason: row.error }, 'a shipped shape is left out');
		return [];
	});

const seedOne = async (source: Catalogue, known: string | undefined): Promise<number> => {
	const id = known ?? newId();
	const rows = rowsOf(source, id);
	const { id: slug, ...told } = source.catalogue;
	const contentHash = hashOf(source);
	await writeTransaction(async (tx) => {
		await writeCatalogue(tx, id, { ...told, slug, shapeCount: rows.length, contentHash });
		await writeShapes(tx, rows);
		await dropOtherShapes(
			tx,
			id,
			rows.map((row) => row.id)
		);
	});
	return rows.length;
};

/**
 * Brings the shipped catalogues into the database, with properties computed by the engine. One
 * that stands there with the same content and engine is left alone. Returns the shapes written.
 */
export const seedCatalogues = async (): Promise<number> => {
	const standing = await db()
		.select({ id: catalogues.id, slug: catalogues.slug, hash: catalogues.contentHash })
		.from(catalogues);
	const bySlug = new Map(standing.map((row) => [row.slug, row]));
	let written = 0;
	for (const source of catalogueShapes()) {
		const known = bySlug.get(source.catalogue.id);
		if (known?.hash !== hashOf(source)) written += await seedOne(source, known?.id);
	}
	return written;
};
