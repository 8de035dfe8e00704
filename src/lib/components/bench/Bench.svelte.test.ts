import { render, screen, within } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { flushSync } from 'svelte';
import { describe, expect, it } from 'vitest';
import { Bench as BenchOf } from './bench.svelte';
import Bench from './Bench.svelte';
import { openingAddressed } from './opened-study';
import { undoStep } from './undo-step';

function open() {
	const bench = new BenchOf(openingAddressed);
	render(Bench, { bench });
	return { bench, user: userEvent.setup() };
}

const field = (name: string) => screen.getByRole('spinbutton', { name });

async function type(user: ReturnType<typeof userEvent.setup>, name: string, text: string) {
	await user.clear(field(name));
	await user.type(field(name), `${text}{Enter}`);
}

describe('the Bench', () => {
	it('opens on the plate girder with its verdict as the heading', () => {
		open();
		expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(
			'Class 3. Count 3110 kNm, up to first yield.'
		);
		const verdict = within(screen.getByRole('region', { name: 'Verdict' }));
		expect(verdict.getByRole('status')).toHaveTextContent(/The top flange decides it/);
	});

	it('draws the ruler with every figure in words too', () => {
		open();
		expect(
			screen.getByRole('figure', {
				name: /about y–y; demand 2400\skNm; may be counted 3110\skNm; first yield 3110\skNm; full plastic 3546\skNm/
			})
		).toBeInTheDocument();
	});

	it('lists the plates against their limits, the deciding one marked', () => {
		open();
		const table = screen.getByRole('table', { name: /Width over thickness/ });
		const row = within(table).getByRole('row', { name: /Top flange/ });
		expect(row).toHaveTextContent('9.25');
		expect(row).toHaveTextContent('decides');
	});
});

describe('the parts form', () => {
	it('changes the section as a size is typed', async () => {
		const { bench, user } = open();
		await type(user, 'Top flange width', '350');
		expect(bench.study.section).toMatchObject({ b: 350, bBottom: 400 });
	});

	it('shows what undo brings back', async () => {
		const { bench, user } = open();
		await type(user, 'Web thickness', '16');
		bench.undo();
		flushSync();
		expect(field('Web thickness')).toHaveValue('14');
	});

	it('keeps the last section that stands and says what is wrong', async () => {
		const { bench, user } = open();
		await type(user, 'Web thickness', '0');
		expect(bench.stale).toBe(true);
		expect(bench.section.gross.area).toBeGreaterThan(0);
		expect(screen.getAllByRole('alert')[0]).toHaveTextContent(/[Ww]eb thickness/);
	});

	it('ties what is wrong to the field that it is about', async () => {
		const { user } = open();
		await type(user, 'Web thickness', '0');
		expect(field('Web thickness')).toHaveAccessibleDescription(/[Ww]eb thickness/);
		expect(field('Web thickness')).toHaveAttribute('aria-invalid', 'true');
	});

	it('clears a text it could not read before undoing anything else', async () => {
		const { bench, user } = open();
		await type(user, 'Web thickness', '16');
		await user.clear(field('Top flange width'));
		await user.type(field('Top flange width'), 'abc');
		await user.tab();
		undoStep(bench);
		flushSync();
		expect(field('Top flange width')).toHaveValue('400');
		expect(bench.study.section).toMatchObject({ tw: 16 });
		undoStep(bench);
		expect(bench.study.section).toMatchObject({ tw: 14 });
	});

	it('sets a grade for one plate', async () => {
		const { bench, user } = open();
		await user.selectOptions(screen.getByRole('combobox', { name: 'Grade, Web' }), 'S275');
		expect(bench.study.section.partGrades).toEqual({ web: 'S275' });
	});
});

