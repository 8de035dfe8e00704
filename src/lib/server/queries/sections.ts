import { and, asc, count, desc, eq, isNull, like, or, type SQL } from 'drizzle-orm';
import type { SectionListQuery, SectionRecord, SectionSummary } from '../../api/sections';
import { db } from '../db/connection';
import { sections } from '../db/schema';
import { recordOf, recordRows, summaryOf, summaryRows } from './section-rows';

const sortColumns = {
	name: sections.name,
	kind: sections.kind,
	h: sections.h,
	b: sections.b,
	mass: sections.mass,
	updated: sections.updatedAt
} as const;

const orderOf = (sort: SectionListQuery['sort']): SQL[] => {
	const down = sort.startsWith('-');
	const column = sortColumns[(down ? sort.slice(1) : sort) as keyof typeof sortColumns];
	return [down ? desc(column) : asc(column), asc(sections.id)];
};

/** Words are looked for anywhere; what means something to LIKE is taken as it stands. */
const holding = (word: string): SQL | undefined => {
	const pattern = `%${word.replaceAll(/[\\%_]/g, '\\$&')}%`;
	return or(like(sections.name, pattern), like(sections.project, pattern));
};

const filterOf = (firmId: string, { q, kind, status }: SectionListQuery): SQL | undefined =>
	and(
		eq(sections.firmId, firmId),
		isNull(sections.deletedAt),
		kind ? eq(sections.kind, kind) : undefined,
		status ? eq(sections.status, status) : undefined,
		...q.split(/\s+/).filter(Boolean).map(holding)
	);

export interface SectionPage {
	items: SectionSummary[];
	total: number;
	page: number;
	pageSize: number;
}

/** One page of a firm's sections, deleted ones left out. */
export const listSections = async (
	firmId: string,
	query: SectionListQuery
): Promise<SectionPage> => {
	const where = filterOf(firmId, query);
	const { page, pageSize } = query;
	const [[counted], rows] = await Promise.all([
		db().select({ total: count() }).from(sections).where(where),
		summaryRows(db())
			.where(where)
			.orderBy(...orderOf(query.sort))
			.limit(pageSize)
			.offset((page - 1) * pageSize)
	]);
	return { items: rows.map(summaryOf), total: counted?.total ?? 0, page, pageSize };
};

/** A section that stands on this firm's Rack, or null; another firm's is as good as none. */
export const sectionOf = async (firmId: string, id: string): Promise<SectionRecord | null> => {
	const [row] = await recordRows(db())
		.where(and(eq(sections.id, id), eq(sections.firmId, firmId), isNull(sections.deletedAt)))
		.limit(1);
	return row ? recordOf(row) : null;
};
