import type { SectionRecord } from '../../api/sections';
import { fail, ok, type Result } from '../../engine/result';
import type { Refusal } from '../http/refusal';
import { sectionOf } from '../queries/sections';
import { may } from '../rights/may';
import type { Person } from '../rights/person';
import { noSection, notAllowed } from './refusals';

/** A section on the Rack of the firm in hand; another firm's is as good as none. */
export const readSection = async (
	person: Person,
	id: string
): Promise<Result<SectionRecord, Refusal>> => {
	const { firm, role } = person;
	if (!firm || !may(person, 'section.read')) return fail(notAllowed('section.read', role));
	const section = await sectionOf(firm.id, id);
	return section ? ok(section) : fail(noSection);
};
