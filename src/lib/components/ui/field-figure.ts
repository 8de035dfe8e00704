import { formatQuantity, toShown, type Preferences, type Quantity } from '$lib/units';

const LONGEST = 10;
const TYPED_DECIMALS = 4;

/** True for a figure as people type them: no more than four places, ten figures in all. */
function endsSoon(shown: number): boolean {
	const kept = Number(shown.toPrecision(LONGEST));
	return Number(kept.toFixed(TYPED_DECIMALS)) === kept;
}

/**
 * A figure as it stands in a field: what was typed is shown to its last place, what came out of a
 * conversion or a calculation (15.7480314… in) to `digits` significant figures.
 */
export function fieldFigure(
	value: number,
	quantity: Quantity,
	preferences: Preferences,
	format: { digits: number; unit?: boolean }
): string {
	const whole = endsSoon(toShown(value, quantity, preferences.system));
	const digits = whole ? Math.max(LONGEST, format.digits) : format.digits;
	return formatQuantity(value, quantity, preferences, { digits, trim: true, unit: format.unit });
}

/** The figure with as many places as `room` characters hold; never cut in its whole part. */
export function figureWithin(
	value: number,
	quantity: Quantity,
	preferences: Preferences,
	{ digits, room }: { digits: number; room: number }
): string {
	const full = fieldFigure(value, quantity, preferences, { digits });
	for (let decimals = TYPED_DECIMALS; full.length > room && decimals >= 0; decimals -= 1) {
		const shorter = formatQuantity(value, quantity, preferences, { decimals, trim: true });
		if (shorter.length <= room || decimals === 0) return shorter;
	}
	return full;
}
