import { render, screen } from '@testing-library/svelte';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import Slider from './Slider.svelte';

it('moves by arrows, pages and ends, and says its value in words', async () => {
	const oninput = vi.fn<(value: number) => void>();
	render(Slider, {
		label: 'Curvature',
		min: 0,
		max: 6,
		step: 0.1,
		value: 2,
		valueText: '2 times the curvature at first yield',
		oninput
	});
	const slider = screen.getByRole('slider', { name: 'Curvature' });
	expect(slider).toHaveAttribute('aria-valuetext', '2 times the curvature at first yield');
	slider.focus();
	await userEvent.keyboard('{ArrowRight}{ArrowDown}{PageUp}{PageDown}{End}{ArrowUp}{Home}');
	expect(oninput.mock.calls.map(([value]) => value)).toEqual([2.1, 2, 2.6, 2, 6, 0]);
	await userEvent.keyboard('{Shift>}{ArrowRight}{/Shift}');
	expect(oninput).toHaveBeenLastCalledWith(1);
});
