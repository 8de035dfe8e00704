import { render, screen, waitFor } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { ok } from '$lib/engine/result';
import { unlocked } from '$lib/engine/unlock/unlock';
import { Bench as BenchOf } from '../bench.svelte';
import { openingAddressed } from '../opened-study';
import PanelOnBench from './PanelOnBench.svelte';
import type { StartSearch } from './unlocking.svelte';

const stock = {
	thicknesses: [14, 16, 20, 25, 30],
	widthStep: 50,
	depthStep: 50,
	stiffenerStep: 250
};

const atOnce: StartSearch = (request) => ({
	id: 1,
	result: Promise.resolve(ok(unlocked(request))),
	cancel: () => {}
});

function open(start: StartSearch = atOnce) {
	const bench = new BenchOf(openingAddressed);
	render(PanelOnBench, { bench, stock, start });
	return { bench, user: userEvent.setup() };
}

describe('the panel of what unlocks more', () => {
	it('puts a change in as one step, says so and takes it back', async () => {
		const { bench, user } = open();
		const press = await screen.findByRole(
			'button',
			{ name: /^Try: Flanges 400 → 350\smm wide$/ },
			{ timeout: 4000 }
		);
		await user.click(press);
		expect(bench.study.section).toMatchObject({ b: 350, bBottom: 350 });
		expect(bench.verdict.sentence).toMatch(/^Class 2\./);
		await user.click(screen.getByRole('button', { name: 'Undo' }));
		expect(bench.study.section).toMatchObject({ b: 400 });
		expect(bench.canUndo).toBe(false);
	});

	it('says so when nothing is locked', async () => {
		const { bench } = open();
		bench.reshape({ ...openingAddressed.study.section, tw: 20, tf: 40, tfBottom: 40 } as never);
		await waitFor(
			() => expect(screen.getByText(/The full plastic block counts/)).toBeInTheDocument(),
			{ timeout: 4000 }
		);
	});

	it('shows a slow search and stops it', async () => {
		let stopped = false;
		const endless: StartSearch = () => ({
			id: 1,
			result: new Promise(() => {}),
			cancel: () => (stopped = true)
		});
		const { user } = open(endless);
		await user.click(await screen.findByRole('button', { name: 'Stop' }, { timeout: 4000 }));
		expect(stopped).toBe(true);
		expect(screen.getByRole('button', { name: 'Search again' })).toBeInTheDocument();
	});
});
