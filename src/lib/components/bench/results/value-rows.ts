import {
	formatNumber,
	formatQuantity,
	unitLabel,
	type Preferences,
	type Quantity
} from '$lib/units';
import type { Analysis } from '$lib/engine/rules/analysis';
import type { PreparedSection } from '$lib/engine/section/prepared';

/** A row of the values table: one figure, or first yield beside full plastic. */
export interface ValueRow {
	readonly name: string;
	readonly unit: string;
	readonly figures: readonly string[];
}

type Figures = Pick<Analysis, 'gross' | 'moment' | 'squashLoad'>;

/** Rows that stand at first yield and at full plastic. */
export function limitRows(
	{ gross, moment }: Figures,
	{ bounds }: PreparedSection,
	preferences: Preferences
): ValueRow[] {
	const row = rowMaker(preferences);
	const elasticY = Math.min(gross.elasticModulusYTop, gross.elasticModulusYBottom);
	const elasticZ = Math.min(gross.elasticModulusZLeft, gross.elasticModulusZRight);
	const above = (z: number | null) => (z === null ? null : z - bounds.bottom);
	const along = (y: number | null) => (y === null ? null : y - bounds.left);
	return [
		row('Moment, y–y', 'moment', moment.firstYieldY, moment.plasticY),
		row('Moment, z–z', 'moment', moment.firstYieldZ, moment.plasticZ),
		row('Modulus, y–y', 'modulus', elasticY, gross.plasticModulusY),
		row('Modulus, z–z', 'modulus', elasticZ, gross.plasticModulusZ),
		row('Axis from base', 'length', above(gross.centroid.z), above(moment.plasticNeutralAxisZ)),
		row('Axis from left', 'length', along(gross.centroid.y), along(moment.plasticNeutralAxisY))
	];
}

/** Rows of one figure. */
export function singleRows(
	{ gross, moment, squashLoad }: Figures,
	preferences: Preferences
): ValueRow[] {
	const row = rowMaker(preferences);
	const plain = (name: string, value: number | null) => ({
		name,
		unit: '',
		figures: [formatNumber(value, preferences, { decimals: 3 })]
	});
	return [
		plain('Shape factor, y–y', moment.shapeFactorY),
		plain('Shape factor, z–z', moment.shapeFactorZ),
		row('Area', 'area', gross.area),
		row('Mass', 'massPerLength', gross.mass),
		row('Squash load', 'force', squashLoad),
		row('Second moment, y–y', 'secondMoment', gross.secondMomentY),
		row('Second moment, z–z', 'secondMoment', gross.secondMomentZ),
		...principalRows(gross, row),
		row('Radius of gyration, y–y', 'length', gross.radiusOfGyrationY),
		row('Radius of gyration, z–z', 'length', gross.radiusOfGyrationZ),
		row('Torsion constant', 'secondMoment', gross.torsionConstant),
		row('Warping constant', 'warping', gross.warpingConstant),
		row('Shear centre from centroid, up', 'length', shearOffset(gross, 'z')),
		row('Shear centre from centroid, right', 'length', shearOffset(gross, 'y')),
		row('Painted surface', 'surface', gross.perimeter)
	];
}

function shearOffset({ shearCentre, centroid }: Figures['gross'], axis: 'y' | 'z'): number | null {
	if (!shearCentre) return null;
	const offset = shearCentre[axis] - centroid[axis];
	return Math.abs(offset) < 1e-9 ? 0 : offset;
}

/** Principal axes only where they are not y and z. */
function principalRows(gross: Figures['gross'], row: RowMaker): ValueRow[] {
	const angle = gross.principalAngle;
	if (Math.abs(angle) < 1e-6 || Math.abs(Math.abs(angle) - 90) < 1e-6) return [];
	return [
		row('Second moment, u–u', 'secondMoment', gross.secondMomentU),
		row('Second moment, v–v', 'secondMoment', gross.secondMomentV),
		row('Axis u from y', 'angle', angle)
	];
}

type RowMaker = (name: string, quantity: Quantity, ...values: (number | null)[]) => ValueRow;

const rowMaker =
	(preferences: Preferences): RowMaker =>
	(name, quantity, ...values) => ({
		name,
		unit: unitLabel(quantity, preferences),
		figures: values.map((value) =>
			formatQuantity(value, quantity, preferences, {
				digits: quantity === 'length' ? 4 : 4,
				grouping: 'always'
			})
		)
	});
