import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import Select from './Select.svelte';

it('offers its choices under their headings and tells which was taken', async () => {
	const onchange = vi.fn<(value: string) => void>();
	render(Select<string>, {
		label: 'Grade',
		value: 'S355',
		choices: [
			{ value: 'S355', label: 'S355', group: 'EN 10025-2' },
			{ value: 'A992', label: 'A992', group: 'ASTM' }
		],
		onchange
	});
	const select = screen.getByRole('combobox', { name: 'Grade' });
	expect(select).toHaveDisplayValue('S355');
	expect(screen.getByRole('group', { name: 'ASTM' })).toContainElement(
		screen.getByRole('option', { name: 'A992' })
	);
	await userEvent.selectOptions(select, 'A992');
	expect(onchange).toHaveBeenCalledExactlyOnceWith('A992');
});
