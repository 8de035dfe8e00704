import { internalBuckling } from '../../../engine/rules/en1993/effective/buckling-factor';
import { analysed } from './sections';
import type { ExampleWorks } from './worked-example';

const always = { family: 'effective', standard: 'EN 1993-1-5:2006' } as const;

/** Effective sections of class 4. */
export const effectiveWorks: ExampleWorks = {
	EF02: {
		...{ ...always, case: 'Plate girder 1500×10 web, 400×20 flanges, fy 345' },
		ours: (input) => {
			const { resistance } = analysed({
				...{ kind: 'i', fabrication: 'welded', weldLeg: input('weld'), grade: input('fy') },
				...{ h: input('hw') + 2 * input('tf'), b: input('b'), tw: input('tw'), tf: input('tf') }
			});
			return { Mc_Rd_kNm: resistance?.basis === 'effective' ? resistance.MyRd : null };
		},
		remarks: {
			Mc_Rd_kNm: 'One pass, as in the example; with the neutral axis iterated about 1 % less.'
		}
	},
	EF06: {
		...{ ...always, case: 'Internal compression elements' },
		ours: () => {
			const at = [1, 0, -1, -2, -3].map((psi) => [`k(${psi})`, internalBuckling(psi)]);
			return Object.fromEntries(at) as Record<string, number>;
		}
	}
};
