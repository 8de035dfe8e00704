import type { GrossProperties } from '../section/prepared';
import type { GrossFigure } from './gross-workings';
import { workingKey } from './keys';
import { partInputs, partSum, type PartArea } from './part-inputs';
import type { WorkingInput } from './working';

const key = workingKey.gross;

/** Area, mass, centroid and second moments by the parallel axis theorem. */
export function areaWorkings(parts: readonly PartArea[], gross: GrossProperties): GrossFigure[] {
	const A = partInputs(parts, 'A', 'mm²', ({ area }) => area);
	const total: WorkingInput = { symbol: 'A', value: gross.area, unit: 'mm²', from: key('area') };
	return [
		{
			figure: 'area',
			title: 'Area',
			value: gross.area,
			unit: 'mm²',
			formula: `A = ${partSum(parts, (i) => `A_${i}`)}`,
			inputs: A
		},
		massFigure(parts, gross, A),
		centroidFigure(parts, 'y', gross.centroid.y, [...A, total]),
		centroidFigure(parts, 'z', gross.centroid.z, [...A, total]),
		secondFigure(parts, 'y', gross, A),
		secondFigure(parts, 'z', gross, A),
		productFigure(parts, gross, A)
	];
}

const massFigure = (
	parts: readonly PartArea[],
	gross: GrossProperties,
	A: readonly WorkingInput[]
): GrossFigure => ({
	figure: 'mass',
	title: 'Mass per metre',
	value: gross.mass,
	unit: 'kg/m',
	formula: `m = (${partSum(parts, (i) => `A_${i}·ρ_${i}`)})·10^-6`,
	inputs: [...A, ...partInputs(parts, 'ρ', 'kg/m³', ({ density }) => density)]
});

const centroidFigure = (
	parts: readonly PartArea[],
	axis: 'y' | 'z',
	value: number,
	areas: readonly WorkingInput[]
): GrossFigure => ({
	figure: `centroid.${axis}`,
	title: `Centroid, ${axis}`,
	value,
	unit: 'mm',
	formula: `${axis}_c = (${partSum(parts, (i) => `A_${i}·${axis}_${i}`)})/A`,
	inputs: [...areas, ...partInputs(parts, axis, 'mm', (part) => part[axis])]
});

function secondFigure(
	parts: readonly PartArea[],
	axis: 'y' | 'z',
	gross: GrossProperties,
	A: readonly WorkingInput[]
): GrossFigure {
	const across = axis === 'y' ? 'z' : 'y';
	const figure = axis === 'y' ? 'secondMomentY' : 'secondMomentZ';
	return {
		figure,
		title: `Second moment of area about ${axis}–${axis}`,
		value: gross[figure],
		unit: 'mm⁴',
		formula: `I_${axis} = ${partSum(parts, (i) => `I_${i} + A_${i}·(${across}_${i} − ${across}_c)²`)}`,
		inputs: [
			...partInputs(parts, 'I', 'mm⁴', (part) => (axis === 'y' ? part.secondY : part.secondZ)),
			...A,
			...partInputs(parts, across, 'mm', (part) => part[across]),
			{
				symbol: `${across}_c`,
				value: gross.centroid[across],
				unit: 'mm',
				from: key(`centroid.${across}`)
			}
		]
	};
}

/** Zero by symmetry is written as such. */
function productFigure(
	parts: readonly PartArea[],
	gross: GrossProperties,
	A: readonly WorkingInput[]
): GrossFigure {
	const head = { figure: 'productYZ', value: gross.productYZ, unit: 'mm⁴' };
	if (gross.productYZ === 0)
		return {
			...head,
			title: 'Product of inertia, zero by symmetry',
			formula: 'I_yz = 0',
			inputs: []
		};
	const { y, z } = gross.centroid;
	return {
		...head,
		title: 'Product of inertia',
		formula: `I_yz = ${partSum(parts, (i) => `P_${i} + A_${i}·(y_${i} − y_c)·(z_${i} − z_c)`)}`,
		inputs: [
			...partInputs(parts, 'P', 'mm⁴', ({ product }) => product),
			...A,
			...partInputs(parts, 'y', 'mm', (part) => part.y),
			...partInputs(parts, 'z', 'mm', (part) => part.z),
			{ symbol: 'y_c', value: y, unit: 'mm', from: key('centroid.y') },
			{ symbol: 'z_c', value: z, unit: 'mm', from: key('centroid.z') }
		]
	};
}
