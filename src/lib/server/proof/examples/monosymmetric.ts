import { fullPlastic } from '../../../engine/response/plastic';
import { built, inch, kipFoot, ksi } from './sections';
import type { ExampleWorks } from './worked-example';

const always = { family: 'bending', standard: 'Mechanics: elastic, perfectly plastic' } as const;

/** Sections whose plastic neutral axis lies off the centroid. */
export const monosymmetricWorks: ExampleWorks = {
	MS02: {
		...{ ...always, case: 'I with top flange 100×20, web 20×80, bottom flange 60×20, fy 240' },
		ours: (input) => {
			const h = 120;
			const section = built({
				...{ kind: 'i', fabrication: 'welded', grade: input('fy') },
				...{ h, b: 100, tf: 20, tw: 20, bBottom: 60, tfBottom: 20 }
			});
			const { plasticY, plasticNeutralAxisZ } = fullPlastic(section);
			return {
				A_mm2: section.gross.area,
				pna_below_top: plasticNeutralAxisZ === null ? null : h - plasticNeutralAxisZ,
				Mp_kNm: plasticY
			};
		}
	},
	MS03: {
		...{ ...always, case: 'Tee, flange 8×1½ in, stem 2×6 in, fy 50 ksi' },
		ours: (input) => {
			const h = (input('hs') + input('tf')) * inch;
			const fy = input('fy_ksi') * ksi;
			const section = built({
				...{ kind: 'tee', fabrication: 'welded', grade: fy, h },
				...{ b: input('bf') * inch, tf: input('tf') * inch, tw: input('tw') * inch }
			});
			const { gross } = section;
			return {
				ybar_from_top: (h - gross.centroid.z) / inch,
				I_in4: gross.secondMomentY / inch ** 4,
				S_in3: gross.elasticModulusYBottom / inch ** 3,
				My_kipft: (gross.elasticModulusYBottom * fy) / 1e6 / kipFoot,
				Z_in3: gross.plasticModulusY / inch ** 3,
				Mp_kipft: fullPlastic(section).plasticY / kipFoot,
				shape_factor: gross.plasticModulusY / gross.elasticModulusYBottom
			};
		}
	}
};
