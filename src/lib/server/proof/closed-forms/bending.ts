import { firstYieldMoment } from '../../../engine/response/first-yield';
import { fullPlastic, plasticMoment } from '../../../engine/response/plastic';
import { bending } from '../../../engine/response/respond';
import { bent, built } from '../examples/sections';
import { rounding, type ClosedForm } from './closed-form';

const [fy, b, h] = [250, 40, 120];
const bar = () => built({ kind: 'flat', b, h, grade: fy });
const yieldMoment = (fy * b * h ** 2) / 6e6;
const path = { axisAngle: 0, transverse: 'moment-zero' } as const;
const on = { topic: 'Rectangle bent beyond first yield', unit: '' } as const;
const exact = { tolerance: 1e-12, why: rounding } as const;
const finer = { tolerance: 1e-13, why: rounding } as const;

/** Share of a moment, null as it is. */
const over = (value: number | null, unit: number) => (value === null ? null : value / unit);

const firstYield: ClosedForm = {
	...{ ...on, id: 'bending/first-yield', case: 'Bar 40×120, fy 250', unit: 'kNm' },
	...{ quantity: 'first-yield moment', formula: 'b·h²/6·fy', value: yieldMoment },
	ours: () => bent(bar()).firstYield.moment,
	...finer
};

const beyond = [1.0001, 1.2, 2, 3.7, 10, 1000].flatMap((ratio): ClosedForm[] => {
	const state = () => {
		const bend = bent(bar());
		return bend.atCurvature(ratio * (bend.firstYield.curvature ?? 0));
	};
	const at = `Bar 40×120 at κ/κy = ${ratio}`;
	return [
		{
			...{ ...on, id: `bending/moment-at-${ratio}`, case: at, quantity: 'M/My' },
			...{ formula: '1.5 − 0.5(κy/κ)²', value: 1.5 - 0.5 / ratio ** 2 },
			ours: () => over(state().moment, yieldMoment),
			...finer
		},
		{
			...{
				...on,
				id: `bending/yielded-at-${ratio}`,
				case: at,
				quantity: 'elastic share of the area'
			},
			...{ formula: 'κy/κ', value: 1 / ratio },
			ours: () => {
				const { yieldedShare } = state();
				return yieldedShare === null ? null : 1 - yieldedShare;
			},
			tolerance: 5e-13 * ratio,
			why: rounding
		}
	];
});

const found = [0.3, 1, 1.3, 1.49, 1.49999].map((share): ClosedForm => ({
	...{ ...on, id: `bending/curvature-at-${share}`, case: `Bar 40×120 at M/My = ${share}` },
	...{ quantity: 'κ/κy', formula: '1/√(3 − 2M/My) beyond first yield' },
	value: share <= 1 ? share : 1 / Math.sqrt(3 - 2 * share),
	ours: () => bent(bar()).atMoment(share * yieldMoment).curvatureRatio,
	...{ tolerance: 1e-9, why: 'found by iteration; the curve is flat near full plastic' }
}));

const underN = [-0.9, -0.5, 0, 0.3, 0.99].map((n): ClosedForm => ({
	...{ id: `bending/plastic-under-${n}`, topic: 'N and M', case: `Bar 40×120 at n = ${n}` },
	...{ quantity: 'M/Mpl', formula: '1 − n²', value: 1 - n * n },
	ours: () => {
		const N = (n * fy * b * h) / 1e3;
		return over(plasticMoment(bar(), { ...path, N }).moment, 1.5 * yieldMoment);
	},
	...exact
}));

const bothFaces: ClosedForm = {
	...{ id: 'bending/under-n', topic: 'N and M', case: 'Bar 40×120 at n = 0.25, κ = 4κy' },
	...{ quantity: 'M/Mpl', formula: '1 − n² − ⅓(κy/κ)², both faces yielded' },
	value: 1 - 0.25 ** 2 - 1 / 48,
	ours: () => {
		const section = bar();
		const curvature = 4 * (bent(section).firstYield.curvature ?? 0);
		const bend = bending(section, { ...path, N: (0.25 * fy * b * h) / 1e3 });
		return over(bend.atCurvature(curvature).moment, 1.5 * yieldMoment);
	},
	...exact
};

const skinned = () =>
	built({
		kind: 'plates',
		grade: 200,
		plates: [
			{ name: 'core', width: 100, thickness: 40, y: 0, z: 0, angle: 90 },
			{ name: 'top', width: 40, thickness: 10, y: 0, z: 55, angle: 0, grade: 460 },
			{ name: 'bottom', width: 40, thickness: 10, y: 0, z: -55, angle: 0, grade: 460 }
		]
	});
const hybrid = {
	topic: 'Hybrid sections',
	case: 'Core 40×100, fy 200, between skins 40×10, fy 460',
	unit: 'kNm'
} as const;

const hybrids: readonly ClosedForm[] = [
	{
		...{ ...hybrid, id: 'bending/hybrid-first-yield', quantity: 'first-yield moment' },
		formula: 'fy,core·I/50, the core’s edge yields first',
		value: (200 * ((40 * 120 ** 3) / 12)) / 50 / 1e6,
		ours: () => firstYieldMoment(skinned(), 0),
		...exact
	},
	{
		...{ ...hybrid, id: 'bending/hybrid-plastic', quantity: 'full plastic moment' },
		formula: 'fy,core·b·h²/4 + 2·fy,skin·A·55',
		value: ((200 * 40 * 100 ** 2) / 4 + 2 * 460 * 400 * 55) / 1e6,
		ours: () => fullPlastic(skinned()).plasticY,
		...finer
	}
];

/** Moments of rectangles, plain and hybrid, with and without N (any text on plastic bending). */
export const bendingForms: readonly ClosedForm[] = [
	firstYield,
	...beyond,
	...found,
	...underN,
	bothFaces,
	...hybrids
];
