import { workingKey } from '$lib/engine/explain/keys';
import type { Explanation, Working } from '$lib/engine/explain/working';
import { bending } from '$lib/engine/response/respond';
import type { Bench } from '../bench.svelte';

/** Key of a limit on the curve: first yield and full plastic about the axis of bending, N held. */
export const bendKey = (figure: BendFigure, sense: 1 | -1 = 1): string =>
	`bend.${figure}${sense < 0 ? '.reversed' : ''}`;

/** Two ways to one figure agree to this share. */
const same = 1e-10;

export type BendFigure = 'firstYield' | 'plastic';

const sources: Readonly<Record<BendFigure, readonly [string, string, string]>> = {
	firstYield: [
		'First yield about the axis of bending',
		'M_el',
		'strain plane at which the first fibre yields, N held'
	],
	plastic: [
		'Full plastic moment about the axis of bending',
		'M_pl',
		'every part at its yield strength on its side of the neutral axis, N held'
	]
};

/** The ruler's own limits where no rule reaches the section. */
export function rulerWorkings(bench: Bench): Explanation {
	const { quantity, firstYield, plastic } = bench.ruler;
	if (bench.activeState || quantity === 'force') return {};
	const figures = { firstYield, plastic };
	const limits = (['firstYield', 'plastic'] as const).flatMap((figure) => {
		const value = figures[figure];
		return value === null ? [] : [[`ruler.${figure}`, working(bench, figure, value)] as const];
	});
	return Object.fromEntries([...limits, ['ruler.demand', demandWorking(bench.activeDemand)]]);
}

/** Size of the moment that a case asks for. */
function demandWorking({ name, My = 0, Mz = 0 }: Bench['activeDemand']): Working {
	const moment = (symbol: string, value: number) => ({ symbol, value, unit: 'kNm', from: name });
	return {
		title: 'Moment of the demand',
		clause: 'mechanics',
		edition: '—',
		formula: 'M_Ed = √(M_y² + M_z²)',
		inputs: [moment('M_y', My), moment('M_z', Mz)],
		result: { value: Math.sqrt(My ** 2 + Mz ** 2), unit: 'kNm' }
	};
}

/** One-line workings of the limits on the curve, which the strain plane gives and no formula. */
export function bendWorkings(bench: Bench): Explanation {
	const { path } = bench.bend.bender;
	const found = ([1, -1] as const).flatMap((sense) => {
		const axisAngle = path.axisAngle + (sense < 0 ? 180 : 0);
		const { firstYield, plasticMoment } = bending(
			bench.section,
			{ ...path, axisAngle },
			bench.bend.start
		);
		const figures = { firstYield: firstYield.moment, plastic: plasticMoment };
		return (['firstYield', 'plastic'] as const).flatMap((figure) => {
			const value = figures[figure];
			return value === null
				? []
				: [[bendKey(figure, sense), working(bench, figure, value)] as const];
		});
	});
	return Object.fromEntries(found);
}

function working({ analysis: { moment } }: Bench, figure: BendFigure, value: number): Working {
	const [title, symbol, words] = sources[figure];
	const axis = (['Y', 'Z'] as const).find((one) => {
		const own = moment[`${figure}${one}`];
		return own !== null && Math.abs(own - value) <= same * value;
	});
	const from = axis === undefined ? words : workingKey.moment(`${figure}${axis}`);
	return {
		title,
		clause: 'mechanics',
		edition: '—',
		formula: `${symbol} = ${symbol}'`,
		inputs: [{ symbol: `${symbol}'`, value, unit: 'kNm', from }],
		result: { value, unit: 'kNm' }
	};
}
