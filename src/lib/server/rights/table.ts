import type { Role } from './roles';

/** Everything that rights are asked for, named `<noun>.<verb>`. */
export const actions = [
	'rack.read',
	'section.read',
	'section.create',
	'section.update',
	'section.delete',
	'section.restore',
	'rack.approve',
	'rack.import',
	'rack.export',
	'sheet.read',
	'sheet.write',
	'sheet.check',
	'crew.read',
	'crew.manage',
	'firm.manage',
	'settings.read',
	'settings.update',
	'log.read'
] as const;
export type Action = (typeof actions)[number];

/** What the action is done to: whose it is, and where it stands. */
export interface Subject {
	firmId: string;
	createdBy?: string;
	status?: 'draft' | 'approved' | 'withdrawn';
}

/**
 * How far a right goes:
 * `any` of the firm's; `draft`: only what is still a draft; `others`: only what somebody else made;
 * `none`.
 */
export type Reach = 'any' | 'draft' | 'others' | 'none';

type Row = Readonly<Record<Role, Reach>>;

const everyone: Row = {
	owner: 'any',
	librarian: 'any',
	designer: 'any',
	checker: 'any',
	reader: 'any'
};
const nobody: Row = {
	owner: 'none',
	librarian: 'none',
	designer: 'none',
	checker: 'none',
	reader: 'none'
};
/** Approved sections change only in the hands of those who answer for the Rack. */
const keepers: Row = { ...nobody, owner: 'any', librarian: 'any', designer: 'draft' };

/** The table of rights: role × action. The only place where it is decided who may do what. */
export const rights: Readonly<Record<Action, Row>> = {
	'rack.read': everyone,
	'section.read': everyone,
	'section.create': { ...nobody, owner: 'any', librarian: 'any', designer: 'any' },
	'section.update': keepers,
	'section.delete': keepers,
	'section.restore': keepers,
	'rack.approve': { ...nobody, owner: 'any', librarian: 'any' },
	'rack.import': { ...nobody, owner: 'any', librarian: 'any' },
	'rack.export': everyone,
	'sheet.read': everyone,
	'sheet.write': { ...nobody, owner: 'any', librarian: 'any', designer: 'any' },
	'sheet.check': { ...nobody, owner: 'others', checker: 'others' },
	'crew.read': everyone,
	'crew.manage': { ...nobody, owner: 'any' },
	'firm.manage': { ...nobody, owner: 'any' },
	'settings.read': everyone,
	'settings.update': { ...nobody, owner: 'any', librarian: 'any' },
	'log.read': { ...nobody, owner: 'any' }
};
