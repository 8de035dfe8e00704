import type { PreparedSection } from '../section/prepared';
import type { GrossFigure } from './gross-workings';
import { workingKey } from './keys';
import type { WorkingInput } from './working';

const key = workingKey.gross;

/** Elastic moduli, radii of gyration, principal figures and outside sizes. */
export function modulusWorkings(section: PreparedSection): GrossFigure[] {
	const { gross, bounds } = section;
	const { y, z } = gross.centroid;
	const [Iy, Iz] = [second('y', gross.secondMomentY), second('z', gross.secondMomentZ)];
	const A: WorkingInput = { symbol: 'A', value: gross.area, unit: 'mm²', from: key('area') };
	const top = gross.secondMomentY / gross.elasticModulusYTop;
	const bottom = gross.secondMomentY / gross.elasticModulusYBottom;
	const left = gross.secondMomentZ / gross.elasticModulusZLeft;
	const right = gross.secondMomentZ / gross.elasticModulusZRight;
	return [
		modulus('elasticModulusYTop', gross.elasticModulusYTop, Iy, z + top, z, 'z'),
		modulus('elasticModulusYBottom', gross.elasticModulusYBottom, Iy, z - bottom, z, 'z'),
		modulus('elasticModulusZLeft', gross.elasticModulusZLeft, Iz, y - left, y, 'y'),
		modulus('elasticModulusZRight', gross.elasticModulusZRight, Iz, y + right, y, 'y'),
		radius('radiusOfGyrationY', gross.radiusOfGyrationY, Iy, A),
		radius('radiusOfGyrationZ', gross.radiusOfGyrationZ, Iz, A),
		...principalFigures(section, Iy, Iz),
		extent('height', gross.height, bounds.top),
		extent('width', gross.width, bounds.right)
	];
}

const second = (axis: 'y' | 'z', value: number): WorkingInput => ({
	symbol: `I_${axis}`,
	value,
	unit: 'mm⁴',
	from: key(axis === 'y' ? 'secondMomentY' : 'secondMomentZ')
});

/** I over the distance of the edge from the centroid. */
const modulus = (
	figure: string,
	value: number,
	I: WorkingInput,
	edge: number,
	centroid: number,
	axis: 'y' | 'z'
): GrossFigure => ({
	figure,
	title: `Elastic modulus, ${figure.replace(/^elasticModulus[YZ]/, '').toLowerCase()} edge`,
	value,
	unit: 'mm³',
	formula: `W_el = ${I.symbol}/abs(${axis}_e − ${axis}_c)`,
	inputs: [
		I,
		{ symbol: `${axis}_e`, value: edge, unit: 'mm', from: 'outermost edge' },
		{ symbol: `${axis}_c`, value: centroid, unit: 'mm', from: key(`centroid.${axis}`) }
	]
});

const radius = (figure: string, value: number, I: WorkingInput, A: WorkingInput): GrossFigure => ({
	figure,
	title: 'Radius of gyration',
	value,
	unit: 'mm',
	formula: `i = √(${I.symbol}/A)`,
	inputs: [I, A]
});

function principalFigures(
	{ gross }: PreparedSection,
	Iy: WorkingInput,
	Iz: WorkingInput
): GrossFigure[] {
	const Iyz: WorkingInput = {
		symbol: 'I_yz',
		value: gross.productYZ,
		unit: 'mm⁴',
		from: key('productYZ')
	};
	const root = '√(((I_y − I_z)/2)² + I_yz²)';
	const inputs = [Iy, Iz, Iyz];
	const unit = 'mm⁴';
	return [
		{
			figure: 'secondMomentU',
			title: 'Greatest second moment of area',
			value: gross.secondMomentU,
			unit,
			formula: `I_u = (I_y + I_z)/2 + ${root}`,
			inputs
		},
		{
			figure: 'secondMomentV',
			title: 'Least second moment of area',
			value: gross.secondMomentV,
			unit,
			formula: `I_v = (I_y + I_z)/2 − ${root}`,
			inputs
		},
		{
			figure: 'principalAngle',
			title: 'Direction of the major axis from y, half the angle of (−2 I_yz, I_y − I_z)',
			value: gross.principalAngle,
			unit: '°',
			formula: 'θ = θ_u',
			inputs: [
				{
					symbol: 'θ_u',
					value: gross.principalAngle,
					unit: '°',
					from: 'tan 2θ = −2 I_yz/(I_y − I_z); 0 where all axes are principal'
				}
			]
		}
	];
}

const extent = (figure: string, value: number, to: number): GrossFigure => ({
	figure,
	title: figure === 'height' ? 'Height' : 'Width',
	value,
	unit: 'mm',
	formula: 'h = e_2 − e_1',
	inputs: [
		{ symbol: 'e_1', value: to - value, unit: 'mm', from: 'one edge' },
		{ symbol: 'e_2', value: to, unit: 'mm', from: 'the other edge' }
	]
});
