import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { createRawSnippet } from 'svelte';
import { describe, expect, it, vi } from 'vitest';
import Button from './Button.svelte';
import IconButton from './IconButton.svelte';

const words = (text: string) => createRawSnippet(() => ({ render: () => `<span>${text}</span>` }));

describe('Button', () => {
	it('presses, and submits nothing unless told to', async () => {
		const onclick = vi.fn();
		render(Button, { onclick, children: words('Save') });
		const button = screen.getByRole('button', { name: 'Save' });
		expect(button).toHaveAttribute('type', 'button');
		await userEvent.click(button);
		expect(onclick).toHaveBeenCalledOnce();
	});

	it('takes no second press while busy', async () => {
		const onclick = vi.fn();
		render(Button, { onclick, busy: true, children: words('Saving…') });
		await userEvent.click(screen.getByRole('button', { name: 'Saving…' }));
		expect(onclick).not.toHaveBeenCalled();
		expect(screen.getByRole('button')).toHaveAttribute('aria-busy', 'true');
	});

	it('is a link when it goes somewhere', () => {
		render(Button, { href: '/bench', children: words('Bench') });
		expect(screen.getByRole('link', { name: 'Bench' })).toHaveAttribute('href', '/bench');
	});

	it('says aloud what an icon means', () => {
		render(IconButton, { label: 'Undo', children: words('↶') });
		expect(screen.getByRole('button', { name: 'Undo' })).toBeVisible();
	});
});
