import type { WorkingInput } from '../../explain/working';
import { axialStrength } from './axial-strength';
import { blockBesideAxial, momentBesideAxial, type AxialMoment } from './axial-bending';
import { axialMomentFormula } from './axial-bending-workings';
import { biaxialExponents } from './biaxial';
import { angleOf, senseY, senseZ, singleSense, type DemandCase } from './demand-case';
import type { NormalRule, NoRule } from './normal-rule';
import { sumName, sumRule } from './normal-rule-sum';

/**
 * N and moments in a class 1 or 2 section, 6.2.9.1: about one axis M ≤ MN,Rd; about both the
 * curve of 6.2.9.1(6) where the code gives its exponents, otherwise the plastic block along the
 * demand's own direction. N beyond the plastic resistance is added up linearly.
 */
export function plasticRule(c: DemandCase): NormalRule | NoRule {
	const { effects, context, classified } = c;
	const { N } = effects;
	const NRd = N === 0 ? 1 : context.axial(N, classified).value;
	if (NRd === null) return { gap: 'holes' };
	if (Math.abs(N) >= NRd && N !== 0) return exceeded(c, Math.abs(N) / NRd, NRd);
	const sense = singleSense(c.direction);
	const { kind } = context.model.section.definition;
	if (sense !== null) return besideAxial(c, momentBesideAxial(context.model, sense, N, NRd), NRd);
	// n of the code is over the plastic resistance of the whole section
	const n = Math.abs(N) / (axialStrength(context.model, true) / context.model.code.gammaM0);
	const y = momentBesideAxial(context.model, senseY(c.direction.y), N, NRd);
	const z = momentBesideAxial(context.model, senseZ(c.direction.z), N, NRd);
	if (Math.min(y.value / y.alone, z.value / z.alone) <= nothingLeft)
		return exceeded(c, Math.abs(N) / NRd, NRd);
	const exponents = y.rule === 'block' || z.rule === 'block' ? null : biaxialExponents(kind, n);
	return exponents === null ? blockRule(c, y, z) : curveRule(c, y, z, exponents);
}

/** Share of a plastic moment below which N has taken all of it. */
const nothingLeft = 1e-9;

/** N alone is too much: the linear sum says by how much. */
function exceeded(c: DemandCase, axial: number, axialLimit: number): NormalRule | NoRule {
	const limit = (sense: 'plusMy' | 'minusMy' | 'plusMz' | 'minusMz') =>
		c.context.bending(sense, c.classified, false).value;
	return sumRule(
		c,
		{ axial, axialLimit, addedY: 0, addedZ: 0, limitY: limit, limitZ: limit },
		{ topic: 'linearSum', basis: 'plastic', reduced: {} }
	);
}

/** What is told of the moment beside N about one axis. */
const reducedBy = (axis: 'y' | 'z', { value, exact }: AxialMoment, N: number) =>
	N === 0
		? {}
		: axis === 'y'
			? { MyNRd: value, MyNRdExact: exact }
			: { MzNRd: value, MzNRdExact: exact };

function besideAxial(c: DemandCase, own: AxialMoment, NRd: number): NormalRule | NoRule {
	const { N } = c.effects;
	const { sense } = own;
	if (own.value <= nothingLeft * own.alone) return exceeded(c, Math.abs(N) / NRd, NRd);
	const axis = sense === 'plusMy' || sense === 'minusMy' ? 'y' : 'z';
	return {
		name: sumName(c),
		topic: 'axialBending',
		value: c.size,
		limit: own.value,
		use: (moment) => moment / own.value,
		most: own.value,
		basis: 'plastic',
		kind: 'curve',
		reduced: reducedBy(axis, own, N),
		working: () => ({
			formula: 'U = M_Ed/M_N,Rd',
			inputs: [
				{ symbol: 'M_Ed', value: c.size, unit: 'kNm', from: 'demand' },
				{
					symbol: 'M_N,Rd',
					value: own.value,
					unit: 'kNm',
					from: axialMomentFormula(own).key(c.name)
				}
			],
			result: { value: c.size / own.value, unit: '' }
		})
	};
}

function blockRule(c: DemandCase, y: AxialMoment, z: AxialMoment): NormalRule {
	const { N } = c.effects;
	const own = blockBesideAxial(c.context.model, angleOf(c.direction), N);
	return {
		name: sumName(c),
		topic: N === 0 ? 'resistance' : 'axialBending',
		also: 'plastic block along the moment’s own direction',
		value: c.size,
		limit: own,
		use: (moment) => moment / own,
		most: own,
		basis: 'plastic',
		kind: 'curve',
		reduced: { ...reducedBy('y', y, N), ...reducedBy('z', z, N), MNRd: own },
		working: () => ({
			formula: 'U = M_Ed/M_N,Rd',
			inputs: [
				{ symbol: 'M_Ed', value: c.size, unit: 'kNm', from: 'demand' },
				{
					symbol: 'M_N,Rd',
					value: own,
					unit: 'kNm',
					from: 'plastic block with N and the moment in this direction, equilibrium of all parts'
				}
			],
			result: { value: c.size / own, unit: '' }
		})
	};
}

function curveRule(
	c: DemandCase,
	y: AxialMoment,
	z: AxialMoment,
	{ alpha, beta }: { alpha: number; beta: number }
): NormalRule {
	const { direction, size } = c;
	const use = (moment: number) =>
		(Math.abs(moment * direction.y) / y.value) ** alpha +
		(Math.abs(moment * direction.z) / z.value) ** beta;
	const { N } = c.effects;
	const inputs: WorkingInput[] = [
		{ symbol: 'M_y,Ed', value: Math.abs(size * direction.y), unit: 'kNm', from: 'demand' },
		{ symbol: 'M_N,y,Rd', value: y.value, unit: 'kNm', from: axialMomentFormula(y).key(c.name) },
		{ symbol: 'α', value: alpha, unit: '', from: 'exponent for the kind of section and n' },
		{ symbol: 'M_z,Ed', value: Math.abs(size * direction.z), unit: 'kNm', from: 'demand' },
		{ symbol: 'M_N,z,Rd', value: z.value, unit: 'kNm', from: axialMomentFormula(z).key(c.name) },
		{ symbol: 'β', value: beta, unit: '', from: 'exponent for the kind of section and n' }
	];
	return {
		name: sumName(c),
		topic: 'biaxial',
		value: use(size),
		limit: 1,
		use,
		most: null,
		basis: 'plastic',
		kind: 'curve',
		reduced: { ...reducedBy('y', y, N), ...reducedBy('z', z, N), alpha, beta },
		working: () => ({
			formula: 'U = (M_y,Ed/M_N,y,Rd)^α + (M_z,Ed/M_N,z,Rd)^β',
			inputs,
			result: { value: use(size), unit: '' }
		})
	};
}
