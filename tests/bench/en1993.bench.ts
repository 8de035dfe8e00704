/**
 * EN 1993 as a whole: one analysis of sections that ask the most of it, each against the plain analysis
 * of a rolled I in the same run; the search for what unlocks more, against its number of analyses.
 */
import { analyse, type AnalyseRequest } from '../../src/lib/engine/rules/analyse';
import type { Demand, Stiffeners } from '../../src/lib/engine/rules/result';
import type { SectionDefinition } from '../../src/lib/engine/section/definition';
import { unlocked } from '../../src/lib/engine/unlock/unlock';
import { catalogueShapes } from '../../src/lib/server/catalogues/shapes';
import { angle, hybridGirder, ipe300, prepared } from './sections';
import { ms, printTable, timed } from './table';

const stiffeners: Stiffeners = { spacing: 1500, endPost: 'rigid' };
const girderDemand: Demand = { name: 'A', N: -300, My: 2000, Mz: 60, Vz: 600 };

interface Case {
	readonly what: string;
	readonly definition: SectionDefinition;
	readonly request: AnalyseRequest;
	readonly aim?: string;
}

const girder = { definition: hybridGirder, request: { demands: [girderDemand], stiffeners } };
const explained = { ...girder.request, explain: true };
const cases: Case[] = [
	{ what: 'IPE 300, no demand (baseline)', definition: ipe300, request: {} },
	{
		...girder,
		what: 'hybrid girder, class 4, N My Mz Vz',
		request: explained,
		aim: '< 1 ms'
	},
	{ ...girder, what: 'the same without workings' },
	{
		what: 'IPE 300, My Mz',
		definition: ipe300,
		request: { demands: [{ name: 'A', My: 60, Mz: 12 }] }
	},
	{
		what: 'IPE 300, N My Mz',
		definition: ipe300,
		request: { demands: [{ name: 'A', N: -300, My: 60, Mz: 12 }] }
	},
	{
		what: 'angle 120 × 80 × 10, N',
		definition: angle,
		request: { demands: [{ name: 'A', N: -100 }] }
	},
	{
		what: 'angle 120 × 80 × 10, N My',
		definition: angle,
		request: { demands: [{ name: 'A', N: -100, My: 5 }] }
	}
];

const runs = cases.map(({ definition, request, ...rest }) => {
	const section = prepared(definition);
	return { ...rest, time: timed(() => analyse(section, request), { batch: 20, rounds: 80 }) };
});
const plain = runs[0]!.time.median;
printTable(
	'EN 1993, one analysis of a prepared section',
	['section and demand', 'median', '95th', 'of the baseline', 'aim'],
	runs.map(({ what, time, aim = '' }) => [
		what,
		ms(time.median),
		ms(time.p95),
		`${(time.median / plain).toFixed(1)}×`,
		aim
	])
);

const stock = {
	thicknesses: [6, 8, 10, 12, 15, 18, 20, 22, 25, 30, 35, 40, 50, 60],
	widthStep: 10,
	depthStep: 10,
	stiffenerStep: 100
};
const welded = { kind: 'i', fabrication: 'welded', weldLeg: 6, grade: 'S355' } as const;
const searches = [
	{
		what: 'class 3 girder, demand met',
		definition: { ...welded, h: 900, b: 300, tw: 12, tf: 20 },
		demands: [{ name: 'A', My: 500 }]
	},
	{
		what: 'class 4 girder, demand met with two changes at least',
		definition: { ...welded, h: 1240, b: 300, tw: 7, tf: 15 },
		demands: [{ name: 'A', My: 6000, Vz: 1500 }]
	}
] satisfies { what: string; definition: SectionDefinition; demands: Demand[] }[];

printTable(
	'What unlocks more, the whole search',
	['section', 'median', 'options', 'one analysis, prepared', 'as many analyses', 'aim'],
	searches.map(({ what, definition, demands }) => {
		const request = {
			girder: { definition, stiffeners: null },
			...{ stock, demands, code: {}, strengthBasis: 'product-standard' as const }
		};
		const options = unlocked(request)?.options.length ?? 0;
		const { median } = timed(() => unlocked(request), { rounds: 12 });
		const single = timed(() => analyse(prepared(definition), { demands }), { batch: 20 }).median;
		return [
			...[what, ms(median), String(options), ms(single)],
			...[(median / single).toFixed(0), '< 50 ms']
		];
	})
);

const definitions = catalogueShapes().flatMap(({ shapes }) =>
	shapes.map((shape) => shape.definition)
);
const demands = [{ name: 'A', N: -50, My: 20, Vz: 20 }];
const start = performance.now();
for (const definition of definitions) analyse(prepared(definition), { demands });
const spent = performance.now() - start;
printTable(
	'All catalogue shapes, prepared and analysed under N, My and Vz',
	['shapes', 'time', 'each', 'of the baseline'],
	[
		[
			...[String(definitions.length), ms(spent), ms(spent / definitions.length)],
			`${(spent / definitions.length / plain).toFixed(1)}×`
		]
	]
);
