import { fromShown, toShown, type Preferences, type Quantity } from '$lib/units';

/** Engine units a press; or a function that finds the next value (stock thicknesses, say). */
export type Step = number | ((value: number, direction: 1 | -1) => number);

const SIXTEENTH_INCH = 1 / 16;
const SHOWN_DIGITS = 12;

function defaultStep(quantity: Quantity, system: Preferences['system']): number {
	if (quantity === 'ratio') return 0.01;
	const shown = quantity === 'length' && system === 'us' ? SIXTEENTH_INCH : 1;
	return fromShown(shown, quantity, system);
}

/** One press of an arrow, in engine units; free of the dust that adding fractions leaves behind. */
export function stepped(
	value: number,
	presses: number,
	step: Step | undefined,
	quantity: Quantity,
	system: Preferences['system']
): number {
	if (typeof step === 'function') {
		const direction = presses < 0 ? -1 : 1;
		let next = value;
		for (let done = 0; done < Math.abs(presses); done++) next = step(next, direction);
		return next;
	}
	const shown = toShown(
		value + presses * (step ?? defaultStep(quantity, system)),
		quantity,
		system
	);
	return fromShown(Number(shown.toPrecision(SHOWN_DIGITS)), quantity, system);
}

export const withinLimits = (value: number, min?: number, max?: number): number =>
	Math.min(max ?? Infinity, Math.max(min ?? -Infinity, value));
