import { render, screen } from '@testing-library/svelte';
import { expect, it } from 'vitest';
import TextInput from './TextInput.svelte';

it('ties label, hint and error to the input', () => {
	render(TextInput, {
		label: 'E-mail',
		hint: 'Used for signing in.',
		error: 'Type an address with an @ in it.'
	});
	const input = screen.getByRole('textbox', { name: 'E-mail' });
	expect(input).toHaveAccessibleDescription(
		'Used for signing in. Type an address with an @ in it.'
	);
	expect(input).toBeInvalid();
});

it('keeps a hidden label for those who hear it', () => {
	render(TextInput, { label: 'Search', labelHidden: true });
	expect(screen.getByRole('textbox', { name: 'Search' })).not.toHaveAttribute('aria-invalid');
});
