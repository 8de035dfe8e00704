import { createHash } from 'node:crypto';
import { gzipSync } from 'node:zlib';
import { asc, eq } from 'drizzle-orm';
import type { SearchableShape, ShapeIndexRow } from '../../api/shape-index';
import { searchableShape } from '../../api/shape-search';
import { db } from '../db/connection';
import { catalogues, shapes } from '../db/schema';

export interface ShapeIndex {
	/** Changes when any catalogue is seeded anew with other content. */
	readonly tag: string;
	/** The rows as JSON, made once. */
	readonly json: string;
	readonly gzipped: Uint8Array<ArrayBuffer>;
	readonly searchable: readonly SearchableShape[];
}

const currentTag = async () => {
	const rows = await db()
		.select({ hash: catalogues.contentHash })
		.from(catalogues)
		.orderBy(asc(catalogues.slug));
	return createHash('sha256')
		.update(rows.map(({ hash }) => hash).join())
		.digest('base64url');
};

const indexRows = async (): Promise<ShapeIndexRow[]> => {
	const rows = await db()
		.select({
			id: shapes.id,
			designation: shapes.designation,
			family: shapes.family,
			standard: shapes.standard,
			mass: shapes.mass,
			h: shapes.h,
			b: shapes.b
		})
		.from(shapes)
		.innerJoin(catalogues, eq(catalogues.id, shapes.catalogueId))
		.orderBy(asc(catalogues.slug), asc(shapes.position));
	return rows.map(({ id, designation, family, standard, mass, h, b }) => [
		...([id, designation, family, standard] as const),
		...([round(mass), round(h), round(b)] as const)
	]);
};

/** The index is for finding, not for figures: three decimals keep it small. */
const round = (value: number) => Math.round(value * 1000) / 1000;

let kept: ShapeIndex | undefined;

/** All shapes in brief, read anew only when the catalogues have changed. */
export const shapeIndex = async (): Promise<ShapeIndex> => {
	const tag = await currentTag();
	if (kept?.tag === tag) return kept;
	const rows = await indexRows();
	const json = JSON.stringify(rows);
	const gzipped = new Uint8Array(gzipSync(json));
	kept = { tag, json, gzipped, searchable: rows.map(searchableShape) };
	return kept;
};
