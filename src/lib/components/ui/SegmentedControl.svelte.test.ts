import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import SegmentedControl from './SegmentedControl.svelte';

it('is a group of radio buttons under its question', async () => {
	const onchange = vi.fn<(value: 'si' | 'us') => void>();
	render(SegmentedControl<'si' | 'us'>, {
		label: 'Units',
		segments: [
			{ value: 'si', label: 'SI' },
			{ value: 'us', label: 'US customary' }
		],
		value: 'si',
		onchange
	});
	expect(screen.getByRole('group', { name: 'Units' })).toBeVisible();
	expect(screen.getByRole('radio', { name: 'SI' })).toBeChecked();
	await userEvent.click(screen.getByRole('radio', { name: 'US customary' }));
	expect(onchange).toHaveBeenCalledExactlyOnceWith('us');
});
