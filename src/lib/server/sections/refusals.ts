import type { SectionRecord, UpdateSectionRequest } from '../../api/sections';
import type { Refusal } from '../http/refusal';
import type { Action } from '../rights/table';

/** Somebody saved in between: what was sent, and how the section stands now. */
export interface MovedOn extends Refusal {
	readonly status: 409;
	readonly code: 'moved_on';
	readonly yours: UpdateSectionRequest;
	readonly theirs: SectionRecord;
}

export const movedOn = (yours: UpdateSectionRequest, theirs: SectionRecord): MovedOn => ({
	status: 409,
	code: 'moved_on',
	message: `${theirs.updatedBy.name} saved version ${theirs.version} of “${theirs.name}” while you were at version ${yours.version}. Look at both and choose.`,
	yours,
	theirs
});

export const isMovedOn = (refusal: Refusal): refusal is MovedOn => refusal.code === 'moved_on';

export const noSection: Refusal = {
	status: 404,
	code: 'unknown_section',
	message: 'There is no such section on your firm’s Rack. It may have been deleted.'
};

export const nameTaken = (name: string): Refusal => ({
	status: 409,
	code: 'name_taken',
	message: `The Rack already has a section called “${name}”. Give this one another name.`,
	issues: [{ path: 'name', message: 'This name is taken.' }]
});

const deeds: Partial<Record<Action, string>> = {
	'section.read': 'see sections of this firm',
	'section.create': 'save sections',
	'section.update': 'change this section',
	'section.delete': 'delete this section',
	'section.restore': 'bring this section back',
	'rack.approve': 'approve or withdraw sections'
};

export const notAllowed = (action: Action, role: string | null): Refusal => ({
	status: 403,
	code: role ? 'not_allowed' : 'no_firm',
	message: role
		? `As ${role} you may not ${deeds[action] ?? 'do this'}. Ask an owner of the firm.`
		: 'You do not belong to a firm yet, so there is no Rack to work on.'
});
