import {
	formatNumber,
	formatQuantity,
	unitLabel,
	type Preferences,
	type Quantity
} from '$lib/units';
import { workingKey } from '$lib/engine/explain/keys';
import type { Analysis } from '$lib/engine/rules/analysis';
import { isEn1993 } from '$lib/engine/rules/en1993/edition';
import { shearAreasOf } from '$lib/engine/rules/en1993/shear-area';
import type { PreparedSection } from '$lib/engine/section/prepared';

/** A row of the values table: one figure, or first yield beside full plastic. */
export interface ValueRow {
	readonly name: string;
	readonly unit: string;
	readonly figures: readonly string[];
	/** Keys of their workings, one for each. */
	readonly keys: readonly string[];
}

const { gross: of, moment: own, place } = workingKey;

type Figures = Pick<Analysis, 'gross' | 'moment' | 'squashLoad' | 'code'>;

/** Rows that stand at first yield and at full plastic. */
export function limitRows(
	{ gross, moment }: Figures,
	{ bounds }: PreparedSection,
	preferences: Preferences
): ValueRow[] {
	const row = rowMaker(preferences);
	const lessY = lesser(gross, 'elasticModulusYTop', 'elasticModulusYBottom');
	const lessZ = lesser(gross, 'elasticModulusZLeft', 'elasticModulusZRight');
	const above = (z: number | null) => (z === null ? null : z - bounds.bottom);
	const along = (y: number | null) => (y === null ? null : y - bounds.left);
	return [
		row(
			'Moment, y–y',
			'moment',
			[own('firstYieldY'), own('plasticY')],
			moment.firstYieldY,
			moment.plasticY
		),
		row(
			'Moment, z–z',
			'moment',
			[own('firstYieldZ'), own('plasticZ')],
			moment.firstYieldZ,
			moment.plasticZ
		),
		row(
			'Modulus, y–y',
			'modulus',
			[of(lessY), of('plasticModulusY')],
			gross[lessY],
			gross.plasticModulusY
		),
		row(
			'Modulus, z–z',
			'modulus',
			[of(lessZ), of('plasticModulusZ')],
			gross[lessZ],
			gross.plasticModulusZ
		),
		row(
			'Axis from base',
			'length',
			[place('centroid.z'), place('plasticAxis.z')],
			above(gross.centroid.z),
			above(moment.plasticNeutralAxisZ)
		),
		row(
			'Axis from left',
			'length',
			[place('centroid.y'), place('plasticAxis.y')],
			along(gross.centroid.y),
			along(moment.plasticNeutralAxisY)
		)
	];
}

/** Rows of one figure. */
export function singleRows(
	{ gross, moment, squashLoad, code }: Figures,
	section: PreparedSection,
	preferences: Preferences
): ValueRow[] {
	const row = rowMaker(preferences);
	const plain = (name: string, key: string, value: number | null) => ({
		name,
		unit: '',
		figures: [formatNumber(value, preferences, { decimals: 3 })],
		keys: [own(key)]
	});
	return [
		plain('Shape factor, y–y', 'shapeFactorY', moment.shapeFactorY),
		plain('Shape factor, z–z', 'shapeFactorZ', moment.shapeFactorZ),
		row('Area', 'area', [of('area')], gross.area),
		...shearRows(section, code, row),
		row('Mass', 'massPerLength', [of('mass')], gross.mass),
		row('Squash load', 'force', [workingKey.squashLoad], squashLoad),
		row('Second moment, y–y', 'secondMoment', [of('secondMomentY')], gross.secondMomentY),
		row('Second moment, z–z', 'secondMoment', [of('secondMomentZ')], gross.secondMomentZ),
		...principalRows(gross, row),
		row('Radius of gyration, y–y', 'length', [of('radiusOfGyrationY')], gross.radiusOfGyrationY),
		row('Radius of gyration, z–z', 'length', [of('radiusOfGyrationZ')], gross.radiusOfGyrationZ),
		row('Torsion constant', 'secondMoment', [of('torsionConstant')], gross.torsionConstant),
		row('Warping constant', 'warping', [of('warpingConstant')], gross.warpingConstant),
		row(
			'Shear centre from centroid, up',
			'length',
			[place('shearCentre.z')],
			shearOffset(gross, 'z')
		),
		row(
			'Shear centre from centroid, right',
			'length',
			[place('shearCentre.y')],
			shearOffset(gross, 'y')
		),
		row('Painted surface', 'surface', [of('perimeter')], gross.perimeter)
	];
}

/** Shear areas by EN 1993-1-1, with its η; where it gives none for the shape the figure is missing. */
function shearRows(section: PreparedSection, code: Figures['code'], row: RowMaker): ValueRow[] {
	if (!isEn1993(code.standard)) return [];
	const { y, z } = shearAreasOf(section, code.eta);
	return [
		row('Shear area, along z', 'area', [workingKey.shear('z', 'area')], z?.area ?? null),
		row('Shear area, along y', 'area', [workingKey.shear('y', 'area')], y?.area ?? null)
	];
}

/** Which of two moduli is the lesser: that edge yields first. */
const lesser = <K extends keyof Figures['gross']>(gross: Figures['gross'], a: K, b: K): K =>
	gross[b]! < gross[a]! ? b : a;

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
		row('Second moment, u–u', 'secondMoment', [of('secondMomentU')], gross.secondMomentU),
		row('Second moment, v–v', 'secondMoment', [of('secondMomentV')], gross.secondMomentV),
		row('Axis u from y', 'angle', [of('principalAngle')], angle)
	];
}

type RowMaker = (
	name: string,
	quantity: Quantity,
	keys: readonly string[],
	...values: (number | null)[]
) => ValueRow;

const rowMaker =
	(preferences: Preferences): RowMaker =>
	(name, quantity, keys, ...values) => ({
		name,
		keys,
		unit: unitLabel(quantity, preferences),
		figures: values.map((value) =>
			formatQuantity(value, quantity, preferences, {
				digits: quantity === 'length' ? 4 : 4,
				grouping: 'always'
			})
		)
	});
