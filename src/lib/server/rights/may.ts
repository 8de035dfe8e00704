import type { Role } from './roles';
import { rights, type Action, type Reach, type Subject } from './table';

/** What rights are judged by: who, and as what in the firm in hand. */
export interface Holder {
	id: string;
	firm: { id: string } | null;
	role: Role | null;
}

const reaches = (reach: Reach, holder: Holder, subject: Subject | undefined): boolean => {
	switch (reach) {
		case 'any':
			return true;
		case 'draft':
			return subject?.status === undefined || subject.status === 'draft';
		case 'others':
			return subject?.createdBy !== undefined && subject.createdBy !== holder.id;
		case 'none':
			return false;
		default:
			return reach satisfies never;
	}
};

/**
 * Whether the person may do that, in the firm in hand. Nobody signed in, or another firm's subject:
 * never. Without a subject: whether the role allows it at all (to something new, or to a draft).
 */
export const may = (holder: Holder | null, action: Action, subject?: Subject): boolean => {
	if (!holder?.firm || !holder.role) return false;
	if (subject && subject.firmId !== holder.firm.id) return false;
	return reaches(rights[action][holder.role], holder, subject);
};
