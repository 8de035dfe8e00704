import type { Analysis } from '../../../engine/rules/analyse';
import { analysed, hotFinished, plate, rolledI } from './sections';
import type { ExampleWorks, Ours } from './worked-example';

const compression = { demands: [{ name: 'N', N: -1 }] };
const standard = 'EN 1993-1-1:2005';
const always = { family: 'classification', standard } as const;

const plates = (analysis: Analysis): Ours => ({
	cf_tf: plate(analysis, 'topFlange')?.slenderness ?? null,
	cw_tw: plate(analysis, 'web')?.slenderness ?? null,
	flange_class: plate(analysis, 'topFlange')?.class ?? null,
	web_class: plate(analysis, 'web')?.class ?? null,
	section_class: analysis.classification?.overall ?? null
});

/** Classes by Table 5.2. */
export const classificationWorks: ExampleWorks = {
	CL02: {
		...{ ...always, case: '254×254×73 UC, S355, in compression' },
		ours: (input) => {
			const analysis = analysed(rolledI(input), compression);
			return { ...plates(analysis), Nc_Rd_kN: analysis.resistance?.NRd ?? null };
		}
	},
	CL03: {
		...{ ...always, case: 'Welded I 600×200, tw 6, tf 20, S275, in bending' },
		ours: (input) => {
			const sizes = { h: input('h'), b: input('b'), tw: input('tw'), tf: input('tf') };
			const welds = { fabrication: 'welded', weldLeg: input('weld') } as const;
			const analysis = analysed({ kind: 'i', ...welds, ...sizes, grade: input('fy') });
			return {
				...plates(analysis),
				'class2_after_6.2.2.4': analysis.resistance?.basis === 'effective-class-2',
				Wel_y_mm3: analysis.gross.elasticModulusYTop
			};
		}
	},
	CL06: {
		...{ ...always, case: 'RHS 200×100×16, S355, in compression' },
		ours: (input) => {
			const tube = hotFinished(input('h'), input('b'), input('t'), input('fy'));
			const analysis = analysed(tube, compression);
			return {
				c_t_flange: plate(analysis, 'topFlange')?.slenderness ?? null,
				c_t_web: plate(analysis, 'leftWeb')?.slenderness ?? null,
				section_class_pure_compression: analysis.classification?.overall ?? null
			};
		}
	},
	CL08: {
		...{ ...always, case: '305×305×240 UC, S275, in compression' },
		ours: (input) => plates(analysed(rolledI(input), compression))
	},
	CL09: {
		...{ ...always, case: '406×178×74 UB, S275, in bending' },
		ours: (input) => plates(analysed(rolledI(input)))
	},
	CL14: {
		...{ ...always, case: 'IPE 400, S235, in compression' },
		ours: (input) => plates(analysed(rolledI(input), compression))
	},
	CL18: {
		...{ ...always, case: 'HE 260 A, S355, in bending' },
		ours: (input) => plates(analysed(rolledI(input)))
	},
	CL19: {
		...{ ...always, case: 'HE 240 A, S355, in bending' },
		ours: (input) => plates(analysed(rolledI(input)))
	}
};
