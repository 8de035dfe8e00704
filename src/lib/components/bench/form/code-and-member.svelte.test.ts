import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { flushSync } from 'svelte';
import { describe, expect, it } from 'vitest';
import { benchContext } from '../bench-context';
import { Bench } from '../bench.svelte';
import { openingBend, openingStudy, type Study } from '../study';
import CodeChoices from './CodeChoices.svelte';
import DemandCases from './DemandCases.svelte';
import StiffenersInput from './StiffenersInput.svelte';

function open(study: Study = openingStudy) {
	const bench = new Bench({ study, bend: openingBend });
	const context = benchContext(bench);
	for (const part of [CodeChoices, StiffenersInput]) render(part, { context });
	render(DemandCases, { context, props: { governing: null } });
	return { bench, user: userEvent.setup() };
}

/** (258 − 18)/6 = 40, ε = 1: within 42 (2005, Table 5.2), over 38 (2022, Table 7.3). */
const hollow: Study = {
	...openingStudy,
	section: {
		kind: 'rectangular-hollow',
		h: 258,
		b: 100,
		t: 6,
		ro: 9,
		ri: 6,
		fabrication: 'hot-finished',
		grade: 'S235'
	},
	demands: [{ name: 'A', N: -100 }]
};

describe('the edition of the code', () => {
	it('is switched by one press, with what the other says beside it, and undone', async () => {
		const { bench, user } = open(hollow);
		expect(screen.getByText(/The 2022 edition: class 4/)).toBeInTheDocument();
		expect(bench.activeState?.class).toBe(3);
		await user.click(screen.getByRole('radio', { name: '2022' }));
		expect(bench.activeState?.class).toBe(4);
		expect(screen.getByText(/The 2005 edition: class 3/)).toBeInTheDocument();
		bench.undo();
		flushSync();
		expect(bench.activeState?.class).toBe(3);
	});

	it('offers the curves for rolled sections in 2005 only', async () => {
		const { bench, user } = open();
		const curves = () => screen.getByRole('combobox', { name: /buckling curves/ });
		await user.selectOptions(curves(), 'rolled-or-equivalent');
		expect(bench.code.ltbCurves).toBe('rolled-or-equivalent');
		await user.click(screen.getByRole('radio', { name: '2022' }));
		expect(curves()).toBeDisabled();
	});
});

describe('stiffeners', () => {
	it('are set with a first spacing, raise the shear resistance of a slender web, and are undone', async () => {
		const section = { ...openingStudy.section, h: 1540, tw: 8 } as Study['section'];
		const { bench, user } = open({ ...openingStudy, section });
		const before = bench.analysis.resistance!.VzRd!;
		await user.click(screen.getByRole('radio', { name: 'rigid ends' }));
		expect(bench.study.stiffeners).toEqual({ spacing: 2300, endPost: 'rigid' });
		await user.clear(screen.getByRole('spinbutton', { name: 'Clear spacing' }));
		await user.type(screen.getByRole('spinbutton', { name: 'Clear spacing' }), '750{Enter}');
		expect(bench.analysis.resistance!.VzRd).toBeGreaterThan(before);
		expect(screen.getByText(/Web stiffeners: every 750/)).toBeInTheDocument();
		await user.click(screen.getByRole('radio', { name: 'none' }));
		expect(bench.analysis.resistance!.VzRd).toBeCloseTo(before, 9);
	});
});

describe('a length between restraints', () => {
	it('lowers what may be counted, and blank takes it away again', async () => {
		const { bench, user } = open();
		const length = screen.getByRole('spinbutton', { name: 'Unbraced length' });
		await user.type(length, '8000{Enter}');
		expect(bench.activeState?.limitedBy).toBe('lateral-torsional');
		const counted = bench.verdict.countable.moment!;
		expect(counted).toBeLessThan(3110);
		await user.type(screen.getByRole('spinbutton', { name: 'C1, shape of moment' }), '1.35{Enter}');
		expect(bench.verdict.countable.moment).toBeGreaterThan(counted);
		await user.clear(length);
		await user.tab();
		expect(bench.activeDemand.unbracedLength).toBeUndefined();
		expect(bench.verdict.countable.moment).toBeCloseTo(3110, 0);
	});
});

it('tells the use of every case in the list of cases, and that one fails', () => {
	const { bench } = open({
		...openingStudy,
		demands: [
			{ name: 'A', My: 1000 },
			{ name: 'B', My: 4000 }
		]
	});
	// Against Mel = 3110 kNm.
	expect(bench.demands).toHaveLength(2);
	expect(screen.getByRole('button', { name: /^A\s*32\.2/ })).toBeInTheDocument();
	expect(screen.getByRole('button', { name: /^B\s*129.*fails/ })).toBeInTheDocument();
});