describe('demand cases', () => {
	it('are told apart when two have one name', () => {
		const { bench } = open();
		bench.change({
			demands: [
				{ name: 'A', My: 100 },
				{ name: 'A', My: 9000 }
			]
		});
		expect(bench.governing?.index).toBe(1);
		bench.activate(0);
		expect(bench.verdict).toMatchObject({ demand: 'A', status: 'passes' });
		bench.activate(1);
		expect(bench.verdict.status).toBe('fails');
	});

	it('are added, named, filled and removed, and the governing one is told', async () => {
		const { bench, user } = open();
		await user.click(screen.getByRole('button', { name: 'Add a case' }));
		await type(user, 'My', '3000');
		await user.clear(screen.getByRole('textbox', { name: 'Name of the case' }));
		await user.type(screen.getByRole('textbox', { name: 'Name of the case' }), 'Crane{Enter}');
		await user.tab();
		expect(bench.demands.map(({ name, My }) => [name, My])).toEqual([
			['Case 1', 2400],
			['Crane', 3000]
		]);
		expect(screen.getByRole('button', { name: /Crane.*governs/ })).toBeInTheDocument();
		await user.click(screen.getByRole('button', { name: /^Case 1/ }));
		expect(screen.getByRole('region', { name: 'Verdict' })).toHaveTextContent(
			/Crane governs, at 96/
		);
		await user.click(screen.getByRole('button', { name: 'Remove Case 1' }));
		expect(bench.demands.map(({ name }) => name)).toEqual(['Crane']);
	});

	it('show no green while a check is missing in any of them', async () => {
		const { user } = open();
		const met = () => screen.getByText('The demand is met by every check made for it.');
		// sideways buckling of the girder is unchecked
		expect(met()).not.toHaveClass('clear');
		await type(user, 'My', '0');
		await type(user, 'N', '100');
		expect(met()).toHaveClass('clear');
	});

	it('name the case that a check is missing in', () => {
		// a thrust over a length: the buckling of the member is missing
		const long = { name: 'Case 2', N: -10, unbracedLength: 3000 };
		const demands = [{ name: 'Case 1', N: 100 }, long];
		const { bench } = open();
		bench.change({ demands });
		bench.activate(0);
		flushSync();
		expect(screen.getByText('Case 1 is met by every check made for it.')).not.toHaveClass('clear');
		expect(screen.getByText(/a check that applies to it is missing/)).toBeInTheDocument();
	});

	it('hold N while bending', async () => {
		const { bench, user } = open();
		await type(user, 'N', '-500');
		expect(bench.bend.state.N).toBeCloseTo(-500, 6);
	});
});

describe('an axial force that the section cannot carry', () => {
	it('is told in place of a curve and of stresses', async () => {
		const { user } = open();
		await type(user, 'N', '-50000');
		expect(screen.getByText(/has no state of balance/)).toBeInTheDocument();
		expect(screen.queryByRole('slider', { name: 'Strain at the top' })).toBeNull();
		await type(user, 'N', '-100');
		expect(screen.getByRole('slider', { name: 'Strain at the top' })).toBeInTheDocument();
	});
});

describe('bending by the keys', () => {
	it('steps the handle on the curve and everything that follows it', async () => {
		const { bench, user } = open();
		const handle = screen.getByRole('slider', { name: 'Curvature, in multiples of first yield' });
		handle.focus();
		await user.keyboard('{ArrowRight}');
		expect(bench.bend.ratio).toBeCloseTo(2.1, 12);
		// Flanges 400 × 20 × 345 × 920; web 14 × 355 × (450² − (470 × 355/345 / 2.1)² / 3): 3457.8 kNm.
		expect(handle.getAttribute('aria-valuetext')).toMatch(/^3458\skNm at 2.1 κy$/);
		await user.keyboard('{End}');
		expect(bench.bend.ratio).toBe(10);
		await user.keyboard('{Home}');
		expect(bench.bend.ratio).toBe(-10);
	});

	it('moves an end of the strain line to the side of the arrow', async () => {
		const { bench, user } = open();
		screen.getByRole('slider', { name: 'Strain at the top' }).focus();
		await user.keyboard('{ArrowLeft}');
		expect(bench.bend.ratio).toBeCloseTo(2.1, 12);
		screen.getByRole('slider', { name: 'Strain at the bottom' }).focus();
		await user.keyboard('{ArrowLeft}');
		expect(bench.bend.ratio).toBeCloseTo(2, 12);
	});

	it('takes a typed moment, and refuses one that no state carries', async () => {
		const { bench, user } = open();
		await type(user, 'Moment M', '3110');
		expect(bench.bend.ratio).toBeCloseTo(1, 2);
		await type(user, 'Moment M', '4000');
		expect(screen.getByText(/No state carries 4000/)).toBeInTheDocument();
		expect(bench.bend.ratio).toBeCloseTo(1, 2);
	});

	it('touches neither the section nor what the rules say', async () => {
		const { bench, user } = open();
		const before = [bench.section, bench.analysis, bench.verdict];
		screen.getByRole('slider', { name: 'Strain at the top' }).focus();
		await user.keyboard('{ArrowLeft}{PageUp}{ArrowUp}');
		expect([bench.section, bench.analysis, bench.verdict]).toEqual(before);
		expect(bench.section).toBe(before[0]);
		expect(bench.analysis).toBe(before[1]);
	});
});
