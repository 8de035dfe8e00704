import { render, screen, within } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { flushSync } from 'svelte';
import { describe, expect, it } from 'vitest';
import { benchContext } from '../bench-context';
import { Bench } from '../bench.svelte';
import DrawingPane from '../DrawingPane.svelte';
import { openingBend, openingStudy, type DemandCase, type Study } from '../study';
import ChecksTable from './ChecksTable.svelte';
import EffectivePanel from './EffectivePanel.svelte';
import PlateLimits from './PlateLimits.svelte';

/** hw/tw 1500/8: its web is class 4 in bending. */
const slender = {
	...openingStudy.section,
	h: 1540,
	tw: 8,
	weldLeg: 5
} as Study['section'];

function open(section: Study['section'], ...demands: DemandCase[]) {
	const bench = new Bench({ study: { ...openingStudy, section, demands }, bend: openingBend });
	for (const part of [ChecksTable, EffectivePanel, PlateLimits, DrawingPane])
		render(part, { context: benchContext(bench) });
	return { bench, user: userEvent.setup() };
}
const checks = () => screen.getByRole('table', { name: /^Checks of/ });

describe('the checks of the case on show', () => {
	it('have value, limit, clause, use and a word each', () => {
		open(openingStudy.section, { name: 'A', My: 2400, Vz: 300 });
		const row = within(checks()).getByRole('row', { name: /Bending about y–y/ });
		// Mel = Wel fy: 3110 kNm; 2400/3110 = 77.2 %.
		expect(row).toHaveTextContent(/EN 1993-1-1:2005 6\.2\.5.*2400.*3110.*77\.2 %.*passes/);
	});

	it('say that one fails', () => {
		open(openingStudy.section, { name: 'A', My: 4000 });
		expect(within(checks()).getByRole('row', { name: /Bending/ })).toHaveTextContent('fails');
	});

	it('list what is not checked with the reason', () => {
		open(openingStudy.section, { name: 'A', My: 2400 });
		const row = within(checks()).getByRole('row', { name: /Lateral–torsional/ });
		expect(row).toHaveTextContent(/not checked.*cross-section/);
	});

	it('follow the case that is chosen', () => {
		const { bench } = open(openingStudy.section, { name: 'A', My: 100 }, { name: 'B', N: -50 });
		bench.activate(1);
		flushSync();
		expect(within(checks()).getByRole('row', { name: /^Compression/ })).toBeInTheDocument();
		expect(within(checks()).queryByRole('row', { name: /^Bending/ })).toBeNull();
	});

	it('say what to do where nothing is demanded', () => {
		open({ kind: 'circular-hollow', d: 219.1, t: 12, grade: 'S355' }, { name: 'A' });
		const region = screen.getByRole('region', { name: 'Checks' });
		expect(region).toHaveTextContent(/Nothing is demanded|not checked/);
	});
});

describe('the effective section', () => {
	it('shows gross, one pass and converged, and every plate’s reduction', () => {
		open(slender, { name: 'A', My: 2000 });
		const table = screen.getByRole('table', { name: 'Effective section under +My' });
		expect(within(table).getByRole('row', { name: /^Area/ })).toHaveTextContent('280.0');
		const plates = screen.getByRole('table', { name: /Reduction of each compressed plate/ });
		// ψ = −1: kσ = 23.9, EN 1993-1-5 Table 4.1.
		expect(within(plates).getByRole('row', { name: /^Web/ })).toHaveTextContent(/−1\.00.*23\.9/);
	});

	it('is drawn as strips that do not count', () => {
		open(slender, { name: 'A', My: 2000 });
		expect(screen.getByText('not counted')).toBeInTheDocument();
		expect(screen.getByText(/Dashed: not counted under \+My, one pass/)).toBeInTheDocument();
	});

	it('is turned to another case and to converged figures', async () => {
		const { bench, user } = open(slender, { name: 'A', My: 2000 });
		await user.click(screen.getByRole('radio', { name: '−My' }));
		await user.click(screen.getByRole('radio', { name: 'converged' }));
		expect(bench.effectiveView.case).toBe('−My');
		expect(screen.getByText(/Dashed: not counted under −My, converged/)).toBeInTheDocument();
	});

	it('is not drawn for a demand that leaves the section whole', () => {
		open(openingStudy.section, { name: 'A', My: 2000 });
		expect(screen.queryByText('not counted')).toBeNull();
	});
});

it('says of a solid bar that no plate of it can buckle', () => {
	open({ kind: 'round', d: 60, grade: 'S355' }, { name: 'A', My: 2 });
	expect(screen.getByText(/no plate of it can buckle locally/)).toBeInTheDocument();
});

it('shows α, ψ and ε on demand', async () => {
	const { user } = open(openingStudy.section, { name: 'A', My: 2000 });
	expect(screen.queryByText(/α 0\.5/)).toBeNull();
	await user.click(screen.getByRole('button', { name: 'Show α, ψ and ε' }));
	expect(screen.getByText(/α 0\.500 · ψ −1\.00/)).toBeInTheDocument();
});
