import type { SectionRecord, SectionState, UpdateSectionRequest } from '../../api/sections';
import { fail, ok, type Result } from '../../engine/result';
import type { Transaction } from '../db/connection';
import { writeTransaction } from '../db/retry';
import type { Refusal } from '../http/refusal';
import { holdSection, insertVersion, type SectionContent } from '../queries/section-writes';
import { may } from '../rights/may';
import type { Person } from '../rights/person';
import { movedOn, noSection, notAllowed, type MovedOn } from './refusals';
import { noteDeed, refusingTakenNames } from './saving';
import { sectionFacts } from './section-facts';

type Changed = Result<SectionRecord, Refusal | MovedOn>;

/** Approval is of the steel: new dimensions or settings stand as a draft until approved again. */
const statusAfter = (before: SectionRecord, changes: UpdateSectionRequest): SectionState => {
	if (changes.status) return changes.status;
	return changes.definition || changes.settings ? 'draft' : before.status;
};

const contentAfter = (
	before: SectionRecord,
	changes: UpdateSectionRequest
): Result<SectionContent, Refusal> => {
	const facts = sectionFacts(
		changes.definition ?? before.definition,
		changes.settings ?? before.settings
	);
	if (!facts.ok) return facts;
	const { name, standard, project, remark } = { ...before, ...withoutAbsent(changes) };
	const status = statusAfter(before, changes);
	return ok({ name, standard, project, remark, ...facts.value, status });
};

const withoutAbsent = (changes: UpdateSectionRequest): UpdateSectionRequest =>
	Object.fromEntries(
		Object.entries(changes).filter(([, value]) => value !== undefined)
	) as UpdateSectionRequest;

/** Why this person may not make these changes, or null. */
const objection = (
	person: Person,
	firmId: string,
	before: SectionRecord,
	{ status }: UpdateSectionRequest
): Refusal | null => {
	const subject = { firmId, createdBy: before.createdBy.id, status: before.status };
	if (!may(person, 'section.update', subject)) return notAllowed('section.update', person.role);
	const approves = status !== undefined && status !== before.status;
	if (approves && !may(person, 'rack.approve', subject))
		return notAllowed('rack.approve', person.role);
	return null;
};

const change = async (
	tx: Transaction,
	person: Person,
	firmId: string,
	id: string,
	changes: UpdateSectionRequest
): Promise<Changed> => {
	const held = await holdSection(tx, firmId, id);
	if (!held || held.deleted) return fail(noSection);
	const before = held.record;
	const refusal = objection(person, firmId, before, changes);
	if (refusal) return fail(refusal);
	if (before.version !== changes.version) return fail(movedOn(changes, before));
	const content = contentAfter(before, changes);
	if (!content.ok) return content;
	const version = before.version + 1;
	await insertVersion(tx, id, version, content.value, person.id);
	await noteDeed(tx, person, firmId, 'section.update', { id, name: content.value.name, version });
	const after = await holdSection(tx, firmId, id);
	return after ? ok(after.record) : fail(noSection);
};

/**
 * Saves changes as the next version. Refused with both states when somebody else saved since
 * `changes.version`.
 */
export const updateSection = async (
	person: Person,
	id: string,
	changes: UpdateSectionRequest
): Promise<Changed> => {
	const { firm, role } = person;
	if (!firm) return fail(notAllowed('section.update', role));
	return refusingTakenNames<SectionRecord, Refusal | MovedOn>(
		() => changes.name ?? 'this',
		() => writeTransaction((tx) => change(tx, person, firm.id, id, changes))
	);
};
