import type { SectionRecord } from '../../api/sections';
import { fail, ok, type Result } from '../../engine/result';
import type { Transaction } from '../db/connection';
import { writeTransaction } from '../db/retry';
import type { Refusal } from '../http/refusal';
import { holdSection, markDeleted, markRestored } from '../queries/section-writes';
import { may } from '../rights/may';
import type { Person } from '../rights/person';
import { noSection, notAllowed } from './refusals';
import { noteDeed, refusingTakenNames } from './saving';

type Deed = 'section.delete' | 'section.restore';

/** The section held for the deed, if it is there and this person may do it. */
const heldFor = async (
	tx: Transaction,
	person: Person,
	id: string,
	deed: Deed
): Promise<Result<{ firmId: string; record: SectionRecord; deleted: boolean }, Refusal>> => {
	const held = person.firm ? await holdSection(tx, person.firm.id, id) : null;
	if (!held) return fail(person.firm ? noSection : notAllowed(deed, person.role));
	const { firmId, record } = held;
	const subject = { firmId, createdBy: record.createdBy.id, status: record.status };
	return may(person, deed, subject) ? ok(held) : fail(notAllowed(deed, person.role));
};

/** Takes a section off the Rack. Its versions are kept, and `restoreSection` brings it back. */
export const deleteSection = (
	person: Person,
	id: string
): Promise<Result<SectionRecord, Refusal>> =>
	writeTransaction(async (tx) => {
		const held = await heldFor(tx, person, id, 'section.delete');
		if (!held.ok) return held;
		const { firmId, record, deleted } = held.value;
		if (deleted) return fail(noSection);
		await markDeleted(tx, id);
		await noteDeed(tx, person, firmId, 'section.delete', record);
		return ok(record);
	});

/** Puts a deleted section back; one that stands already stays as it is. */
export const restoreSection = (
	person: Person,
	id: string
): Promise<Result<SectionRecord, Refusal>> => {
	let name = '';
	const restore = async (tx: Transaction): Promise<Result<SectionRecord, Refusal>> => {
		const held = await heldFor(tx, person, id, 'section.restore');
		if (!held.ok) return held;
		const { firmId, record, deleted } = held.value;
		name = record.name;
		if (deleted) {
			await markRestored(tx, record);
			await noteDeed(tx, person, firmId, 'section.restore', record);
		}
		return ok(record);
	};
	return refusingTakenNames(
		() => name,
		() => writeTransaction(restore)
	);
};
