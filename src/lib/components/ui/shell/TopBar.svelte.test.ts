import { render, screen, within } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import TopBar from './TopBar.svelte';

vi.mock('$app/state', () => ({ page: { url: new URL('http://localhost/rack/01HX') } }));
vi.mock('$app/navigation', () => ({ afterNavigate: () => {} }));

const firm = { id: '1', name: 'Tarn Bridge Steelwork' };
const person = {
	name: 'Ruth Tarn',
	email: 'ruth@tarnbridge.example',
	firm,
	role: 'designer',
	memberships: [{ firm }, { firm: { id: '2', name: 'Gull Point Fabrication' } }]
};

describe('TopBar', () => {
	it('lists the places and marks the one in hand', () => {
		render(TopBar, { person: null });
		const [nav] = screen.getAllByRole('navigation', { name: 'Places' });
		const links = within(nav as HTMLElement).getAllByRole('link');
		expect(links.map((link) => link.textContent)).toEqual([
			...['Bench', 'Rack', 'Line-up', 'Bolt groups', 'Sheets', 'Crew']
		]);
		const current = links.filter((link) => link.getAttribute('aria-current') === 'page');
		expect(current.map((link) => link.textContent)).toEqual(['Rack']);
	});

	it('tells who is signed in, for which firm, and signs out by a post', async () => {
		render(TopBar, { person });
		await userEvent.click(screen.getByLabelText('Account of Ruth Tarn, and units'));
		expect(screen.getByText('RT')).toBeVisible();
		expect(screen.getByText(/Tarn Bridge Steelwork/)).toBeVisible();
		const form = screen.getByRole('button', { name: 'Sign out' }).closest('form');
		expect(form).toHaveAttribute('action', '/sign-out');
		expect(form).toHaveAttribute('method', 'POST');
	});

	it('offers the other firms of a person, not the one in hand', async () => {
		render(TopBar, { person });
		await userEvent.click(screen.getByLabelText('Account of Ruth Tarn, and units'));
		const changes = screen.getAllByRole('button', { name: /^Change to/ });
		expect(changes.map((button) => button.textContent.trim())).toEqual([
			'Change to Gull Point Fabrication'
		]);
	});

	it('offers signing in to those who are not, and units to everyone', async () => {
		render(TopBar, { person: null });
		await userEvent.click(screen.getByLabelText('Account and units'));
		expect(screen.getByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
		expect(screen.getByRole('radio', { name: 'SI' })).toBeChecked();
		await userEvent.click(screen.getByRole('radio', { name: 'US customary' }));
		expect(screen.getByRole('radio', { name: 'US customary' })).toBeChecked();
	});
});
