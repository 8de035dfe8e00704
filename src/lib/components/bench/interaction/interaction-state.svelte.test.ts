import { flushSync } from 'svelte';
import { describe, expect, it, vi } from 'vitest';
import { fail, ok } from '$lib/engine/result';
import { solvedInteraction } from '$lib/workers/interaction-handler';
import { Bench } from '../bench.svelte';
import { openingAddressed } from '../opened-study';
import { Interaction, type SolveInteraction } from './interaction-state.svelte';

const goOn = () => Promise.resolve(true);
/** The worker's own work, done here. */
const atHand: SolveInteraction = (asked) => ({
	id: 1,
	result: solvedInteraction(asked, { goOn }).then((value) => ok(value)),
	cancel: () => {}
});

/** An interaction that is followed as the panel follows it. */
function followed(solve: SolveInteraction) {
	const bench = new Bench(openingAddressed);
	const own = new Interaction(bench, solve);
	const stop = $effect.root(() => {
		$effect(() => own.follow());
	});
	flushSync();
	return { bench, own, stop };
}
const keys = ({ series }: Interaction) => series.map(({ key }) => key);

describe('interaction on the Bench', () => {
	it('shows the cases at once and the three curves when they are there', async () => {
		const { own, stop } = followed(atHand);
		expect([own.computing, own.drawn, keys(own)]).toEqual([true, false, ['cases']]);
		await vi.waitFor(() => expect(own.current).toBe(true));
		expect(keys(own)).toEqual(['cases', 'plastic', 'first-yield', 'code']);
		expect(own.factors).toHaveLength(1);
		stop();
	});

	it('keeps the last curves, known as such and without factors, until the new ones are there', async () => {
		const { bench, own, stop } = followed(atHand);
		await vi.waitFor(() => expect(own.current).toBe(true));
		const before = own.series.find(({ key }) => key === 'plastic');
		bench.changeCase(0, { N: -500 });
		flushSync();
		expect([own.current, own.computing, own.drawn]).toEqual([false, true, true]);
		expect(own.series.find(({ key }) => key === 'plastic')).toEqual(before);
		expect(own.factors).toEqual([]);
		await vi.waitFor(() => expect(own.current).toBe(true));
		expect(own.factors).toHaveLength(1);
		stop();
	});

	it('shows no curve of another plane', async () => {
		const { own, stop } = followed(atHand);
		await vi.waitFor(() => expect(own.current).toBe(true));
		own.plane = 'My-Mz';
		flushSync();
		expect([own.drawn, keys(own)]).toEqual([false, ['cases']]);
		await vi.waitFor(() => expect(own.current).toBe(true));
		stop();
	});

	it('says why it failed', async () => {
		const { own, stop } = followed(() => ({
			id: 1,
			result: Promise.resolve(fail({ reason: 'failed', message: 'It stopped.' })),
			cancel: () => {}
		}));
		await vi.waitFor(() => expect(own.failure).toBe('It stopped.'));
		expect(own.computing).toBe(false);
		stop();
	});
});
