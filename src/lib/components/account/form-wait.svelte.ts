import type { SubmitFunction } from '@sveltejs/kit';

/** Knows whether a form is on its way, so that its button can say so and takes no second press. */
export const formWait = () => {
	let waiting = $state(false);
	return {
		get waiting() {
			return waiting;
		},
		/** For `use:enhance`; fields keep what was typed when the form comes back with a fault. */
		submit: (() => {
			waiting = true;
			return async ({ update }) => {
				waiting = false;
				await update({ reset: false });
			};
		}) satisfies SubmitFunction
	};
};
