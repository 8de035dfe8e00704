/** What a list offers for a query; `signal` ends when a later query has been asked. */
export type Search<T> = (
	query: string,
	signal: AbortSignal
) => readonly T[] | Promise<readonly T[]>;

/**
 * The state behind a Combobox: query, offered items, the active one. The latest query wins; an
 * answer to an earlier one is dropped.
 */
export class ComboboxState<T> {
	open = $state(false);
	items = $state.raw<readonly T[]>([]);
	active = $state(-1);
	status = $state<'idle' | 'searching' | 'failed'>('idle');
	#asked: AbortController | null = null;
	readonly #search: () => Search<T>;

	constructor(search: () => Search<T>) {
		this.#search = search;
	}

	async ask(query: string) {
		this.#asked?.abort();
		const asked = new AbortController();
		this.#asked = asked;
		this.open = true;
		// No item of the last answer may be taken for one of this query.
		this.active = -1;
		this.status = 'searching';
		try {
			const answer = this.#search()(query, asked.signal);
			this.#take(answer instanceof Promise ? await answer : answer, asked);
		} catch {
			if (!asked.signal.aborted) this.#fail();
		}
	}

	#take(items: readonly T[], asked: AbortController) {
		if (asked.signal.aborted) return;
		this.items = items;
		this.active = items.length > 0 ? 0 : -1;
		this.status = 'idle';
	}

	#fail() {
		this.items = [];
		this.active = -1;
		this.status = 'failed';
	}

	/** Moves the active item, stopping at either end; one step past an end wraps round. */
	move(by: number, limit: number) {
		const last = Math.min(this.items.length, limit) - 1;
		if (last < 0) return;
		const next = this.active + by;
		const wraps = Math.abs(by) === 1 && (next < 0 || next > last);
		this.active = wraps ? (next < 0 ? last : 0) : Math.min(last, Math.max(0, next));
	}

	close() {
		this.#asked?.abort();
		this.open = false;
		this.status = 'idle';
		this.active = -1;
	}
}
