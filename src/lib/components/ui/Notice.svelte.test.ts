import { render, screen } from '@testing-library/svelte';
import { createRawSnippet } from 'svelte';
import { expect, it } from 'vitest';
import Notice from './Notice.svelte';

const text = createRawSnippet(() => ({ render: () => '<p>Shear buckling.</p>' }));

it('names its kind in words and is read out only when it comes up later', () => {
	render(Notice, { kind: 'warn', children: text });
	expect(screen.getByText('Take care')).toBeVisible();
	expect(screen.queryByRole('status')).toBeNull();
});

it('breaks in when a fault comes up', () => {
	render(Notice, { kind: 'error', live: true, title: 'Not saved', children: text });
	expect(screen.getByRole('alert')).toHaveTextContent('Not saved Shear buckling.');
});
