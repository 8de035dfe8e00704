import type { AnalyseRequest } from '../../../engine/rules/analyse';
import { analysed, hotFinished, rolledI, step } from './sections';
import type { ExampleWorks, Input } from './worked-example';

const buckling = { family: 'shear', standard: 'EN 1993-1-5:2006' } as const;
const plain = { family: 'shear', standard: 'EN 1993-1-1:2005' } as const;

/** Figures of the web of a girder whose flanges, 400×20, take no part in Vbw,Rd. */
function web(input: Input, request: AnalyseRequest) {
	const tf = 20;
	const analysis = analysed(
		{
			...{ kind: 'i', fabrication: 'welded', grade: input('fyw') },
			...{ h: input('hw') + 2 * tf, b: 400, tw: input('tw'), tf }
		},
		{ ...request, explain: true }
	);
	const figure = (name: string) => step(analysis, `shear.z.web.${name}`);
	const Vbw = figure('Vbw');
	return {
		lam_w: figure('lambda'),
		chi_w: figure('chi'),
		k_tau: figure('kTau'),
		Vbw_Rd_kN: Vbw,
		Vbw_Rd_MN: Vbw === null ? null : Vbw / 1000
	};
}

const flanges = 'Flanges are not taken into account, as in the example.';

/** Shear resistance, plastic and of buckling webs. */
export const shearWorks: ExampleWorks = {
	SH01: {
		...{ ...buckling, case: 'Web 1500×10, fy 355, no stiffeners between supports' },
		ours: (input) => web(input, {}),
		remarks: { Vbw_Rd_kN: flanges }
	},
	SH02: {
		...{ ...buckling, case: 'Web 1500×10, fy 355, stiffeners at 1500 mm' },
		ours: (input) => web(input, { stiffeners: { spacing: input('a'), endPost: 'non-rigid' } }),
		remarks: { Vbw_Rd_kN: flanges }
	},
	SH03: {
		...{ ...buckling, case: 'Web 2720×18, fy 345, stiffeners at 8 m, rigid end post' },
		ours: (input) =>
			web(input, {
				stiffeners: { spacing: input('a'), endPost: 'rigid' },
				code: { gammaM1: input('gammaM1') }
			}),
		leftOut: { sigma_E: 'The Euler stress of the web stands inside λw and is not reported.' },
		remarks: { Vbw_Rd_MN: flanges }
	},
	SH13: {
		...{ ...plain, case: 'RHS 200×100×16, S355, along the depth' },
		ours: (input) => {
			const tube = hotFinished(input('h'), input('b'), 16, input('fy'));
			return { Vpl_Rd_kN: analysed(tube).resistance?.VzRd ?? null };
		}
	},
	MV01: {
		...{ ...plain, family: 'interaction', case: '406×178×74 UB, S275, V = 525 kN' },
		ours: (input) => {
			const demands = [{ name: 'A', Vz: input('VEd_kN'), My: 100 }];
			const code = { eta: input('eta') };
			const analysis = analysed(rolledI(input), { code, demands, explain: true });
			const { VzRd = null, MyRd = null, MyVRd = null } = analysis.resistance ?? {};
			return {
				...{ Vpl_Rd_kN: VzRd, Mc_Rd_kNm: MyRd, MyV_Rd_kNm: MyVRd },
				rho: step(analysis, 'reduced.A.MyVRd.rho')
			};
		}
	}
};
