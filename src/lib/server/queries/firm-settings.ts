import { eq } from 'drizzle-orm';
import type { FirmSettings } from '../../api/firm-settings';
import type { Transaction, Writer } from '../db/connection';
import { firmSettings, users } from '../db/schema';

/** What a firm keeps that has settled nothing. */
export const nothingSettled: FirmSettings = {
	version: 0,
	code: null,
	stock: null,
	updatedBy: null,
	updatedAt: null
};

/** Keeps the firm's settings from changing until the transaction ends. */
export const holdSettings = async (tx: Transaction, firmId: string): Promise<void> => {
	const ours = eq(firmSettings.firmId, firmId);
	await tx.select({ firmId: firmSettings.firmId }).from(firmSettings).where(ours).for('update');
};

/** The firm's settings as they stand. */
export const settingsOf = async (reader: Writer, firmId: string): Promise<FirmSettings> => {
	const [row] = await reader
		.select({ settings: firmSettings, name: users.name })
		.from(firmSettings)
		.innerJoin(users, eq(users.id, firmSettings.updatedBy))
		.where(eq(firmSettings.firmId, firmId));
	if (!row) return nothingSettled;
	const { version, code, stock, updatedAt } = row.settings;
	return {
		version,
		code: code ?? null,
		stock: stock ? { ...stock, thicknesses: [...stock.thicknesses] } : null,
		updatedBy: row.name,
		updatedAt: updatedAt.toISOString()
	};
};

/** Writes the next version. Throws ER_DUP_ENTRY when another first version was quicker. */
export const keepSettings = async (
	tx: Transaction,
	firmId: string,
	personId: string,
	{ version, code, stock }: Pick<FirmSettings, 'version' | 'code' | 'stock'>
): Promise<void> => {
	const row = { version, code, stock, updatedBy: personId, updatedAt: new Date() };
	if (version === 1) await tx.insert(firmSettings).values({ firmId, ...row });
	else await tx.update(firmSettings).set(row).where(eq(firmSettings.firmId, firmId));
};
