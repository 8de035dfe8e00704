import { and, eq } from 'drizzle-orm';
import type { SectionRecord, SectionState } from '../../api/sections';
import type { Transaction } from '../db/connection';
import { sections, sectionVersions } from '../db/schema';
import type { SectionFacts } from '../sections/section-facts';
import { sectionIdentity } from './section-identity';
import { recordOf, recordRows } from './section-rows';

/** What people say of a section, beside its steel. */
export interface SectionWords {
	name: string;
	standard: string;
	project: string;
	remark: string;
}

/** Everything that one version of a section consists of. */
export type SectionContent = SectionWords & SectionFacts & { status: SectionState };

/** The row as it stands, held until the transaction ends; `deleted` tells whether it was deleted. */
export interface HeldSection {
	firmId: string;
	deleted: boolean;
	record: SectionRecord;
}

/** Locks the section's row alone, then reads it with the names of its people. */
export const holdSection = async (
	tx: Transaction,
	firmId: string,
	id: string
): Promise<HeldSection | null> => {
	const ours = and(eq(sections.id, id), eq(sections.firmId, firmId));
	await tx.select({ id: sections.id }).from(sections).where(ours).for('update');
	const [row] = await recordRows(tx).where(ours).limit(1);
	return row ? { firmId, deleted: row.deletedAt !== null, record: recordOf(row) } : null;
};

const keepVersion = async (
	tx: Transaction,
	sectionId: string,
	version: number,
	content: SectionContent,
	savedBy: string
): Promise<void> => {
	const { kind: _kind, area: _area, mass: _mass, h: _h, b: _b, ...kept } = content;
	await tx.insert(sectionVersions).values({ ...kept, sectionId, version, savedBy });
};

/** A new section and its first version. Throws ER_DUP_ENTRY when the Rack has the name already. */
export const insertSection = async (
	tx: Transaction,
	id: string,
	firmId: string,
	content: SectionContent,
	personId: string
): Promise<void> => {
	const identity = sectionIdentity(content.name, content.standard);
	const by = { createdBy: personId, updatedBy: personId };
	await tx.insert(sections).values({ id, firmId, ...content, identity, ...by });
	await keepVersion(tx, id, 1, content, personId);
};

/** The next version of a section. Throws ER_DUP_ENTRY when the Rack has the name already. */
export const insertVersion = async (
	tx: Transaction,
	id: string,
	version: number,
	content: SectionContent,
	personId: string
): Promise<void> => {
	const identity = sectionIdentity(content.name, content.standard);
	const now = { updatedBy: personId, updatedAt: new Date() };
	await tx
		.update(sections)
		.set({ ...content, identity, version, ...now })
		.where(eq(sections.id, id));
	await keepVersion(tx, id, version, content, personId);
};

/** Takes a section off the Rack; its name is free again. */
export const markDeleted = async (tx: Transaction, id: string): Promise<void> => {
	await tx
		.update(sections)
		.set({ deletedAt: new Date(), identity: null })
		.where(eq(sections.id, id));
};

/** Puts it back. Throws ER_DUP_ENTRY when another one has taken the name since. */
export const markRestored = async (tx: Transaction, record: SectionRecord): Promise<void> => {
	await tx
		.update(sections)
		.set({ deletedAt: null, identity: sectionIdentity(record.name, record.standard) })
		.where(eq(sections.id, record.id));
};
