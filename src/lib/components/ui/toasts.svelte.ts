import { createClocks } from './toast-clock';

/** One thing just done, told in passing; `undo` takes it back. */
export interface Toast {
	id: number;
	message: string;
	kind: 'done' | 'error';
	undo?: () => void | Promise<void>;
}

const SHOWN_MS = 8_000;
/** What can be taken back, and what went wrong, stays longer. */
const SHOWN_LONG_MS = 20_000;

let nextId = 1;
let shown = $state.raw<readonly Toast[]>([]);
const clocks = createClocks();

function dismiss(id: number) {
	clocks.stop(id);
	shown = shown.filter((toast) => toast.id !== id);
}

function startClock(toast: Toast) {
	const time = toast.undo || toast.kind === 'error' ? SHOWN_LONG_MS : SHOWN_MS;
	clocks.start(toast.id, time, () => dismiss(toast.id));
}

/** Messages at the foot of the screen. Call `show` from events only: the list is the browser's. */
export const toasts = {
	get shown() {
		return shown;
	},
	show(message: string, options: Partial<Pick<Toast, 'kind' | 'undo'>> = {}): number {
		const toast: Toast = { id: nextId++, message, kind: 'done', ...options };
		shown = [...shown, toast];
		startClock(toast);
		return toast.id;
	},
	dismiss,
	/** Stops the clocks while someone reads or reaches for a button. */
	hold() {
		for (const toast of shown) clocks.stop(toast.id);
	},
	release() {
		for (const toast of shown) startClock(toast);
	},
	async undo(toast: Toast) {
		dismiss(toast.id);
		try {
			await toast.undo?.();
		} catch {
			toasts.show('That could not be taken back. Reload the page to see where it stands.', {
				kind: 'error'
			});
		}
	}
};
