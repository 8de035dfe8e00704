import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import { workingKey } from '../../explain/keys';
import type { SectionDefinition } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { analyse, type Analysis, type AnalyseRequest } from '../analyse';

function explained(definition: SectionDefinition, request: AnalyseRequest) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error(section.error.map(({ message }) => message).join(' '));
	return analyse(section.value, { ...request, explain: true });
}

const sections: Readonly<Record<string, SectionDefinition>> = {
	'rolled I': {
		kind: 'i',
		fabrication: 'rolled',
		h: 300,
		b: 150,
		tw: 7.1,
		tf: 10.7,
		r: 15,
		grade: 'S355'
	},
	'hybrid class 4 girder of unequal flanges': {
		kind: 'i',
		fabrication: 'welded',
		h: 1545,
		b: 500,
		tf: 20,
		bBottom: 350,
		tfBottom: 25,
		tw: 9,
		weldLeg: 6,
		grade: 'S460M',
		partGrades: { web: 'S355' }
	},
	'holed I': {
		kind: 'i',
		fabrication: 'welded',
		h: 300,
		b: 200,
		tw: 10,
		tf: 20,
		grade: 'S355',
		boltHoles: [{ part: 'bottomFlange', diameter: 26, count: 4 }]
	},
	'class 3 I': {
		kind: 'i',
		fabrication: 'welded',
		h: 300,
		b: 460,
		tw: 10,
		tf: 18,
		grade: 235
	},
	box: {
		kind: 'box',
		h: 800,
		b: 700,
		tw: 8,
		tfTop: 12,
		tfBottom: 12,
		webGap: 600,
		grade: 'S355'
	},
	'rectangular tube': {
		kind: 'rectangular-hollow',
		fabrication: 'hot-finished',
		h: 200,
		b: 100,
		t: 8,
		grade: 'S355'
	},
	'round tube': { kind: 'circular-hollow', d: 219.1, t: 5, grade: 'S355' },
	channel: { kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, grade: 'S355' },
	tee: { kind: 'tee', fabrication: 'welded', h: 150, b: 150, tw: 10, tf: 15, grade: 'S355' },
	angle: { kind: 'angle', h: 120, b: 80, t: 10, r: 11, rToe: 5.5, grade: 'S275' },
	flat: { kind: 'flat', b: 100, h: 60, grade: 'S355' },
	round: { kind: 'round', d: 80, grade: 'S355' }
};

const demands = [
	{ name: 'bent', My: 30 },
	{ name: 'turned', My: -30, N: -50 },
	{ name: 'both', My: 20, Mz: 4, N: -60, Vz: 10 },
	{ name: 'pulled', N: 40, Mz: -3 },
	{ name: 'sheared', My: 10, Vz: 250, Vy: 5 },
	{ name: 'all', My: 10, Mz: 1, N: -20, Vz: 300 },
	{ name: 'squashed', N: -80 },
	{ name: 'long', My: 20, unbracedLength: 4000 }
];

const requests: readonly AnalyseRequest[] = [
	{ demands },
	{ demands, code: { standard: 'EN1993-1-1:2022', gammaM0: 1.05 } },
	{ demands, stiffeners: { spacing: 1500, endPost: 'rigid' } },
	{ code: { classAlpha: 'proportional', useStressLevel: true }, demands }
];

const cases = Object.entries(sections).flatMap(([name, definition]) =>
	requests.map((request, i) => ({ name, definition, request, place: i + 1 }))
);

/** Places of figures that are numbers, as the keys of their workings. */
function figureKeys(analysis: Analysis): string[] {
	const { gross, moment, resistance, demands: states } = analysis;
	const numbers = (value: object, path = ''): string[] =>
		Object.entries(value).flatMap(([name, one]: [string, unknown]) =>
			typeof one === 'number'
				? [`${path}${name}`]
				: one && typeof one === 'object' && !Array.isArray(one)
					? numbers(one, `${path}${name}.`)
					: []
		);
	const { MyRd, MyRdNegative, MzRd, NRd, NtRd, VyRd, VzRd } = resistance ?? {};
	const own = { MyRd, MyRdNegative, MzRd, NRd, NtRd, VyRd, VzRd };
	return [
		...numbers(gross).map(workingKey.gross),
		...numbers(moment).map(workingKey.moment),
		workingKey.squashLoad,
		...numbers(own).map(workingKey.resistance),
		...states.flatMap(({ demand, reduced }) =>
			numbers(reduced).map((figure) => workingKey.reduced(demand, figure))
		),
		...states.flatMap(({ demand, firstYield, fullPlastic, countable, countableForce }) =>
			Object.entries({ firstYield, fullPlastic, countable, countableForce })
				.filter(([, value]) => value !== null)
				.map(([figure]) => workingKey.demand(demand, figure))
		),
		...states.flatMap(({ elements, demand, basis }) =>
			basis === 'demand'
				? []
				: elements.map(({ part, type }) => limitsOf(basis, part, type, demand))
		),
		...(resistance?.checks ?? []).map(({ demand, name }) => workingKey.check(demand, name))
	];
}

const pureNames = { '+My': 'plusMy', '−My': 'minusMy', N: 'compression' } as const;

const limitsOf = (
	basis: '+My' | '−My' | 'N' | 'demand',
	part: string,
	type: string,
	demand: string
) =>
	workingKey.limitFigure(basis === 'demand' ? demand : pureNames[basis], part, type, 'slenderness');

describe.each(cases)('$name, request $place', ({ definition, request }) => {
	const analysis = explained(definition, request);
	const workings = Object.entries(analysis.explain ?? {});

	it('has workings whose formulas give their results', () => {
		const wrong = workings.flatMap(([key, { formula, inputs, result }]) => {
			const found = formulaValue(formula, inputs);
			if (!found.ok) return [`${key}: ${found.error}`];
			const scale = Math.max(Math.abs(result.value), smallest(result.unit));
			return Math.abs(found.value - result.value) <= 1e-9 * scale
				? []
				: [`${key}: ${found.value} is not ${result.value}`];
		});
		expect(wrong).toEqual([]);
	});

	it('has a working for every figure', () => {
		const keys = new Set(workings.map(([key]) => key));
		expect(figureKeys(analysis).filter((key) => !keys.has(key))).toEqual([]);
	});

	it('has no figure without end and a resistance', () => {
		expect(analysis.resistance).not.toBeNull();
		expect(JSON.stringify(analysis, strangers)).not.toContain('not finite');
	});
});

/** What is nothing beside a figure of that unit. */
const smallest = (unit: string): number => ({ 'mm⁴': 1e3, 'mm³': 1, mm: 1e-3 })[unit] ?? 1e-6;

const strangers = (_key: string, value: unknown) =>
	typeof value === 'number' && !Number.isFinite(value) ? 'not finite' : value;
