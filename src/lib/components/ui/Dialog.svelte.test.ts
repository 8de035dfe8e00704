import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { createRawSnippet } from 'svelte';
import { beforeAll, expect, it, vi } from 'vitest';
import Dialog from './Dialog.svelte';

const text = createRawSnippet(() => ({ render: () => '<p>Two people saved it.</p>' }));

// jsdom has the element but not its modal behaviour.
beforeAll(() => {
	HTMLDialogElement.prototype.showModal = function () {
		this.open = true;
	};
	HTMLDialogElement.prototype.close = function () {
		this.open = false;
		this.dispatchEvent(new Event('close'));
	};
});

it('opens under its title, closes by its button and tells so', async () => {
	const onclose = vi.fn();
	render(Dialog, { open: true, title: 'Which one to keep?', children: text, onclose });
	expect(screen.getByRole('dialog', { name: 'Which one to keep?' })).toBeVisible();
	expect(screen.getByText('Two people saved it.')).toBeVisible();
	await userEvent.click(screen.getByRole('button', { name: 'Close' }));
	expect(onclose).toHaveBeenCalledOnce();
	expect(screen.queryByText('Two people saved it.')).toBeNull();
});
