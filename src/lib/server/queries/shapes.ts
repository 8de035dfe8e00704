import { and, asc, count, desc, eq, inArray, type SQL } from 'drizzle-orm';
import type { Shape, ShapeQuery, ShapeSummary } from '../../api/shapes';
import { searchShapes } from '../../api/shape-search';
import type { SectionDefinition } from '../../engine/section/definition';
import { db } from '../db/connection';
import { catalogues, shapes } from '../db/schema';
import { shapeIndex } from './shape-index';

const columns = {
	id: shapes.id,
	designation: shapes.designation,
	family: shapes.family,
	standard: shapes.standard,
	catalogue: catalogues.slug,
	kind: shapes.kind,
	mass: shapes.mass,
	height: shapes.h,
	width: shapes.b,
	area: shapes.area
};

const sortColumns = {
	designation: shapes.designation,
	mass: shapes.mass,
	height: shapes.h,
	width: shapes.b,
	area: shapes.area
} as const;
type Sort = keyof typeof sortColumns;

const summaryOf = (row: Omit<ShapeSummary, 'version'>): ShapeSummary => ({ ...row, version: 1 });

/** Everything but the search words: they are ranked outside the database. */
const filtersOf = ({ family, catalogue, standard, kind }: ShapeQuery): (SQL | undefined)[] => [
	family ? eq(shapes.family, family) : undefined,
	catalogue ? eq(catalogues.slug, catalogue) : undefined,
	standard ? eq(shapes.standard, standard) : undefined,
	kind ? eq(shapes.kind, kind) : undefined
];

const orderOf = (sort: ShapeQuery['sort']): SQL[] => {
	if (!sort) return [asc(catalogues.id), asc(shapes.position), asc(shapes.id)];
	const down = sort.startsWith('-');
	const column = sortColumns[(down ? sort.slice(1) : sort) as Sort];
	return [down ? desc(column) : asc(column), asc(shapes.id)];
};

const from = (where: SQL | undefined) =>
	db()
		.select(columns)
		.from(shapes)
		.innerJoin(catalogues, eq(catalogues.id, shapes.catalogueId))
		.where(where);

const pageOf = async (query: ShapeQuery, where: SQL | undefined) => {
	const rows = await from(where)
		.orderBy(...orderOf(query.sort))
		.limit(query.pageSize)
		.offset((query.page - 1) * query.pageSize);
	return rows.map(summaryOf);
};

const totalOf = async (where: SQL | undefined) => {
	const [row] = await db()
		.select({ total: count() })
		.from(shapes)
		.innerJoin(catalogues, eq(catalogues.id, shapes.catalogueId))
		.where(where);
	return row?.total ?? 0;
};

/** Ids that answer the search words, best first. */
const idsFound = async (q: string) => {
	const { searchable } = await shapeIndex();
	return searchShapes(searchable, q, searchable.length).map(([id]) => id);
};

const rankedPage = async (query: ShapeQuery, ids: readonly string[], where: SQL | undefined) => {
	const place = new Map(ids.map((id, i) => [id, i]));
	const rows = (await from(where)).sort((a, b) => (place.get(a.id) ?? 0) - (place.get(b.id) ?? 0));
	const start = (query.page - 1) * query.pageSize;
	return rows.slice(start, start + query.pageSize).map(summaryOf);
};

export interface ShapePage {
	items: ShapeSummary[];
	total: number;
	page: number;
	pageSize: number;
}

/** One page of the catalogues' shapes; in order of relevance when there are words and no sort. */
export const listShapes = async (query: ShapeQuery): Promise<ShapePage> => {
	const words = query.q.trim();
	const ids = words ? await idsFound(words) : [];
	const { page, pageSize } = query;
	if (words && ids.length === 0) return { items: [], total: 0, page, pageSize };
	const where = and(...filtersOf(query), words ? inArray(shapes.id, ids) : undefined);
	const [total, items] = await Promise.all([
		totalOf(where),
		words && !query.sort ? rankedPage(query, ids, where) : pageOf(query, where)
	]);
	return { items, total, page, pageSize };
};

/** A shape in full, or null. */
export const shapeById = async (id: string): Promise<Shape | null> => {
	const [row] = await db()
		.select({ ...columns, definition: shapes.definition, properties: shapes.properties })
		.from(shapes)
		.innerJoin(catalogues, eq(catalogues.id, shapes.catalogueId))
		.where(eq(shapes.id, id))
		.limit(1);
	return row ? ({ ...row, version: 1 } as Shape) : null;
};

/** A shape's definition alone, or null: all that a compute call needs. */
export const shapeDefinition = async (id: string): Promise<SectionDefinition | null> => {
	const [row] = await db()
		.select({ definition: shapes.definition })
		.from(shapes)
		.where(eq(shapes.id, id))
		.limit(1);
	return row?.definition ?? null;
};
