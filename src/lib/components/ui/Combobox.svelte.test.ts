import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import Combobox from './Combobox.svelte';
import type { Search } from './combobox.svelte';

const shapes = ['IPE 300', 'IPE 330', 'HE 300 A', 'W14x90'];
const find: Search<string> = (query) =>
	shapes.filter((shape) => shape.toLowerCase().includes(query.toLowerCase()));

function show(search: Search<string> = find, extra: { limit?: number } = {}) {
	const onselect = vi.fn<(item: string) => void>();
	const itemLabel = (item: string) => item;
	render(Combobox<string>, {
		label: 'Shape',
		value: 'W14x90',
		search,
		itemLabel,
		itemKey: itemLabel,
		onselect,
		...extra
	});
	return { onselect, input: screen.getByRole('combobox', { name: 'Shape' }) };
}
const offered = () => screen.queryAllByRole('option').map((option) => option.textContent?.trim());

describe('Combobox', () => {
	it('narrows while typing and takes the active item on Enter', async () => {
		const { input, onselect } = show();
		await userEvent.clear(input);
		await userEvent.type(input, 'ipe');
		expect(offered()).toEqual(['IPE 300', 'IPE 330']);
		await userEvent.keyboard('{ArrowDown}');
		expect(screen.getByRole('option', { name: 'IPE 330' })).toHaveAttribute(
			'aria-selected',
			'true'
		);
		await userEvent.keyboard('{Enter}');
		expect(onselect).toHaveBeenCalledExactlyOnceWith('IPE 330');
		expect(input).toHaveValue('IPE 330');
		expect(input).toHaveAttribute('aria-expanded', 'false');
	});

	it('takes an item by mouse', async () => {
		const { input, onselect } = show();
		await userEvent.click(input);
		await userEvent.click(screen.getByRole('option', { name: 'HE 300 A' }));
		expect(onselect).toHaveBeenCalledExactlyOnceWith('HE 300 A');
	});

	it('goes back to the chosen item on Escape and when it is left', async () => {
		const { input, onselect } = show();
		await userEvent.type(input, 'x{Escape}');
		expect(input).toHaveValue('W14x90');
		await userEvent.type(input, 'zz');
		expect(screen.getByText('Nothing found. Try fewer letters.')).toBeVisible();
		await userEvent.tab();
		expect(input).toHaveValue('W14x90');
		expect(onselect).not.toHaveBeenCalled();
	});

	it('drops a late answer to an earlier query', async () => {
		const answers: ((items: string[]) => void)[] = [];
		const { input } = show(() => new Promise((resolve) => answers.push(resolve)));
		await userEvent.type(input, 'ab');
		answers.at(-1)?.(['second']);
		answers.at(-2)?.(['first']);
		await vi.waitFor(() => expect(offered()).toEqual(['second']));
	});

	it('takes nothing from the last answer while a new one is awaited', async () => {
		let first = true;
		const { input, onselect } = show(() => {
			if (!first) return new Promise(() => {});
			first = false;
			return ['IPE 300'];
		});
		await userEvent.type(input, 'ip{Enter}');
		expect(onselect).not.toHaveBeenCalled();
	});

	it('says so when the search fails', async () => {
		const { input } = show(() => Promise.reject(new Error('offline')));
		await userEvent.type(input, 'i');
		expect(await screen.findByText(/The search did not answer/)).toBeVisible();
	});

	it('draws only the first of a long list and counts the rest', async () => {
		const { input } = show(() => Array.from({ length: 2300 }, (_, index) => `Shape ${index}`), {
			limit: 50
		});
		await userEvent.type(input, 's');
		expect(offered()).toHaveLength(50);
		expect(screen.getByText('2250 more. Type on to narrow the list.')).toBeVisible();
	});
});
