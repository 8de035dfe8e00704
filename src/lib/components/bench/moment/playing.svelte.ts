import type { BendState } from '../bend-state.svelte';

/** Ratio at which playing stops by itself, in either sense. */
const furthest = 6;
/** Multiples of first yield a second. */
const speed = 1.5;
/** For those who want no motion: steps of this ratio, each for as long, ms. */
const stepped = { ratio: 0.5, rest: 700 };

const wantsNoMotion = () =>
	typeof matchMedia === 'function' && matchMedia('(prefers-reduced-motion: reduce)').matches;

/** Which way bending goes on: on from a turn, back after it was turned, else the way it went. */
export function playSense(bend: Pick<BendState, 'ratio' | 'turned' | 'atTurn'>): 1 | -1 {
	const legs = bend.turned?.legs ?? [];
	const last = legs.at(-1);
	if (!last) return bend.ratio < 0 ? -1 : 1;
	const way = last.to < last.from ? -1 : 1;
	if (bend.atTurn) return way > 0 ? -1 : 1;
	return bend.ratio < last.to ? -1 : 1;
}

/** Moves the curvature steadily until it is paused or comes to its end. */
export class Playing {
	#on = $state(false);
	#stop = () => {};

	get on(): boolean {
		return this.#on;
	}

	play(bend: BendState): void {
		this.pause();
		const sense = playSense(bend);
		const end = sense * furthest;
		if ((end - bend.ratio) * sense <= 1e-9) return;
		this.#on = true;
		const move = (by: number) => {
			const next = bend.ratio + sense * by;
			const past = (end - next) * sense <= 0;
			bend.bendTo(past ? end : next);
			if (past || !bend.state.converged) this.pause();
		};
		this.#stop = wantsNoMotion() ? inSteps(move) : inFrames(move);
	}

	pause(): void {
		this.#stop();
		this.#stop = () => {};
		this.#on = false;
	}
}

function inSteps(move: (by: number) => void): () => void {
	const timer = setInterval(() => move(stepped.ratio), stepped.rest);
	return () => clearInterval(timer);
}

function inFrames(move: (by: number) => void): () => void {
	let before: number | null = null;
	let asked = requestAnimationFrame(function frame(now) {
		asked = requestAnimationFrame(frame);
		if (before !== null) move((Math.min(now - before, 100) / 1000) * speed);
		before = now;
	});
	return () => cancelAnimationFrame(asked);
}
