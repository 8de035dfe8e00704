import { analysed, hotFinished, rolledI } from './sections';
import type { ExampleWorks, Input } from './worked-example';

const always = { family: 'interaction', standard: 'EN 1993-1-1:2005' } as const;
const rounded =
	'The example puts a rounded area or modulus in; our figure is brought to it in proportion.';

const sizes: Readonly<Record<string, number>> = {
	...{ h: 352.5, b: 318.4, tw: 23, tf: 37.7, r: 15.2 }
};
/** 305×305×240 UC; the examples give only some of its sizes. */
const column = (input: Input) => rolledI((name) => sizes[name] ?? input(name));
const withN = (input: Input, moments: { My?: number; Mz?: number }) =>
	analysed(column(input), { demands: [{ name: 'A', N: -input('NEd_kN'), ...moments }] });

/** A value times printed over own, null as it is. */
const scaled = (value: number | null | undefined, printed: number, own: number) =>
	value === null || value === undefined ? null : (value * printed) / own;

/** N, and moments beside it. */
export const axialWorks: ExampleWorks = {
	NM02: {
		...{ ...always, case: '305×305×240 UC, S275, N = 3440 kN, about y–y' },
		ours: (input) => {
			const { gross, resistance } = withN(input, { My: 1 });
			const compressed = withN(input, {}).resistance?.checks[0];
			return {
				Npl_Rd_kN: scaled(resistance?.NRd, input('A'), gross.area),
				n: compressed?.utilisation ?? null,
				MNy_Rd_kNm: scaled(resistance?.MyNRd, input('Wply_cm3'), gross.plasticModulusY * 1e-3)
			};
		},
		leftOut: { a: 'The share of the web stands inside MN,y,Rd and is not reported.' },
		remarks: { Npl_Rd_kN: rounded, MNy_Rd_kNm: rounded }
	},
	NM03: {
		...{ ...always, case: '305×305×240 UC, S275, N = 3440 kN, about z–z' },
		ours: (input) => {
			const { gross, resistance } = withN(input, { Mz: 1 });
			const own = gross.plasticModulusZ * 1e-3;
			return {
				Mpl_z_kNm: scaled(resistance?.MzRd, input('Wplz_cm3'), own),
				MNz_Rd_kNm: scaled(resistance?.MzNRd, input('Wplz_cm3'), own)
			};
		},
		remarks: { Mpl_z_kNm: rounded, MNz_Rd_kNm: rounded }
	},
	NM04: {
		...{ ...always, case: 'RHS 200×100×16, S355, N = 90 kN' },
		ours: (input) => {
			const tube = hotFinished(input('h'), input('b'), input('t'), input('fy'));
			const demands = [{ name: 'A', N: -input('NEd_kN'), My: 1 }];
			const { gross, resistance } = analysed(tube, { demands });
			return {
				Npl_Rd_kN: scaled(resistance?.NRd, input('A'), gross.area),
				MNy_Rd_kNm: resistance?.MyNRd ?? null
			};
		},
		remarks: { Npl_Rd_kN: rounded }
	},
	BI01: {
		...{ ...always, case: '305×305×240 UC, S275, N = 3440 kN, My = 420, Mz = 110 kNm' },
		ours: (input) => {
			const fy = 275;
			const demands = [
				{ name: 'A', N: -input('NEd_kN'), My: input('MyEd_kNm'), Mz: input('MzEd_kNm') }
			];
			const definition = rolledI((name) => sizes[name] ?? input(name), fy);
			const { demands: states, resistance } = analysed(definition, { demands });
			const check = resistance?.checks.find(({ clause }) => clause.endsWith('6.2.9.1(6)'));
			const { alpha = null, beta = null } = states[0]?.reduced ?? {};
			return { alpha, beta, utilisation: check?.value ?? null };
		}
	}
};
