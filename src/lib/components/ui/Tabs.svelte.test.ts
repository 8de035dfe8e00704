import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { createRawSnippet } from 'svelte';
import { expect, it } from 'vitest';
import Tabs from './Tabs.svelte';

it('shows one panel, moves by arrow keys and wraps round', async () => {
	render(Tabs<'gross' | 'effective'>, {
		label: 'Values',
		tabs: [
			{ id: 'gross', label: 'Gross' },
			{ id: 'effective', label: 'Effective' }
		],
		value: 'gross',
		panel: createRawSnippet((id: () => string) => ({ render: () => `<p>values: ${id()}</p>` }))
	});
	await userEvent.tab();
	expect(screen.getByRole('tab', { name: 'Gross' })).toHaveFocus();
	await userEvent.keyboard('{ArrowLeft}');
	const effective = screen.getByRole('tab', { name: 'Effective' });
	expect(effective).toHaveFocus();
	expect(effective).toHaveAttribute('aria-selected', 'true');
	expect(screen.getByRole('tabpanel', { name: 'Effective' })).toBeVisible();
	await userEvent.keyboard('{Home}');
	expect(screen.getByRole('tab', { name: 'Gross' })).toHaveAttribute('aria-selected', 'true');
});
