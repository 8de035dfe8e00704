import { workingKey } from '../../explain/keys';
import type { Working, WorkingInput } from '../../explain/working';
import type { AxisSense } from '../section-moments';
import { clauseOf, editionName } from './edition';
import type { Interpolation, Row } from './interpolated-modulus';
import type { EnModel } from './model';

export const axisOf = (sense: AxisSense) => (sense === 'plusMy' || sense === 'minusMy' ? 'Y' : 'Z');

export const bendingTitle: Readonly<Record<AxisSense, string>> = {
	plusMy: 'Moment resistance, bottom in tension',
	minusMy: 'Moment resistance, top in tension',
	plusMz: 'Moment resistance, right in tension',
	minusMz: 'Moment resistance, left in tension'
};

/** Same to this share: two ways to one figure. */
export const same = 1e-10;

export const factor = ({ code }: EnModel): WorkingInput => ({
	symbol: 'γM0',
	value: code.gammaM0,
	unit: '',
	from: 'partial factor of the code chosen'
});

export const strength = (fy: number): WorkingInput => ({
	symbol: 'fy',
	value: fy,
	unit: 'N/mm²',
	from: 'grade at its thickness'
});

function described(
	model: EnModel,
	sense: AxisSense,
	formula: string,
	inputs: readonly WorkingInput[],
	value: number
): Working {
	const { standard } = model.code;
	return {
		title: bendingTitle[sense],
		clause: clauseOf(standard, 'bending'),
		edition: editionName(standard),
		formula,
		inputs: [...inputs, factor(model)],
		result: { value, unit: 'kNm' }
	};
}

/** W_pl fy/γM0, or the block of parts of several strengths over γM0. */
export function plasticMomentWorking(model: EnModel, sense: AxisSense, value: number): Working {
	const { section, strengths, code, moments } = model;
	const axis = axisOf(sense);
	const W = section.gross[axis === 'Y' ? 'plasticModulusY' : 'plasticModulusZ'];
	const byModulus = (W * strengths.least * 1e-6) / code.gammaM0;
	if (!strengths.hybrid && Math.abs(byModulus / value - 1) <= same)
		return described(
			model,
			sense,
			'M_c,Rd = W_pl·fy/γM0·10^-6',
			[
				{ symbol: 'W_pl', value: W, unit: 'mm³', from: workingKey.gross(`plasticModulus${axis}`) },
				strength(strengths.least)
			],
			value
		);
	return described(
		model,
		sense,
		'M_c,Rd = M_pl/γM0',
		[
			{
				symbol: 'M_pl',
				value: moments[sense].plastic.moment ?? 0,
				unit: 'kNm',
				from: blockFrom(sense)
			}
		],
		value
	);
}

/** W_el,min fy/γM0, or first yield of any fibre over γM0. */
export function elasticMomentWorking(model: EnModel, sense: AxisSense, value: number): Working {
	const { section, strengths, code, moments } = model;
	const { gross } = section;
	const axis = axisOf(sense);
	const sides = axis === 'Y' ? (['Top', 'Bottom'] as const) : (['Left', 'Right'] as const);
	const W = sides.map(
		(side) => (gross as unknown as Record<string, number>)[`elasticModulus${axis}${side}`]!
	);
	const byModulus = (Math.min(...W) * strengths.least * 1e-6) / code.gammaM0;
	if (!strengths.hybrid && Math.abs(byModulus / value - 1) <= same)
		return described(
			model,
			sense,
			`M_c,Rd = min(W_${sides[0].toLowerCase()}, W_${sides[1].toLowerCase()})·fy/γM0·10^-6`,
			[
				...sides.map((side, i) => ({
					symbol: `W_${side.toLowerCase()}`,
					value: W[i]!,
					unit: 'mm³',
					from: workingKey.gross(`elasticModulus${axis}${side}`)
				})),
				strength(strengths.least)
			],
			value
		);
	const first = moments[sense].firstYield ?? 0;
	return described(
		model,
		sense,
		'M_c,Rd = M_el/γM0',
		[
			{
				symbol: 'M_el',
				value: first,
				unit: 'kNm',
				from: yieldFrom(model, sense)
			}
		],
		value
	);
}

const blockFrom = (sense: AxisSense) =>
	sense === 'plusMy' || sense === 'plusMz'
		? workingKey.moment(`plastic${axisOf(sense)}`)
		: 'plastic block turned round';

/** The contract's first yield is that of the positive sense. */
const yieldFrom = ({ moments }: EnModel, sense: AxisSense) => {
	const axis = axisOf(sense);
	const positive = moments[axis === 'Y' ? 'plusMy' : 'plusMz'].firstYield ?? 0;
	const first = moments[sense].firstYield ?? 0;
	return Math.abs(first - positive) <= same * positive
		? workingKey.moment(`firstYield${axis}`)
		: 'first yield of any fibre in this sense';
};

/** Annex B of the 2022 edition: (M_pl − (M_pl − M_el) β_ep)/γM0. */
export function interpolatedMomentWorking(
	model: EnModel,
	sense: AxisSense,
	{ beta, rows }: Interpolation,
	value: number
): Working {
	const { plastic, firstYield } = model.moments[sense];
	const shares = rows.map(shareFormula).join(', ');
	return {
		...described(
			model,
			sense,
			`M_c,Rd = (M_pl − (M_pl − M_el)·min(max(${shares}, 0), 1))/γM0`,
			[
				{ symbol: 'M_pl', value: plastic.moment ?? 0, unit: 'kNm', from: blockFrom(sense) },
				{ symbol: 'M_el', value: firstYield ?? 0, unit: 'kNm', from: yieldFrom(model, sense) },
				...rows.flatMap(({ symbol, slenderness, epsilon }) => [
					{ symbol: `λ_${symbol}`, value: slenderness, unit: '', from: 'slenderness c/t or d/t' },
					{ symbol: `ε_${symbol}`, value: epsilon, unit: '', from: '√(235/fy) of that part' }
				])
			],
			value
		),
		title: `${bendingTitle[sense]}, interpolated (β_ep ${beta.toFixed(3)})`,
		clause: clauseOf(model.code.standard, 'interpolated'),
		notes: ['rule-from-memory']
	};
}

function shareFormula({ symbol, from, span, squared }: Row): string {
	const unit = squared ? `ε_${symbol}²` : `ε_${symbol}`;
	return `(λ_${symbol} − ${from}·${unit})/(${span}·${unit})`;
}
