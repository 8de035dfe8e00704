import type { FirmSettings, FirmSettingsRequest } from '../../api/firm-settings';
import { fail, ok, type Result } from '../../engine/result';
import type { PlateStock } from '../../engine/unlock/plate-stock';
import { db, type Transaction } from '../db/connection';
import { databaseFailure } from '../db/failure';
import { writeTransaction } from '../db/retry';
import type { Refusal } from '../http/refusal';
import { record } from '../queries/audit-log';
import { holdSettings, keepSettings, settingsOf } from '../queries/firm-settings';
import { may } from '../rights/may';
import type { Firm, Person } from '../rights/person';
import { defaultStock } from './default-stock';

/** The firm in hand with its settings, as the API answers them. */
export interface FirmState {
	readonly firm: Pick<Firm, 'id' | 'name'>;
	readonly settings: FirmSettings;
	readonly defaultStock: PlateStock;
}

/** Somebody saved in between: what was sent, and how it stands now. */
export interface SettingsMovedOn extends Refusal {
	readonly status: 409;
	readonly code: 'moved_on';
	readonly yours: FirmSettingsRequest;
	readonly theirs: FirmSettings;
}

type Settled = Result<FirmState, Refusal | SettingsMovedOn>;

const notAllowed = (role: string | null): Refusal => ({
	status: 403,
	code: role ? 'not_allowed' : 'no_firm',
	message: role
		? `As ${role} you may not change the firm’s settings. Ask an owner or the librarian.`
		: 'You do not belong to a firm yet, so there are no settings to share.'
});

const movedOn = (yours: FirmSettingsRequest, theirs: FirmSettings): SettingsMovedOn => ({
	status: 409,
	code: 'moved_on',
	message: `${theirs.updatedBy ?? 'Somebody'} changed the firm’s settings (version ${theirs.version}) while you were at version ${yours.version}. Look at both and choose.`,
	yours,
	theirs
});

const stateOf = ({ id, name }: Firm, settings: FirmSettings): FirmState => ({
	firm: { id, name },
	settings,
	defaultStock: defaultStock()
});

/** Settings of the firm in hand; every member may read them. */
export const readFirm = async (person: Person): Promise<Result<FirmState, Refusal>> => {
	const { firm, role } = person;
	if (!firm || !may(person, 'settings.read')) return fail(notAllowed(role));
	return ok(stateOf(firm, await settingsOf(db(), firm.id)));
};

const change = async (
	tx: Transaction,
	person: Person,
	firm: Firm,
	changes: FirmSettingsRequest
): Promise<Settled> => {
	await holdSettings(tx, firm.id);
	const before = await settingsOf(tx, firm.id);
	if (before.version !== changes.version) return fail(movedOn(changes, before));
	const { code = before.code, stock = before.stock } = changes;
	const version = before.version + 1;
	await keepSettings(tx, firm.id, person.id, { version, code, stock });
	const subject = { kind: 'firm', id: firm.id };
	const detail = { version, code: changes.code !== undefined, stock: changes.stock !== undefined };
	await record(tx, {
		firmId: firm.id,
		userId: person.id,
		action: 'settings.update',
		subject,
		detail
	});
	return ok(stateOf(firm, await settingsOf(tx, firm.id)));
};

/** Saves changes as the next version; refused with both states when somebody saved since. */
export const updateFirm = async (
	person: Person,
	changes: FirmSettingsRequest
): Promise<Settled> => {
	const { firm, role } = person;
	if (!firm || !may(person, 'settings.update')) return fail(notAllowed(role));
	try {
		return await writeTransaction((tx) => change(tx, person, firm, changes));
	} catch (error) {
		if (databaseFailure(error)?.code !== 'ER_DUP_ENTRY') throw error;
		return fail(movedOn(changes, await settingsOf(db(), firm.id)));
	}
};
