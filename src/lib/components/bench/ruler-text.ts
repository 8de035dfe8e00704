import { formatQuantity, type Preferences } from '$lib/units';
import type { RulerModel } from './ruler-model';

/** The ruler in words: its path first, then every figure, for those who cannot see it. */
export function rulerText(model: RulerModel, preferences: Preferences): string {
	const moment = (value: number | null) =>
		value === null
			? 'not given'
			: formatQuantity(value, 'moment', preferences, { digits: 4, unit: true });
	return [
		rulerPath(model, preferences),
		`demand ${model.demand === null ? 'none' : moment(model.demand)}`,
		`may be counted ${moment(model.count)}`,
		`first yield ${moment(model.firstYield)}`,
		`full plastic ${moment(model.plastic)}`
	].join('; ');
}

/** The path along which the ruler is drawn: axis, sense and the axial force that is held. */
export function rulerPath(
	{ axis, axisAngle, negative, N }: RulerModel,
	preferences: Preferences
): string {
	const about =
		axis === 'turned' ? `about an axis at ${Math.round(axisAngle * 10) / 10}°` : `about ${axis}`;
	const sense = negative ? `, ${axis === 'z–z' ? 'left' : 'top'} in tension` : '';
	const held = N === 0 ? '' : `, N ${formatQuantity(N, 'force', preferences, { unit: true })} held`;
	return about + sense + held;
}
