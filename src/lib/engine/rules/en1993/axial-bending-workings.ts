import { workingKey } from '../../explain/keys';
import type { Working, WorkingInput } from '../../explain/working';
import type { AxialMoment } from './axial-bending';
import { clauseOf, editionName } from './edition';
import type { EnModel } from './model';

const axisOf = ({ sense }: AxialMoment): 'y' | 'z' =>
	sense === 'plusMy' || sense === 'minusMy' ? 'y' : 'z';

/** Key and formula of a moment beside N. */
export function axialMomentFormula(moment: AxialMoment) {
	const axis = axisOf(moment);
	return {
		figure: `M${axis}NRd`,
		key: (demand: string) => workingKey.reduced(demand, `M${axis}NRd`)
	};
}

/** MN,Rd of 6.2.9.1 with the branch that was used. */
export function axialMomentWorking(
	{ code }: EnModel,
	moment: AxialMoment,
	demand: string
): Working {
	const axis = axisOf(moment);
	const { standard } = code;
	const branch = branchOf(moment);
	return {
		title: `Plastic moment about ${axis}–${axis} beside the axial force of ${demand}`,
		clause: clauseOf(standard, 'axialBending'),
		edition: editionName(standard),
		formula: `M_N,${axis},Rd = ${branch.formula}`,
		inputs: branch.inputs,
		result: { value: moment.value, unit: 'kNm' },
		...(moment.rule === 'round' ? { notes: ['round-axial-curve'] } : {})
	};
}

/** The plastic block under N, beside the code's own figure. */
export const exactMomentWorking = (moment: AxialMoment, demand: string): Working => ({
	title: `Plastic block about ${axisOf(moment)}–${axisOf(moment)} under the axial force of ${demand}`,
	clause: 'mechanics: equilibrium of the fully plastic block',
	edition: '—',
	formula: 'M_block = M_block,N',
	inputs: [
		{
			symbol: 'M_block,N',
			value: moment.exact,
			unit: 'kNm',
			from: 'every fibre at fy/γM0, neutral axis placed so that the forces add up to N'
		}
	],
	result: { value: moment.exact, unit: 'kNm' }
});

function branchOf(moment: AxialMoment): { formula: string; inputs: WorkingInput[] } {
	const { rule, n, a, share, value, alone } = moment;
	const M: WorkingInput = {
		symbol: 'M_pl,Rd',
		value: alone,
		unit: 'kNm',
		from: 'plastic moment over γM0'
	};
	const N: WorkingInput = { symbol: 'n', value: n, unit: '', from: 'N_Ed over N_pl,Rd' };
	const inputs = [M, N, ...(share?.inputs ?? []).map(shareInput)];
	const ratio = share?.formula ?? '';
	switch (rule) {
		case 'rectangle':
			return { formula: 'M_pl,Rd·(1 − n²)', inputs };
		case 'round':
			return { formula: 'M_pl,Rd·(1 − n^1.7)', inputs };
		case 'i-weak':
			return n <= a
				? { formula: 'M_pl,Rd', inputs: [M] }
				: { formula: `M_pl,Rd·(1 − ((n − ${ratio})/(1 − ${ratio}))²)`, inputs };
		case 'i-strong':
		case 'hollow-y':
		case 'hollow-z':
			return { formula: `min(M_pl,Rd·(1 − n)/(1 − 0.5·${ratio}), M_pl,Rd)`, inputs };
		case 'block':
			return {
				formula: 'M_block,N',
				inputs: [
					{
						symbol: 'M_block,N',
						value,
						unit: 'kNm',
						from: 'plastic block under N: every fibre at fy/γM0, no moment across'
					}
				]
			};
	}
}

const shareInput = ([symbol, value]: readonly [string, number]): WorkingInput => ({
	symbol,
	value,
	unit: symbol === 'A' ? 'mm²' : 'mm',
	from: 'section'
});
