import { z } from '../../api/zod';
import { sectionListQuery, type SectionSummary } from '../../api/sections';
import { shapeQuerySchema } from '../../api/shapes';
import { listCatalogues } from '../queries/catalogues';
import { listSections } from '../queries/sections';
import { listShapes } from '../queries/shapes';
import { may } from '../rights/may';
import type { Person } from '../rights/person';

const side = z.enum(['ours', 'catalogues']);
export type RackSide = z.infer<typeof side>;

/** What may be asked of either side; nonsense in the address falls back to the default. */
const sectionsAsked = sectionListQuery.catch(sectionListQuery.parse({}));
const shapesAsked = shapeQuerySchema.catch(shapeQuerySchema.parse({}));

const withRights = (person: Person, firmId: string) => (section: SectionSummary) => {
	const subject = { firmId, createdBy: section.createdBy.id, status: section.status };
	return {
		...section,
		mayChange: may(person, 'section.update', subject),
		mayDelete: may(person, 'section.delete', subject)
	};
};

const ours = async (person: Person, asked: Record<string, string>) => {
	const query = sectionsAsked.parse(asked);
	const { firm } = person;
	if (!firm || !may(person, 'rack.read')) return null;
	const page = await listSections(firm.id, query);
	return { ...page, items: page.items.map(withRights(person, firm.id)), q: query.q };
};

const shipped = async (asked: Record<string, string>) => {
	const filled = Object.entries(asked).filter(([, value]) => value !== '');
	const query = shapesAsked.parse(Object.fromEntries(filled));
	const [page, catalogues] = await Promise.all([listShapes(query), listCatalogues()]);
	const { q, catalogue = '' } = query;
	return { ...page, catalogues, q, catalogue };
};

/** Everything that the Rack shows: the firm's own sections, or the shipped catalogues. */
export const rackView = async (person: Person | null, parameters: URLSearchParams) => {
	const { in: wish, ...asked } = Object.fromEntries(parameters);
	const shown = side.catch(person?.firm ? 'ours' : 'catalogues').parse(wish);
	return {
		shown,
		ours: shown === 'ours' && person ? await ours(person, asked) : null,
		shipped: shown === 'catalogues' ? await shipped(asked) : null,
		mayCreate: may(person, 'section.create')
	};
};
export type RackView = Awaited<ReturnType<typeof rackView>>;
