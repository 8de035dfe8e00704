import { updateFirmSettings } from '$lib/api/firm-client';
import type { FirmInHand, FirmSettings, FirmSettingsRequest } from '$lib/api/firm-settings';

type Changes = Omit<FirmSettingsRequest, 'version'>;

/** The firm's settings on a page: kept, refused, or moved on while they were looked at. */
export class FirmKeeping {
	settings = $state.raw<FirmSettings | null>(null);
	busy = $state(false);
	fault = $state('');
	/** What was asked for, and what somebody else kept since. */
	conflict = $state.raw<{ yours: Changes; theirs: FirmSettings } | null>(null);

	constructor(firm: FirmInHand) {
		this.settings = firm.settings;
	}

	/** True once kept. */
	async keep(changes: Changes): Promise<boolean> {
		const version = this.settings?.version ?? 0;
		this.busy = true;
		this.fault = '';
		const kept = await updateFirmSettings({ version, ...changes });
		this.busy = false;
		if (kept.ok) {
			this.settings = kept.value;
			this.conflict = null;
		} else if (kept.error.theirs) this.conflict = { yours: changes, theirs: kept.error.theirs };
		else this.fault = kept.error.message;
		return kept.ok;
	}

	/** Gives way to what somebody else kept. */
	takeTheirs(): void {
		if (this.conflict) this.settings = this.conflict.theirs;
		this.conflict = null;
	}

	/** Keeps what was asked for over theirs, having seen both. */
	async keepMine(): Promise<boolean> {
		if (!this.conflict) return false;
		const { yours, theirs } = this.conflict;
		this.settings = theirs;
		this.conflict = null;
		return this.keep(yours);
	}
}

/** "Rosa Tarn, 2026-12-01 10:42 UTC"; empty while nothing was kept. */
export const keptBy = (settings: FirmSettings | null): string =>
	settings?.updatedAt
		? `${settings.updatedBy ?? 'somebody'}, ${settings.updatedAt.slice(0, 16).replace('T', ' ')} UTC`
		: '';
