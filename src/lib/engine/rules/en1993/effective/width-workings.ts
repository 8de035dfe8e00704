import { workingKey } from '../../../explain/keys';
import type { Working, WorkingInput, Workings } from '../../../explain/working';
import { isFirstBranch, leastRatio } from './buckling-factor';
import type { ElementWidth } from './element-width';
import { internalLimit, outstandLimit } from './reduction';
import { clause, edition, input } from './working-parts';
import type { EffectiveBasis } from './stress-field';

type Row = readonly [
	figure: string,
	title: string,
	formula: string,
	inputs: readonly WorkingInput[],
	value: number,
	unit: string
];

/** One pass under the name of its basis, the figures with the axis at rest beside it. */
export type ExplainedBasis = EffectiveBasis | `${EffectiveBasis} converged`;

/** Workings of one effective width: ψ, kσ, λp, ρ, bc, be1 and be2 by their names, beff under the element's own key. */
export function widthWorkings(
	workings: Workings,
	basis: ExplainedBasis,
	width: ElementWidth
): void {
	const { part, id, type } = width.element;
	const table = type === 'internal' ? 'Table 4.1' : 'Table 4.2';
	for (const [figure, title, formula, inputs, value, unit] of rowsOf(width)) {
		const key =
			figure === 'effective'
				? workingKey.effectiveWidth(basis, part, id)
				: workingKey.effectiveWidthFigure(basis, part, id, figure);
		workings.add(key, (): Working => ({
			title: `${title} of ${id}`,
			clause: `${clause}, ${table}`,
			edition,
			formula,
			inputs,
			result: { value, unit }
		}));
	}
}

function rowsOf(width: ElementWidth): Row[] {
	const { psi, kSigma, slenderness, rho, compressedWidth, effective } = width;
	const { c, t, epsilon } = width.element;
	const ratio = input('ψ', psi, '', 'stress ratio of the edges');
	const whole = input('b', c, 'mm', 'width that the code measures');
	return [
		['psi', 'Stress ratio', ...stressRatio(width), psi, ''],
		['kSigma', 'Buckling factor', factorFormula(width), [ratio], kSigma, ''],
		[
			'slenderness',
			'Plate slenderness',
			'λp = (b/t)/(28.4·ε·√(k_σ))',
			[whole, input('t', t, 'mm'), input('ε', epsilon, ''), input('k_σ', kSigma, '')],
			slenderness,
			''
		],
		['rho', 'Reduction factor', ...reduction(width, ratio), rho, ''],
		[
			'compressedWidth',
			'Compressed width',
			psi < 0 ? 'b_c = b/(1 − ψ)' : 'b_c = b',
			[whole, ratio],
			compressedWidth,
			'mm'
		],
		[
			'effective',
			'Effective width',
			'b_eff = ρ·b_c',
			[input('ρ', rho, ''), input('b_c', compressedWidth, 'mm')],
			effective,
			'mm'
		],
		...edgeRows(width, ratio)
	];
}

/** Stresses are told under 1 kNm; in compression every part is stressed alike. */
function stressRatio({ psi, most, least }: ElementWidth): [string, WorkingInput[]] {
	const stresses = [
		input('σ1', most * 1e6, 'N/mm²', 'more compressed edge, under 1 kNm'),
		input('σ2', least * 1e6, 'N/mm²', 'other edge')
	];
	if (psi === 1) return ['ψ = 1', []];
	return psi === 0 ? ['ψ = 0', stresses] : ['ψ = σ2/σ1', stresses];
}

function factorFormula({ element, psi, end }: ElementWidth): string {
	if (element.type === 'internal') {
		if (psi >= 0) return 'k_σ = 8.2/(1.05 + ψ)';
		return isFirstBranch(psi)
			? 'k_σ = 7.81 − 6.29·ψ + 9.78·ψ²'
			: `k_σ = 5.98·(1 − ${atLeast(psi, leastRatio)})²`;
	}
	if (end === 'tip') {
		const ratio = atLeast(psi, leastRatio);
		return `k_σ = 0.57 − 0.21·${ratio} + 0.07·${ratio}²`;
	}
	const ratio = atLeast(psi, -1);
	return psi > 0 ? 'k_σ = 0.578/(ψ + 0.34)' : `k_σ = 1.7 − 5·${ratio} + 17.1·${ratio}²`;
}

const atLeast = (psi: number, least: number): string =>
	psi < least ? `max(ψ, −${Math.abs(least)})` : 'ψ';

function reduction(
	{ element: { type }, psi, slenderness }: ElementWidth,
	ratio: WorkingInput
): [string, WorkingInput[]] {
	const limit = type === 'internal' ? internalLimit(psi) : outstandLimit;
	const given = [
		input('λp', slenderness, ''),
		ratio,
		input('λlim', limit, '', 'nothing is reduced up to this slenderness')
	];
	if (slenderness <= limit) return ['ρ = 1', given];
	const share = type === 'internal' ? `0.055·(3 + ${atLeast(psi, leastRatio)})` : '0.188';
	return [`ρ = min(1, (λp − ${share})/λp²)`, given];
}

function edgeRows({ element, psi, effective, edges }: ElementWidth, ratio: WorkingInput): Row[] {
	if (element.type === 'outstand') return [];
	const inputs = [input('b_eff', effective, 'mm'), ratio];
	const [first, second] = edgeFormulas(psi);
	return [
		['be1', 'Width beside the more compressed edge', first, inputs, edges[0], 'mm'],
		[
			'be2',
			'Width on the other side',
			second,
			[...inputs, input('b_e1', edges[0], 'mm')],
			edges[1],
			'mm'
		]
	];
}

function edgeFormulas(psi: number): [string, string] {
	if (psi < 0) return ['b_e1 = 0.4·b_eff', 'b_e2 = 0.6·b_eff'];
	return ['b_e1 = 2·b_eff/(5 − ψ)', 'b_e2 = b_eff − b_e1'];
}
