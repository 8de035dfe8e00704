import type { AnalysisFigures } from '../rules/analysis';
import type { DemandState } from '../rules/result';
import { workingKey } from './keys';
import type { Working, Workings } from './working';

type Figures = Pick<AnalysisFigures, 'moment' | 'resistance' | 'code'>;
type Body = Pick<Working, 'title' | 'formula' | 'inputs' | 'result'>;

/** One figure taken from another when both agree to this share. */
const same = 1e-10;

/**
 * Workings of what a demand shows on the ruler of its own moment: what may be counted, first yield,
 * the full block, what lies between, and the use; kNm, or kN where N acts alone.
 */
export function demandWorkings(workings: Workings, figures: Figures, state: DemandState): void {
	const { standard } = figures.code;
	const edition = standard.replace('EN1993', 'EN 1993');
	const add = (figure: string, body: Body | null, clause = 'mechanics') => {
		const ruled = clause === 'mechanics' ? '—' : edition;
		if (body)
			workings.add(workingKey.demand(state.demand, figure), () => ({
				...body,
				clause,
				edition: ruled
			}));
	};
	const clause = governingClause(figures, state);
	add('firstYield', limitBody(figures, state, 'firstYield'));
	add('fullPlastic', limitBody(figures, state, 'fullPlastic'));
	add('countable', countableBody(workings, figures, state), clause);
	add('countableForce', forceBody(figures, state), clause);
	add('beyond', differenceBody(state, 'fullPlastic', 'firstYield'));
	add('left', differenceBody(state, 'fullPlastic', 'countable'));
	add('use', useBody(state), clause);
}

/** Clause of the check that uses most, else that of the bending resistance. */
function governingClause({ resistance, code }: Figures, { demand }: DemandState): string {
	const own = resistance?.checks.filter((check) => check.demand === demand) ?? [];
	const [first, ...rest] = own;
	if (!first) return `${code.standard.replace('EN1993', 'EN 1993')} 6.2`;
	return rest.reduce((a, b) => (b.utilisation > a.utilisation ? b : a), first).clause;
}

const symbols = { firstYield: 'M_el', fullPlastic: 'M_pl' } as const;
const names = {
	firstYield: 'Moment at which a fibre first yields',
	fullPlastic: 'Full plastic moment'
} as const;

/** The section's own limit where N is nothing, else what the strain plane beside N gives. */
function limitBody(
	{ moment }: Figures,
	state: DemandState,
	limit: 'firstYield' | 'fullPlastic'
): Body | null {
	const value = state[limit];
	if (value === null) return null;
	const own = limit === 'firstYield' ? 'firstYield' : 'plastic';
	const axis = (['Y', 'Z'] as const).find((one) => agrees(moment[`${own}${one}`], value));
	const from =
		axis === undefined || state.N !== 0
			? limit === 'firstYield'
				? 'strain plane at which the first fibre yields, N held'
				: 'every part at its yield strength, N held'
			: workingKey.moment(`${own}${axis}`);
	return copied(
		`${names[limit]} along the moment of ${state.demand}`,
		symbols[limit],
		value,
		'kNm',
		from
	);
}

const pure = ['MyRd', 'MyRdNegative', 'MzRd'] as const;
const beside = ['MyVRd', 'MzVRd', 'MyNRd', 'MzNRd', 'MNRd', 'MNVRd', 'MbRd'] as const;

function countableBody(workings: Workings, figures: Figures, state: DemandState): Body | null {
	const { countable: value, demand } = state;
	if (value === null) return null;
	return copied(
		`Moment that may be counted, ${demand}`,
		'M_c,Rd',
		value,
		'kNm',
		countableSource(workings, figures, state)
	);
}

function countableSource(
	workings: Workings,
	{ resistance }: Figures,
	{ countable, demand, reduced, limitedBy }: DemandState
): string {
	if (countable === null || countable === 0) return 'nothing is left beside the other effects';
	const alone = pure.find((figure) => agrees(resistance?.[figure], countable));
	const left = beside.find((figure) => agrees(reduced[figure], countable));
	const keys = [
		...(left === undefined ? [] : [workingKey.reduced(demand, left)]),
		...(alone === undefined ? [] : [workingKey.resistance(alone)])
	];
	const held = 'largest moment in this direction, N and V held, for which every check is met';
	return (
		keys.find((key) => workings.get(key) !== undefined) ??
		(limitedBy === null || limitedBy === 'section'
			? held
			: `${held}; ${limits[limitedBy]} limits it`)
	);
}

const limits = {
	shear: 'shear',
	'web-shear': 'shear buckling of the web',
	'lateral-torsional': 'lateral–torsional buckling',
	'flange-induced-buckling': 'flange-induced buckling'
} as const;

function forceBody({ resistance }: Figures, state: DemandState): Body | null {
	const { countableForce: value, N, demand } = state;
	if (value === null) return null;
	const figure = N < 0 ? 'NRd' : 'NtRd';
	const from = agrees(resistance?.[figure], value)
		? workingKey.resistance(figure)
		: 'resistance to N beside the shear of this demand';
	return copied(`Axial force that may be counted, ${demand}`, 'N_c,Rd', value, 'kN', from);
}

function differenceBody(
	state: DemandState,
	most: 'fullPlastic',
	least: 'firstYield' | 'countable'
): Body | null {
	const [a, b] = [state[most], state[least]];
	if (a === null || b === null) return null;
	const symbol = least === 'firstYield' ? 'M_el' : 'M_c,Rd';
	return {
		title: least === 'firstYield' ? 'Moment beyond first yield' : 'Moment not to be counted',
		formula: `ΔM = M_pl − ${symbol}`,
		inputs: [
			{ symbol: 'M_pl', value: a, unit: 'kNm', from: workingKey.demand(state.demand, most) },
			{ symbol, value: b, unit: 'kNm', from: workingKey.demand(state.demand, least) }
		],
		result: { value: a - b, unit: 'kNm' }
	};
}

/** Share of what may be counted along the demand's own moment or force. */
function useBody(state: DemandState): Body | null {
	const alone = state.countableForce !== null;
	const [demand, count] = alone
		? [Math.abs(state.N), state.countableForce]
		: [state.moment, state.countable];
	if (!count) return null;
	const [symbol, unit] = alone ? ['N', 'kN'] : ['M', 'kNm'];
	const from = workingKey.demand(state.demand, alone ? 'countableForce' : 'countable');
	return {
		title: `Share of what may be counted, ${state.demand}`,
		formula: `U = ${symbol}_Ed/${symbol}_c,Rd`,
		inputs: [
			{ symbol: `${symbol}_Ed`, value: demand, unit, from: 'demand' },
			{ symbol: `${symbol}_c,Rd`, value: count, unit, from }
		],
		result: { value: demand / count, unit: '' }
	};
}

const copied = (
	title: string,
	symbol: string,
	value: number,
	unit: string,
	from: string
): Body => ({
	title,
	formula: `${symbol} = ${symbol}'`,
	inputs: [{ symbol: `${symbol}'`, value, unit, from }],
	result: { value, unit }
});

const agrees = (a: number | null | undefined, b: number): boolean =>
	a !== null && a !== undefined && Math.abs(a - b) <= same * Math.abs(b);
