import { formatQuantity, type Preferences } from '$lib/units';
import type { RulerModel } from './ruler-model';

/** The ruler in words: its path first, then every figure, for those who cannot see it. */
export function rulerText(model: RulerModel, preferences: Preferences): string {
	const size = (value: number | null) =>
		value === null
			? 'not given'
			: formatQuantity(value, model.quantity, preferences, { digits: 4, unit: true });
	return [
		rulerPath(model, preferences),
		`demand ${model.demand === null ? 'none' : size(model.demand)}`,
		`may be counted ${size(model.count)}`,
		...(model.quantity === 'force'
			? [`${yieldName(model)} ${size(model.plastic)}`]
			: [`first yield ${size(model.firstYield)}`, `full plastic ${size(model.plastic)}`])
	].join('; ');
}

/** Name of the greatest figure: full plastic in bending, all yielding under N alone. */
export function yieldName({ quantity, negative }: RulerModel): string {
	if (quantity === 'moment') return 'full plastic';
	return negative ? 'squash load' : 'yield load';
}

/** The path along which the ruler is drawn: axis, sense and the axial force that is held. */
export function rulerPath(
	{ quantity, axis, axisAngle, negative, N }: RulerModel,
	preferences: Preferences
): string {
	if (quantity === 'force') return negative ? 'of compression alone' : 'of tension alone';
	const about =
		axis === 'turned'
			? `about an axis at ${formatQuantity(axisAngle, 'angle', preferences, { decimals: 1, trim: true, unit: true })}`
			: `about ${axis}`;
	const sense = negative ? `, ${axis === 'z–z' ? 'left' : 'top'} in tension` : '';
	const held = N === 0 ? '' : `, N ${formatQuantity(N, 'force', preferences, { unit: true })} held`;
	return about + sense + held;
}
