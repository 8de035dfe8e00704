import { createSection, updateSection, type SectionFailure } from '$lib/api/sections-client';
import type { SectionConflict, SectionRecord } from '$lib/api/sections';
import type { Result } from '$lib/engine/result';
import type { Bench } from '../bench.svelte';
import type { Study } from '../study';
import type { SaveRights } from './save-act';
import { savedStudy, sectionToSave } from './saved-study';

export interface SavedMark {
	readonly id: string;
	readonly name: string;
	readonly version: number;
	readonly status: SectionRecord['status'];
	readonly study: Study;
}

/** Who holds which version of the section on the Bench, and the ways to save it. */
export class Saving {
	saved = $state.raw<SavedMark | null>(null);
	conflict = $state.raw<SectionConflict | null>(null);
	busy = $state(false);
	fault = $state('');
	#rights = $state.raw<SaveRights>({ create: true, change: true });
	readonly #bench: Bench;
	readonly #fetcher: typeof fetch;

	constructor(
		bench: Bench,
		record: SectionRecord | null,
		rights: SaveRights,
		fetcher: typeof fetch = fetch
	) {
		this.#bench = bench;
		this.#rights = rights;
		this.#fetcher = fetcher;
		this.saved = record && markOf(record, bench.study);
	}

	get rights(): SaveRights {
		return this.#rights;
	}

	get changed(): boolean {
		return this.saved !== null && this.saved.study !== this.#bench.study;
	}

	/** Puts the study on the Rack as a new section; its id, or null with a fault told. */
	async saveNew(name: string): Promise<string | null> {
		const { study } = this.#bench;
		const answer = await this.#call(() =>
			createSection({ name, ...sectionToSave(study) }, this.#fetcher)
		);
		return this.#take(answer, study);
	}

	/** Saves over the version it was read at, or over `version` where that was chosen. */
	async saveOver(version = this.saved?.version ?? 0): Promise<string | null> {
		const { saved } = this;
		const { study } = this.#bench;
		if (!saved) return null;
		const answer = await this.#call(() =>
			updateSection(saved.id, { version, ...sectionToSave(study) }, this.#fetcher)
		);
		return this.#take(answer, study);
	}

	/** Drops the own changes and takes what the other person saved. */
	keepTheirs(): void {
		if (!this.conflict) return;
		const { theirs } = this.conflict;
		this.#bench.restart({ study: savedStudy(theirs), bend: this.#bench.bendChoice });
		this.saved = markOf(theirs, this.#bench.study);
		this.conflict = null;
	}

	async #call(
		work: () => Promise<Result<SectionRecord, SectionFailure>>
	): Promise<Result<SectionRecord, SectionFailure>> {
		this.busy = true;
		this.fault = '';
		const answer = await work();
		this.busy = false;
		return answer;
	}

	#take(answer: Result<SectionRecord, SectionFailure>, study: Study): string | null {
		if (answer.ok) {
			this.saved = markOf(answer.value, study);
			this.#rights = { ...this.#rights, change: true };
			this.conflict = null;
			return answer.value.id;
		}
		if (answer.error.conflict) this.conflict = answer.error.conflict;
		else this.fault = this.#faultOf(answer.error);
		return null;
	}

	/** Whoever may save at all and is refused had the section approved under their hands. */
	#faultOf(failure: SectionFailure): string {
		const { create, change } = this.#rights;
		if (failure.status !== 403 || !create || !change || !this.saved) return faultText(failure);
		this.#rights = { create, change: false };
		return 'This section has been approved since you opened it, so only an owner or a librarian may change it. Your changes are still here: save them as new.';
	}
}

const markOf = ({ id, name, version, status }: SectionRecord, study: Study): SavedMark => ({
	id,
	name,
	version,
	status,
	study
});

function faultText({ status, message, issues }: SectionFailure): string {
	if (status === 401) return 'You have been signed out. Sign in and save again; the study is kept.';
	return issues[0] ? `${message} ${issues[0].message}` : message;
}
