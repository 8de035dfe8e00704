import { describe, expect, it } from 'vitest';
import { may, type Holder } from './may';
import { roles, type Role } from './roles';
import { actions, type Action, type Subject } from './table';

const firmId = 'tarn-bridge';
const as = (role: Role): Holder => ({ id: 'me', firm: { id: firmId }, role });

const draft: Subject = { firmId, createdBy: 'me', status: 'draft' };
const approved: Subject = { firmId, createdBy: 'me', status: 'approved' };
const elsewhere: Subject = { firmId: 'another-firm', createdBy: 'me', status: 'draft' };

/** Written out by hand from the description of the roles, one letter a role: O L D C R. */
const onDrafts: Record<Action, string> = {
	'rack.read': 'OLDCR',
	'section.read': 'OLDCR',
	'section.create': 'OLD',
	'section.update': 'OLD',
	'section.delete': 'OLD',
	'section.restore': 'OLD',
	'rack.approve': 'OL',
	'rack.import': 'OL',
	'rack.export': 'OLDCR',
	'sheet.read': 'OLDCR',
	'sheet.write': 'OLD',
	'sheet.check': '',
	'crew.read': 'OLDCR',
	'crew.manage': 'O',
	'firm.manage': 'O',
	'settings.read': 'OLDCR',
	'settings.update': 'OL',
	'log.read': 'O'
};
const letter = (role: Role) => role.charAt(0).toUpperCase();

describe.each(actions)('%s', (action) => {
	it.each(roles)('is answered for a draft of their own to the %s as written down', (role) => {
		expect(may(as(role), action, draft)).toBe(onDrafts[action].includes(letter(role)));
	});

	it.each(roles)('is never allowed to the %s on what another firm has', (role) => {
		expect(may(as(role), action, elsewhere)).toBe(false);
	});

	it('is never allowed to somebody who is not signed in or belongs to no firm', () => {
		expect(may(null, action)).toBe(false);
		expect(may({ id: 'me', firm: null, role: null }, action)).toBe(false);
		expect(may({ id: 'me', firm: { id: firmId }, role: null }, action, draft)).toBe(false);
	});
});

describe('an approved section', () => {
	it.each(['section.update', 'section.delete', 'section.restore'] as const)(
		'meets %s only from owner and librarian',
		(action) => {
			const allowed = roles.filter((role) => may(as(role), action, approved));
			expect(allowed).toEqual(['owner', 'librarian']);
		}
	);

	it('is read by all', () => {
		expect(roles.every((role) => may(as(role), 'section.read', approved))).toBe(true);
	});
});

describe('a sheet', () => {
	it('is signed by a checker or an owner, and never by its maker', () => {
		const theirs: Subject = { firmId, createdBy: 'somebody else' };
		expect(roles.filter((role) => may(as(role), 'sheet.check', theirs))).toEqual([
			'owner',
			'checker'
		]);
		expect(roles.some((role) => may(as(role), 'sheet.check', { firmId, createdBy: 'me' }))).toBe(
			false
		);
	});

	it('of unknown maker is signed by nobody', () => {
		expect(roles.some((role) => may(as(role), 'sheet.check', { firmId }))).toBe(false);
	});
});
