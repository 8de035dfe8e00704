import { render, screen } from '@testing-library/svelte';
import { flushSync } from 'svelte';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import ToastRegion from './ToastRegion.svelte';
import { toasts } from './toasts.svelte';

const after = (ms: number) => flushSync(() => vi.advanceTimersByTime(ms));

describe('messages', () => {
	beforeEach(() => vi.useFakeTimers());
	afterEach(() => {
		for (const toast of toasts.shown) toasts.dismiss(toast.id);
		vi.useRealTimers();
	});

	it('are told politely and leave by themselves', () => {
		render(ToastRegion);
		flushSync(() => toasts.show('Section saved.'));
		expect(screen.getByText('Section saved.').closest('[aria-live]')).toHaveAttribute(
			'aria-live',
			'polite'
		);
		after(8_000);
		expect(screen.queryByText('Section saved.')).toBeNull();
	});

	it('take an action back once and are gone', () => {
		const undo = vi.fn();
		render(ToastRegion);
		flushSync(() => toasts.show('Section deleted.', { undo }));
		after(8_000);
		flushSync(() => screen.getByRole('button', { name: 'Undo' }).click());
		expect(undo).toHaveBeenCalledOnce();
		expect(screen.queryByText('Section deleted.')).toBeNull();
	});

	it('say so when taking back fails', async () => {
		render(ToastRegion);
		flushSync(() => toasts.show('Gone.', { undo: () => Promise.reject(new Error('offline')) }));
		flushSync(() => screen.getByRole('button', { name: 'Undo' }).click());
		await vi.advanceTimersByTimeAsync(0);
		expect(screen.getByText(/could not be taken back/)).toBeVisible();
	});

	it('stay while someone reaches for them', () => {
		render(ToastRegion);
		flushSync(() => toasts.show('Read me.'));
		flushSync(() => toasts.hold());
		after(60_000);
		expect(screen.getByText('Read me.')).toBeVisible();
		flushSync(() => toasts.release());
		after(8_000);
		expect(screen.queryByText('Read me.')).toBeNull();
	});
});
