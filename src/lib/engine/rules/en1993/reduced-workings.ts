import { workingKey } from '../../explain/keys';
import type { Working } from '../../explain/working';
import type { ReducedFigures } from '../result';
import { momentBesideAxial } from './axial-bending';
import { axialMomentWorking, exactMomentWorking } from './axial-bending-workings';
import { senseY, senseZ, type DemandCase } from './demand-case';
import { clauseOf, editionName } from './edition';

/** Workings of what is left beside a demand's own forces. */
export function reducedWorkings(c: DemandCase, reduced: ReducedFigures): void {
	const { workings } = c.context.model;
	if (workings === null) return;
	axialMoments(c, reduced);
	for (const [figure, value] of Object.entries(reduced) as [keyof ReducedFigures, number][]) {
		const key = workingKey.reduced(c.name, figure);
		if (workings.get(key) === undefined) workings.add(key, () => plainWorking(c, figure, value));
	}
}

function axialMoments(c: DemandCase, reduced: ReducedFigures): void {
	const { context, effects, classified, direction, name } = c;
	const { workings } = context.model;
	if (effects.N === 0) return;
	const NRd = context.axial(effects.N, classified).value;
	if (NRd === null) return;
	const senses = { MyNRd: senseY(direction.y), MzNRd: senseZ(direction.z) };
	for (const figure of ['MyNRd', 'MzNRd'] as const) {
		if (reduced[figure] === undefined) continue;
		const found = momentBesideAxial(context.model, senses[figure], effects.N, NRd);
		workings?.add(workingKey.reduced(name, figure), () =>
			axialMomentWorking(context.model, found, name)
		);
		workings?.add(workingKey.reduced(name, `${figure}Exact`), () =>
			exactMomentWorking(found, name)
		);
	}
}

const words: Readonly<Partial<Record<keyof ReducedFigures, readonly [string, string, string]>>> = {
	MyVRd: ['Moment about y–y beside shear', 'M_V', 'resistance beside this shear'],
	MzVRd: ['Moment about z–z beside shear', 'M_V', 'resistance beside this shear'],
	MNRd: [
		'Plastic block along the moment’s own direction beside N',
		'M_N',
		'equilibrium of all parts'
	],
	MNVRd: [
		'Plastic block beside N and shear',
		'M_NV',
		'equilibrium of all parts with (1 − ρ) fy on the shear areas'
	],
	NVRd: ['Axial resistance beside shear', 'N_V', 'all parts with (1 − ρ) fy on the shear areas'],
	alpha: ['Exponent α', 'α', 'kind of section and n'],
	beta: ['Exponent β', 'β', 'kind of section and n'],
	deltaMy: ['Moment about y–y that N adds', 'ΔM', 'N times the shift of the effective centroid'],
	deltaMz: ['Moment about z–z that N adds', 'ΔM', 'N times the shift of the effective centroid']
};

function plainWorking(c: DemandCase, figure: keyof ReducedFigures, value: number): Working {
	const { standard } = c.context.model.code;
	const [title, symbol, from] = words[figure] ?? [figure, 'R', 'resistance beside this demand'];
	const unit = figure === 'alpha' || figure === 'beta' ? '' : figure === 'NVRd' ? 'kN' : 'kNm';
	return {
		title: `${title}, ${c.name}`,
		clause: clauseOf(standard, figure.includes('V') ? 'bendingShearAxial' : 'axialBending'),
		edition: editionName(standard),
		formula: `${symbol} = ${symbol}'`,
		inputs: [{ symbol: `${symbol}'`, value, unit, from }],
		result: { value, unit }
	};
}
