import { fullPlastic } from '../../../engine/response/plastic';
import { historyOf, type History } from '../../../engine/response/history/history';
import { bendingFrom } from '../../../engine/response/history/history-bending';
import { historyPicture } from '../../../engine/response/history/history-picture';
import { stressPicture } from '../../../engine/response/yield-fronts';
import type { PreparedSection } from '../../../engine/section/prepared';
import { bent, built, inch, kipInch, ksi } from './sections';
import type { ExampleWorks, Input } from './worked-example';

const always = { family: 'bending', standard: 'Mechanics: elastic, perfectly plastic' } as const;
const straight = { axisAngle: 0, transverse: 'moment-zero', N: 0 } as const;

const bar = (input: Input): PreparedSection =>
	built({
		kind: 'flat',
		b: input('b'),
		h: input('h'),
		grade: { fy: input('fy'), E: input('E') }
	});

function unstressed(section: PreparedSection): History {
	const history = historyOf(section);
	if (history.ok) return history.value;
	throw new Error(history.error.message);
}

/** Bars and beams bent beyond first yield, and released. */
export const textbookWorks: ExampleWorks = {
	PT01: {
		...{ ...always, case: 'Bar 50×120, fy 240, E 200 000, M = 36.8 kNm' },
		ours: (input) => {
			const section = bar(input);
			const bend = bent(section);
			const { e0, ky, kz, curvature } = bend.atMoment(input('M_kNm'));
			if (e0 === null || ky === null || kz === null || curvature === null) return {};
			const { fronts } = stressPicture(section, { e0, ky, kz });
			const [first, second] = fronts;
			const core = first && second ? Math.abs(first.distance - second.distance) : null;
			return { My_kNm: bend.firstYield.moment, core_mm: core, radius_m: 1 / curvature };
		}
	},
	PT02: {
		...{ ...always, case: 'The bar of 50×120 bent to 36.8 kNm and released' },
		ours: (input) => {
			const section = bar(input);
			const moment = input('M_kNm');
			const loaded = bendingFrom(unstressed(section), straight).after({ moment });
			const released = loaded && bendingFrom(loaded, straight).after({ moment: 0 });
			if (!released) return {};
			const points = historyPicture(released).lines[0]?.points ?? [];
			const edge = points.find(({ distance }) => Math.abs(distance - 40) < 0.05);
			const { curvature } = bendingFrom(released, straight).atMoment(0);
			return {
				elastic_stress: (moment * 1e6) / section.gross.elasticModulusYTop,
				residual_top: points.at(-1)?.stress ?? null,
				residual_core_edge: edge ? -edge.stress : null,
				radius_m: curvature === null ? null : 1 / curvature
			};
		},
		remarks: {
			residual_top: 'Left in tension where it was compressed.',
			residual_core_edge: 'In compression on the side that was compressed.'
		}
	},
	PT03: {
		...{ ...always, case: 'Built-up I 12×16 in, flanges 1 in, web 3/4 in, fy 50 ksi' },
		ours: (input) => {
			const section = built({
				...{ kind: 'i', fabrication: 'welded', grade: input('fy_ksi') * ksi },
				...{ h: input('h') * inch, b: input('b') * inch },
				...{ tw: input('tw') * inch, tf: input('tf') * inch }
			});
			const bend = bent(section);
			// the fronts reach the inner faces of the flanges, 7 of 8 in from the middle
			const half = input('h') / 2;
			const deeper = half / (half - input('tf'));
			const { moment: first, curvature } = bend.firstYield;
			const plastic = curvature === null ? null : bend.atCurvature(curvature * deeper).moment;
			return {
				I_in4: section.gross.secondMomentY / inch ** 4,
				My_kipin: first === null ? null : first / kipInch,
				M_flanges_plastic: plastic === null ? null : plastic / kipInch
			};
		}
	},
	PT04: {
		...{ ...always, case: 'Rectangle' },
		ours: () => {
			const { gross } = built({ kind: 'flat', b: 40, h: 100, grade: 235 });
			return { shape_factor: gross.plasticModulusY / gross.elasticModulusYTop };
		}
	},
	PT07: {
		...{ ...always, case: 'Square bent about a diagonal' },
		ours: () => {
			const square = { name: 'bar', width: 50, thickness: 50, y: 0, z: 0, angle: 45 };
			const { gross } = built({ kind: 'plates', grade: 235, plates: [square] });
			return { shape_factor: gross.plasticModulusY / gross.elasticModulusYTop };
		}
	},
	PT10: {
		...{ ...always, case: 'Wide flange, flanges 8×1/2 in, web 9×1/2 in, fy 36 ksi' },
		ours: (input) => {
			const section = built({
				...{ kind: 'i', fabrication: 'welded', grade: input('fy_ksi') * ksi },
				...{ h: (input('hw') + 2 * input('tf')) * inch, b: input('b') * inch },
				...{ tw: input('tw') * inch, tf: input('tf') * inch }
			});
			const { firstYield, plasticMoment } = bent(section);
			const [first, plastic] = [firstYield.moment, plasticMoment];
			return {
				I_in4: section.gross.secondMomentY / inch ** 4,
				My_kipin: first === null ? null : first / kipInch,
				Mp_kipin: plastic === null ? null : plastic / kipInch,
				shape_factor: first === null || plastic === null ? null : plastic / first
			};
		}
	},
	MS01: {
		...{ ...always, case: 'Tee, flange 100×15, stem 15×120, fy 250' },
		ours: (input) => {
			const { plasticY, plasticNeutralAxisZ } = fullPlastic(
				built({
					...{ kind: 'tee', fabrication: 'welded', grade: input('fy') },
					...{ h: input('hs') + input('tf'), b: input('bf'), tf: input('tf'), tw: input('tw') }
				})
			);
			return { pna_from_bottom: plasticNeutralAxisZ, Mp_kNm: plasticY };
		}
	}
};
