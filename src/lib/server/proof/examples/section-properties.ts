import type { GrossProperties } from '../../../engine/section/prepared';
import { analysed, built, hotFinished, rolledI, step } from './sections';
import type { ExampleWorks } from './worked-example';

const family = 'section-properties';

const aboutOneAxis = (gross: GrossProperties) => ({
	A: gross.area / 1e2,
	I: gross.secondMomentY / 1e4,
	Wel: gross.elasticModulusYTop / 1e3,
	Wpl: gross.plasticModulusY / 1e3
});

/** Gross properties printed outside the tables. */
export const sectionPropertyWorks: ExampleWorks = {
	SP02: {
		...{ family, standard: 'EN 10365:2017; Av: EN 1993-1-1:2005', case: 'IPE 500' },
		ours: (input) => {
			const analysis = analysed(rolledI(input, 355), { explain: true });
			const { gross } = analysis;
			const shearArea = step(analysis, 'shear.z.area');
			return {
				A: gross.area / 1e2,
				Iy: gross.secondMomentY / 1e4,
				Wel_y: gross.elasticModulusYTop / 1e3,
				Wpl_y: gross.plasticModulusY / 1e3,
				Avz: shearArea === null ? null : shearArea / 1e2
			};
		}
	},
	SP05: {
		...{ family, standard: 'EN 10210-2:2006', case: 'SHS 200×200×10, hot finished' },
		ours: (input) => aboutOneAxis(built(hotFinished(input('h'), input('b'), input('t'), 235)).gross)
	},
	SP06: {
		...{ family, standard: 'EN 10210-2:2006', case: 'RHS 200×100×16, hot finished' },
		ours: (input) => aboutOneAxis(built(hotFinished(input('h'), input('b'), input('t'), 235)).gross)
	},
	SP07: {
		...{ family, standard: 'EN 10210-2:2006', case: 'CHS 219.1×10' },
		ours: (input) => {
			const tube = { kind: 'circular-hollow', d: input('d'), t: input('t'), grade: 235 } as const;
			return aboutOneAxis(built(tube).gross);
		}
	}
};
