import { workingKey } from '../../explain/keys';
import type { Working, WorkingInput } from '../../explain/working';
import { clauseOf, editionName } from './edition';
import { imperfections } from './lateral-torsional-curve';
import type { LateralTorsional } from './lateral-torsional';
import type { EnModel } from './model';

const input = (symbol: string, value: number, unit: string, from?: string): WorkingInput =>
	from === undefined ? { symbol, value, unit } : { symbol, value, unit, from };

/** Keeps how Mcr, λLT, χLT and Mb,Rd came about. */
export function explainLateral(
	{ workings, code }: EnModel,
	name: string,
	found: LateralTorsional
): void {
	if (workings === null) return;
	const key = (figure: string) => workingKey.reduced(name, figure);
	const edition = editionName(code.standard);
	const titled = (
		title: string,
		clause: string
	): Pick<Working, 'title' | 'clause' | 'edition'> => ({
		title,
		clause,
		edition
	});
	const general = clauseOf(code.standard, 'lateralTorsional');
	workings.add(key('Mcr'), () => ({
		title: 'Elastic critical moment',
		clause: 'ENV 1993-1-1:1992 F.1.2',
		edition: 'ENV 1993-1-1:1992, from memory',
		...criticalParts(found)
	}));
	workings.add(key('lambdaLT'), () => ({
		...titled('Slenderness for lateral–torsional buckling', `${general}.2(1)`),
		formula: 'λ_LT = √(M_k/M_cr)',
		inputs: [
			input('M_k', found.Mk, 'kNm', 'Wy fy of the class'),
			input('M_cr', found.Mcr, 'kNm', key('Mcr'))
		],
		result: { value: found.lambda, unit: '' }
	}));
	workings.add(key('chiLT'), () => ({
		...titled(`Reduction, curve ${found.curve}`, found.clause),
		...reductionParts(found, key)
	}));
	workings.add(key('MbRd'), () => ({
		...titled('Resistance to lateral–torsional buckling', `${general}.1(3)`),
		formula: 'M_b,Rd = χ_LT·M_k/γM1',
		inputs: [
			input('χ_LT', found.chi, '', key('chiLT')),
			input('M_k', found.Mk, 'kNm', 'Wy fy of the class'),
			input('γM1', code.gammaM1, '', 'chosen with the code')
		],
		result: { value: found.MbRd, unit: 'kNm' }
	}));
}

type Parts = Pick<Working, 'formula' | 'inputs' | 'result'>;

function criticalParts({ Mcr, stiffness, shape, length }: LateralTorsional): Parts {
	const { E, G, Iz, It, Iw, zj } = stiffness;
	const s = '(C2·zg − zj)';
	return {
		formula: `M_cr = C1·π²·E·Iz/L²·(√(Iw/Iz + L²·G·It/(π²·E·Iz) + ${s}²) − ${s})·10^-6`,
		inputs: [
			input('C1', shape.C1, '', 'demand'),
			input('C2', shape.C2, '', 'of the load that C1 belongs to'),
			input('zg', shape.zg, 'mm', 'load above the shear centre'),
			input('zj', zj, 'mm', 'asymmetry counted'),
			input('π', Math.PI, ''),
			input('E', E, 'N/mm²'),
			input('G', G, 'N/mm²', 'E/2.6'),
			input('Iz', Iz, 'mm⁴', 'about the axis it buckles about'),
			input('It', It, 'mm⁴', 'gross.torsionConstant'),
			input('Iw', Iw, 'mm⁶', 'gross.warpingConstant; 0 for closed sections'),
			input('L', length, 'mm', 'unbraced length')
		],
		result: { value: Mcr, unit: 'kNm' }
	};
}

function reductionParts(found: LateralTorsional, key: (figure: string) => string): Parts {
	const { lambda, chi, f, curve, method } = found;
	const result = { value: chi, unit: '' };
	const slenderness = input('λ', lambda, '', key('lambdaLT'));
	const alpha = input('α', imperfections[curve], '', `curve ${curve}`);
	const limit = method === 'general' ? 0.2 : 0.4;
	if (lambda <= limit)
		return { formula: `χ_LT = min(1, ${limit}/λ)`, inputs: [slenderness], result };
	const share = method === 'general' ? '' : '0.75·';
	const phi =
		0.5 *
		(1 + imperfections[curve] * (lambda - limit) + (method === 'general' ? 1 : 0.75) * lambda ** 2);
	const inputs = [
		slenderness,
		alpha,
		input('Φ', phi, '', `0.5·(1 + α·(λ − ${limit}) + ${share}λ²)`)
	];
	const own = `1/(Φ + √(Φ² − ${share}λ²))`;
	return method === 'general'
		? { formula: `χ_LT = min(1, ${own})`, inputs, result }
		: {
				formula: `χ_LT = min(1, 1/λ², min(1, 1/λ², ${own})/f)`,
				inputs: [...inputs, input('f', f, '', '6.3.2.3(2) with kc = 1/√C1')],
				result
			};
}
