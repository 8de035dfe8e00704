import type { GrossProperties } from '$lib/engine/section/prepared';
import type { TorsionFigures } from '$lib/engine/section/shape';
import {
	formatNumber,
	formatQuantity,
	unitLabel,
	type Preferences,
	type Quantity
} from '$lib/units';

/** A torsion figure both ways, in the reader's units; empty where there is none. */
export interface TorsionRow {
	readonly name: string;
	readonly unit: string;
	readonly handbook: string;
	readonly numerical: string;
	/** Numerical against handbook: a share of the handbook's, or a length for places. */
	readonly difference: string;
}

/** Both answers side by side. Shear centre from the centroid, right and up. */
export function torsionRows(
	handbook: TorsionFigures | null,
	numerical: TorsionFigures | null,
	{ centroid, height, width }: Pick<GrossProperties, 'centroid' | 'height' | 'width'>,
	preferences: Preferences
): TorsionRow[] {
	const row = (name: string, quantity: Quantity, by: (of: TorsionFigures) => number | null) => {
		const values = [handbook, numerical].map((figures) => figures && by(figures));
		const shown = (value: number | null | undefined) =>
			formatQuantity(value, quantity, preferences, { digits: 4, grouping: 'always' });
		const [first, second] = values;
		return {
			name,
			unit: unitLabel(quantity, preferences),
			handbook: shown(first),
			numerical: shown(second),
			difference: differenceOf(first, second, quantity, preferences)
		};
	};
	const rounding = placeRounding * Math.hypot(height, width);
	const offset = (axis: 'y' | 'z') => (figures: TorsionFigures) => {
		if (!figures.shearCentre) return null;
		const value = figures.shearCentre[axis] - centroid[axis];
		return Math.abs(value) < rounding ? 0 : value;
	};
	return [
		row('Torsion constant', 'secondMoment', ({ torsionConstant }) => torsionConstant),
		row('Warping constant', 'warping', ({ warpingConstant }) => warpingConstant),
		row('Shear centre from centroid, right', 'length', offset('y')),
		row('Shear centre from centroid, up', 'length', offset('z'))
	];
}

/** Places nearer to the centroid than this share of the section's size are rounding. */
const placeRounding = 1e-7;

function differenceOf(
	first: number | null | undefined,
	second: number | null | undefined,
	quantity: Quantity,
	preferences: Preferences
): string {
	if (first === null || first === undefined || second === null || second === undefined) return '';
	if (quantity === 'length')
		return formatQuantity(second - first, 'length', preferences, {
			digits: 2,
			plus: true,
			unit: true
		});
	if (first === 0) return '';
	const share = (100 * (second - first)) / first;
	return `${formatNumber(share, preferences, { decimals: 1, plus: true })} %`;
}
