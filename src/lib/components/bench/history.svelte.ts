const mostSteps = 200;
const sameStroke = 900;

/** States of one thing with undo and redo. Changes with the same key in quick succession are one step. */
export class History<T> {
	#past = $state.raw<readonly T[]>([]);
	#future = $state.raw<readonly T[]>([]);
	#present = $state.raw<T>() as T;
	#lastKey = '';
	#lastTime = -Infinity;

	constructor(first: T) {
		this.#present = first;
	}

	get present(): T {
		return this.#present;
	}
	get canUndo(): boolean {
		return this.#past.length > 0;
	}
	get canRedo(): boolean {
		return this.#future.length > 0;
	}

	/** Takes on a new state; `key` names what is changed (`tw`, `case 2 My`), `now` in ms. */
	change(next: T, key = '', now: number = performance.now()): void {
		const carriesOn = key !== '' && key === this.#lastKey && now - this.#lastTime < sameStroke;
		if (!carriesOn) this.#past = [...this.#past.slice(1 - mostSteps), this.#present];
		this.#future = [];
		this.#present = next;
		this.#lastKey = key;
		this.#lastTime = now;
	}

	undo(): void {
		const before = this.#past.at(-1);
		if (before === undefined) return;
		this.#future = [this.#present, ...this.#future];
		this.#past = this.#past.slice(0, -1);
		this.#present = before;
		this.#lastKey = '';
	}

	redo(): void {
		const after = this.#future[0];
		if (after === undefined) return;
		this.#past = [...this.#past, this.#present];
		this.#future = this.#future.slice(1);
		this.#present = after;
		this.#lastKey = '';
	}

	/** Starts anew from a state that is not to be undone. */
	restart(first: T): void {
		this.#past = [];
		this.#future = [];
		this.#present = first;
		this.#lastKey = '';
	}
}
