import type { NewSection, SectionRecord } from '../../api/sections';
import { fail, ok, type Result } from '../../engine/result';
import { databaseFailure } from '../db/failure';
import { newId } from '../db/ids';
import type { Transaction } from '../db/connection';
import { writeTransaction } from '../db/retry';
import type { Refusal } from '../http/refusal';
import { record } from '../queries/audit-log';
import { holdSection, insertSection } from '../queries/section-writes';
import { may } from '../rights/may';
import type { Person } from '../rights/person';
import { nameTaken, noSection, notAllowed } from './refusals';
import { sectionFacts } from './section-facts';

/** One line in the log of who did what to a section. */
export const noteDeed = (
	tx: Transaction,
	person: Pick<Person, 'id'>,
	firmId: string,
	action: string,
	section: { id: string; name: string; version: number }
): Promise<void> => {
	const { id, name, version } = section;
	const subject = { kind: 'section', id };
	return record(tx, { firmId, userId: person.id, action, subject, detail: { name, version } });
};

/** Runs the work; a name that another section has comes back as a refusal. */
export const refusingTakenNames = async <T, E extends Refusal>(
	name: () => string,
	work: () => Promise<Result<T, E>>
): Promise<Result<T, E | Refusal>> => {
	try {
		return await work();
	} catch (error) {
		if (databaseFailure(error)?.code === 'ER_DUP_ENTRY') return fail(nameTaken(name()));
		throw error;
	}
};

/** Puts a section on the Rack of the firm in hand, as a draft. */
export const createSection = async (
	person: Person,
	{ definition, settings, ...words }: NewSection
): Promise<Result<SectionRecord, Refusal>> => {
	const { firm, role } = person;
	if (!firm || !may(person, 'section.create')) return fail(notAllowed('section.create', role));
	const facts = sectionFacts(definition, settings);
	if (!facts.ok) return facts;
	const id = newId();
	const content = { ...words, ...facts.value, status: 'draft' as const };
	const insert = async (tx: Transaction): Promise<Result<SectionRecord, Refusal>> => {
		await insertSection(tx, id, firm.id, content, person.id);
		await noteDeed(tx, person, firm.id, 'section.create', { id, name: words.name, version: 1 });
		const held = await holdSection(tx, firm.id, id);
		return held ? ok(held.record) : fail(noSection);
	};
	return refusingTakenNames(
		() => words.name,
		() => writeTransaction(insert)
	);
};
