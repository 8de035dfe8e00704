import { getContext, hasContext, setContext, tick } from 'svelte';
import type { Explanation, Working } from '$lib/engine/explain/working';

/** A figure's key, or several of which the first that has a working is meant. */
export type FigureKey = string | readonly string[] | null;

/** Which working is open, and the way there; the workings are made once one is asked for. */
export class Explaining {
	readonly #make: () => Explanation;
	#trail = $state.raw<readonly string[]>([]);
	#at = $state(0);
	#opener: Element | null = null;

	constructor(make: () => Explanation) {
		this.#make = make;
	}

	/** Read only while a panel is open or a page is printed: it costs an analysis. */
	readonly all: Explanation = $derived.by(() => this.#make());

	get isOpen(): boolean {
		return this.#trail.length > 0;
	}
	get key(): string | null {
		return this.#trail[this.#at] ?? null;
	}
	/** Null where the figure that was asked for is no longer on the Bench. */
	get working(): Working | null {
		return this.key === null ? null : (this.all[this.key] ?? null);
	}
	get canGoBack(): boolean {
		return this.#at > 0;
	}
	get canGoForward(): boolean {
		return this.#at < this.#trail.length - 1;
	}

	/** Opens a working from a figure on the page; focus returns there. */
	open(asked: FigureKey, opener: Element): void {
		const key = this.keyOf(asked);
		if (key === null) return;
		this.#opener = opener;
		this.#trail = [key];
		this.#at = 0;
	}

	/** Goes on to the working of a number that was put in. */
	follow(key: string): void {
		this.#trail = [...this.#trail.slice(0, this.#at + 1), key];
		this.#at += 1;
	}

	back(): void {
		if (this.canGoBack) this.#at -= 1;
	}

	forward(): void {
		if (this.canGoForward) this.#at += 1;
	}

	close(): void {
		this.#trail = [];
		this.#at = 0;
		const opener = this.#opener;
		this.#opener = null;
		void tick().then(() => {
			if (opener instanceof HTMLElement || opener instanceof SVGElement) opener.focus();
		});
	}

	/** The key that has a working; the first asked where none has. */
	keyOf(asked: FigureKey): string | null {
		if (asked === null || typeof asked === 'string') return asked;
		return asked.find((key) => this.all[key] !== undefined) ?? asked[0] ?? null;
	}
}

const context = Symbol('explaining');

export const provideExplaining = (explaining: Explaining): Explaining =>
	setContext(context, explaining);

/** What opens workings; null where figures stand plain, as on paper. */
export const useExplaining = (): Explaining | null =>
	hasContext(context) ? getContext<Explaining>(context) : null;
