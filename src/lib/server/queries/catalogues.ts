import { asc } from 'drizzle-orm';
import type { Catalogue } from '../../api/shapes';
import { db } from '../db/connection';
import { catalogues, shapes } from '../db/schema';

const familiesByCatalogue = async () => {
	const rows = await db()
		.selectDistinct({ catalogueId: shapes.catalogueId, family: shapes.family })
		.from(shapes)
		.orderBy(asc(shapes.family));
	const grouped = new Map<string, string[]>();
	for (const { catalogueId, family } of rows)
		grouped.set(catalogueId, [...(grouped.get(catalogueId) ?? []), family]);
	return grouped;
};

/** The shipped catalogues with their families. */
export const listCatalogues = async (): Promise<Catalogue[]> => {
	const [rows, families] = await Promise.all([
		db().select().from(catalogues).orderBy(asc(catalogues.id)),
		familiesByCatalogue()
	]);
	return rows.map(({ id, slug, standard, title, shapeCount, source }) => ({
		id: slug,
		standard,
		title,
		source,
		count: shapeCount,
		families: families.get(id) ?? []
	}));
};
