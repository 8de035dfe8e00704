import { render, screen, within } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { flushSync } from 'svelte';
import { describe, expect, it } from 'vitest';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { formatNumber } from '$lib/units';
import Bench from '../Bench.svelte';
import { Bench as BenchOf } from '../bench.svelte';
import { openingAddressed } from '../opened-study';
import { buildKinds } from '../opening-sections';
import type { DemandCase } from '../study';
import { bendWorkings, rulerWorkings } from './bend-workings';

const { study, bend } = openingAddressed;

function open(
	section: SectionDefinition = study.section,
	demands: DemandCase[] = [...study.demands]
) {
	const bench = new BenchOf({ study: { ...study, section, demands }, bend });
	render(Bench, { bench });
	return { bench, user: userEvent.setup() };
}

const workings = (bench: BenchOf) => ({
	...bench.explanation,
	...bendWorkings(bench),
	...rulerWorkings(bench)
});

const marked = () => [...document.querySelectorAll<HTMLElement>('[data-working]')];
const keysOf = (mark: HTMLElement) => (mark.dataset.working ?? '').split(' | ');

/** What is put in, or is the bending state itself (the strain plane answers it, no formula does). */
const exempt = [
	'form, nav, .left',
	'input, select, option, label',
	// the drawing: sizes put in, and strain, stress and forces of the state that is bent to
	'.middle',
	// states of the whole section that are solved for, and torsion, which names its own methods and bounds
	'.interaction, section[aria-labelledby="torsion-head"]',
	// axis figures of the ruler and the chart, and the handle with what is typed
	'[aria-hidden="true"]',
	'.bend-controls, [role="slider"], .tick, .axis'
].join(',');

const number = /\d/;
/** Numbers that are no figures: limits' names, axes, clauses, class words, names of cases. */
const noFigure = /^(1|2|3|y–y|z–z)$/;

/** Tables and marks whose every number is the engine's. */
function loose(): string[] {
	const cells = document.querySelectorAll('td, .label, .marks text, .verdict b');
	return [...cells].flatMap((cell) => {
		if (cell.closest(exempt) || cell.querySelector('[data-working]')) return [];
		if (cell.matches('[data-working]') || cell.matches('.unit')) return [];
		const text = cell.textContent?.trim() ?? '';
		return number.test(text) && !noFigure.test(text) ? [text] : [];
	});
}

const cases: readonly (readonly [string, DemandCase[]])[] = [
	['bending', [{ name: 'A', My: 20 }]],
	['bending the other way', [{ name: 'A', My: -20 }]],
	['bending about z–z', [{ name: 'A', Mz: 5 }]],
	['compression', [{ name: 'A', N: -50 }]],
	['all effects', [{ name: 'A', My: 20, Mz: 3, N: -20, Vz: 15 }]],
	[
		'two cases',
		[
			{ name: 'A', My: 20 },
			{ name: 'B', My: 10, N: 30 }
		]
	]
];

function expectWorkings(opening: SectionDefinition, demands: DemandCase[]) {
	const { bench } = open(opening, demands);
	const all = workings(bench);
	const keys = marked().map(keysOf);
	expect(keys.length).toBeGreaterThan(15);
	const without = keys.filter((some) => !some.some((key) => all[key] !== undefined));
	expect(without.flat()).toEqual([]);
	expect(loose()).toEqual([]);
}

describe('every figure on the Bench has a working', () => {
	it.each(cases)('of a welded girder under %s', (_, demands) => {
		expectWorkings(study.section, demands);
	});

	it.each(buildKinds)('of $title under effects together', ({ opening }) => {
		expectWorkings(opening, [{ name: 'A', My: 20, Mz: 3, N: -20, Vz: 15 }]);
	});
});

describe('figures of the plate girder', () => {
	it('show what their workings give', () => {
		const { bench } = open();
		const all = workings(bench);
		const table = screen.getByRole('table', { name: /Width over thickness/ });
		const wrong = [...table.querySelectorAll<HTMLElement>('td.number [data-working]')].filter(
			(mark) => {
				const key = keysOf(mark).find((one) => all[one] !== undefined) ?? '';
				const shown = formatNumber(all[key]?.result.value, { decimal: 'point' }, { digits: 3 });
				return shown !== mark.textContent;
			}
		);
		expect(wrong.map((mark) => mark.outerHTML)).toEqual([]);
	});

	it('open to formula, clause, numbers put in and result', async () => {
		const { user } = open();
		const verdict = within(screen.getByRole('region', { name: 'Verdict' }));
		await user.click(verdict.getByRole('button', { name: /^3110\skNm$/ }));
		const sheet = within(screen.getByRole('dialog', { name: /may be counted/ }));
		expect(sheet.getByText(/6\.2\.5/)).toBeInTheDocument();
		await user.click(sheet.getByRole('button', { name: /Moment resistance/ }));
		const next = within(screen.getByRole('dialog', { name: /Moment resistance/ }));
		await user.click(next.getByRole('button', { name: /fibre first yields/ }));
		const last = within(screen.getByRole('dialog', { name: /fibre first yields/ }));
		expect(last.getByRole('row', { name: /fy.*345/ })).toBeInTheDocument();
		await user.click(last.getByRole('button', { name: 'Back to the working before' }));
		expect(screen.getByRole('dialog', { name: /Moment resistance/ })).toBeInTheDocument();
	});

	it('follow the study while they are open, and give the focus back', async () => {
		const { bench, user } = open();
		const figure = screen.getAllByTitle('How 286.0 cm² came about')[0]!;
		figure.focus();
		await user.keyboard('{Enter}');
		const sheet = screen.getByRole('dialog', { name: 'Area' });
		expect(sheet).toHaveTextContent(/28\s600/);
		bench.reshape({ ...study.section, b: 350, bBottom: 350 } as SectionDefinition);
		flushSync();
		// 28600 − 2 × 50 × 20 mm²
		expect(sheet).toHaveTextContent(/26\s600/);
		await user.keyboard('{Escape}');
		expect(screen.queryByRole('dialog', { name: 'Area' })).toBeNull();
		expect(document.activeElement).toHaveAttribute('title', 'How 266.0 cm² came about');
	});
});
