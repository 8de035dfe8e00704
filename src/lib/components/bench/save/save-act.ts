/** What the person at the screen may do with what is on the Bench. */
export interface SaveRights {
	/** Put a new section on the Rack. */
	readonly create: boolean;
	/** Save over the section that is open. */
	readonly change: boolean;
}

export type SaveAct = 'sign-in' | 'name' | 'over' | 'copy' | 'none';

/**
 * What pressing Save means: sign in first, give a name first, save over what is open, or only as a
 * new section (`copy`); `none` for those who may look but not save.
 */
export function saveAct(signedIn: boolean, saved: boolean, rights: SaveRights): SaveAct {
	if (!signedIn) return 'sign-in';
	if (saved && rights.change) return 'over';
	if (!rights.create) return 'none';
	return saved ? 'copy' : 'name';
}

/** Why nothing can be saved here, or not over what is open; empty where it can. */
export function saveReason(act: SaveAct, role: string | null, status: string | null): string {
	if (act === 'none')
		return role
			? `As ${role} you may look and try, not save. Ask an owner of the firm.`
			: 'You belong to no firm yet, so there is no Rack to save to.';
	if (act !== 'copy') return '';
	const state = status === 'withdrawn' ? 'withdrawn' : 'approved';
	return `This section is ${state}: only an owner or a librarian may change it. Save yours as new.`;
}
