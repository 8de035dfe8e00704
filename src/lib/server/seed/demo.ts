import { eq } from 'drizzle-orm';
import { createSectionRequest } from '../../api/sections';
import { passwordHash } from '../auth/password';
import { db, type Transaction } from '../db/connection';
import { databaseFailure } from '../db/failure';
import { newId } from '../db/ids';
import { writeTransaction } from '../db/retry';
import { firms, memberships, users } from '../db/schema';
import { log } from '../log';
import { insertSection } from '../queries/section-writes';
import type { Role } from '../rights/roles';
import { sectionFacts } from '../sections/section-facts';
import { demoAccounts } from './demo-accounts';
import { demoSections, type DemoSection } from './demo-sections';

type Crew = ReadonlyMap<Role, string>;

const insertCrew = async (tx: Transaction, firmId: string, hash: string): Promise<Crew> => {
	const crew = new Map<Role, string>();
	for (const { name, email, role } of demoAccounts.people) {
		const id = newId();
		await tx.insert(users).values({ id, name, email, passwordHash: hash });
		await tx.insert(memberships).values({ firmId, userId: id, role });
		crew.set(role, id);
	}
	return crew;
};

const insertDemoSection = async (
	tx: Transaction,
	firmId: string,
	crew: Crew,
	{ section, by, status }: DemoSection
): Promise<void> => {
	const { definition, settings, ...words } = createSectionRequest.parse(section);
	const facts = sectionFacts(definition, settings);
	const personId = crew.get(by);
	if (!facts.ok || !personId) throw new Error(`The demo section ${words.name} is not valid.`);
	await insertSection(tx, newId(), firmId, { ...words, ...facts.value, status }, personId);
};

const insertFirm = (hash: string): Promise<void> =>
	writeTransaction(async (tx) => {
		const firmId = newId();
		await tx.insert(firms).values({ id: firmId, name: demoAccounts.firm, demo: true });
		const crew = await insertCrew(tx, firmId, hash);
		for (const section of [...demoSections].reverse())
			await insertDemoSection(tx, firmId, crew, section);
	});

/** Whether the demo firm is in the database. */
export const demoStands = async (): Promise<boolean> => {
	const rows = await db().select({ id: firms.id }).from(firms).where(eq(firms.demo, true)).limit(1);
	return rows.length > 0;
};

/**
 * The invented firm with its people and Rack, unless it stands already. True when made now; false
 * too when somebody has signed up under one of its addresses, which is theirs then.
 */
export const seedDemo = async (): Promise<boolean> => {
	if (await demoStands()) return false;
	try {
		await insertFirm(await passwordHash(demoAccounts.password));
		return true;
	} catch (error) {
		if (databaseFailure(error)?.code !== 'ER_DUP_ENTRY') throw error;
		log.warn('The demo firm was not made: one of its addresses is in use.');
		return false;
	}
};
