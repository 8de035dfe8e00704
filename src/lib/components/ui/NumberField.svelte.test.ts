import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { tick } from 'svelte';
import { describe, expect, it, vi } from 'vitest';
import { badText } from './bad-text.svelte';
import NumberField from './NumberField.svelte';

function show(props: Partial<Parameters<typeof render<typeof NumberField>>[1]> = {}) {
	const onchange = vi.fn<(value: number | null) => void>();
	render(NumberField, { label: 'Width', quantity: 'length', value: 400, onchange, ...props });
	return { onchange, input: screen.getByRole<HTMLInputElement>('spinbutton', { name: 'Width' }) };
}

describe('NumberField', () => {
	it('shows the figure formatted, with its unit said aloud', () => {
		const { input } = show({ value: 12345.5 });
		expect(input).toHaveValue('12\u202f345.5');
		expect(input).toHaveAttribute('aria-valuetext', '12\u202f345.5 mm');
	});

	it('keeps the typed text while editing and hands the value over on Enter', async () => {
		const { input, onchange } = show();
		await userEvent.type(input, '12 in');
		expect(input).toHaveValue('12 in');
		expect(onchange).not.toHaveBeenCalled();
		await userEvent.keyboard('{Enter}');
		expect(onchange).toHaveBeenCalledExactlyOnceWith(304.8);
		expect(input).toHaveValue('304.8');
	});

	it('hands the value over when the field is left', async () => {
		const { input, onchange } = show();
		await userEvent.type(input, '350');
		await userEvent.tab();
		expect(onchange).toHaveBeenCalledExactlyOnceWith(350);
	});

	it('says what is wrong, keeps the text and the value, and Escape restores', async () => {
		const { input, onchange } = show();
		await userEvent.type(input, '12 kg{Enter}');
		expect(screen.getByRole('alert')).toHaveTextContent('“kg” is not a unit of length.');
		expect(input).toHaveAccessibleDescription(/not a unit/);
		expect(input).toHaveAttribute('aria-invalid', 'true');
		expect(input).toHaveValue('12 kg');
		await userEvent.keyboard('{Escape}');
		expect(input).toHaveValue('400');
		expect(screen.queryByRole('alert')).toBeNull();
		expect(onchange).not.toHaveBeenCalled();
	});

	it('refuses a figure outside its limits and names the limit', async () => {
		const { input, onchange } = show({ min: 5, max: 1000 });
		await userEvent.type(input, '2{Enter}');
		expect(screen.getByRole('alert')).toHaveTextContent('Must be at least 5 mm.');
		expect(onchange).not.toHaveBeenCalled();
	});

	it('steps with the arrows, ten times as far with Shift, and stops at its limits', async () => {
		const { input, onchange } = show({ value: 20, step: 0.1, max: 21 });
		await userEvent.click(input);
		await userEvent.keyboard('{ArrowUp}{ArrowDown}{ArrowDown}');
		expect(onchange.mock.calls.map(([value]) => value)).toEqual([20.1, 20, 19.9]);
		await userEvent.keyboard('{Shift>}{ArrowUp}{ArrowUp}{/Shift}');
		expect(onchange.mock.lastCall).toEqual([21]);
	});

	it('steps from what is typed and through a list of stock sizes', async () => {
		const stock = [10, 12, 15, 20];
		const step = (value: number, direction: 1 | -1) =>
			(direction > 0
				? stock.find((size) => size > value)
				: stock.findLast((size) => size < value)) ?? value;
		const { input, onchange } = show({ value: 20, step });
		await userEvent.type(input, '11{ArrowUp}{ArrowUp}');
		expect(onchange.mock.calls.map(([value]) => value)).toEqual([12, 15]);
	});

	it('is null when blank is allowed and a fault when it is not', async () => {
		const { input, onchange } = show({ optional: true });
		await userEvent.clear(input);
		await userEvent.keyboard('{Enter}');
		expect(onchange).toHaveBeenCalledExactlyOnceWith(null);
	});

	it('follows every readable figure when live, and Escape takes it all back', async () => {
		const { input, onchange } = show({ live: true });
		await userEvent.type(input, '35');
		expect(onchange.mock.calls.map(([value]) => value)).toEqual([3, 35]);
		await userEvent.keyboard('{Escape}');
		expect(onchange.mock.lastCall).toEqual([400]);
	});

	it('drops text left with a fault when the value is set from outside', async () => {
		const props = { label: 'Width', quantity: 'length' as const, value: 400 };
		const { rerender } = render(NumberField, props);
		const input = screen.getByRole('spinbutton', { name: 'Width' });
		await userEvent.type(input, 'wide');
		await userEvent.tab();
		expect(input).toHaveValue('wide');
		await rerender({ value: 350 });
		expect(input).toHaveValue('350');
		expect(screen.queryByRole('alert')).toBeNull();
	});

	it('sends the engine value in a form, whatever units are shown', () => {
		show({ value: 304.8, name: 'width' });
		expect(document.querySelector<HTMLInputElement>('input[name=width]')?.value).toBe('304.8');
	});

	it('shortens a figure to its room, and shows it whole in the title and while it is edited', async () => {
		const { input, onchange } = show({ value: 103.124, room: 6 });
		expect(input).toHaveValue('103.12');
		expect(input).toHaveAttribute('title', '103.124 mm');
		await userEvent.click(input);
		expect(input).toHaveValue('103.124');
		await userEvent.tab();
		expect(input).toHaveValue('103.12');
		expect(onchange).not.toHaveBeenCalled();
	});

	it('is described by a fault that is written elsewhere', () => {
		document.body.insertAdjacentHTML('beforeend', '<p id="elsewhere">The web is too thin.</p>');
		const { input } = show({ faultId: 'elsewhere' });
		expect(input).toHaveAccessibleDescription('The web is too thin.');
		expect(input).toHaveAttribute('aria-invalid', 'true');
	});

	it('lets a text left with a fault be cleared from outside', async () => {
		const { input } = show();
		expect(badText.clear()).toBe(false);
		await userEvent.type(input, 'abc');
		await userEvent.tab();
		expect(badText.stands).toBe(true);
		expect(badText.clear()).toBe(true);
		await tick();
		expect(input).toHaveValue('400');
		expect(badText.stands).toBe(false);
	});
});
