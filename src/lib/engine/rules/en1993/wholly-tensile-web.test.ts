import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import type { ISection } from '../../section/definition';
import { prepareSection } from '../../section/prepare';
import { analyse } from '../analyse';
import { testModel } from './test-model';
import { pureCases } from './model';

function bent(definition: ISection) {
	const section = prepareSection(definition);
	if (!section.ok) throw new Error('not built');
	const { classification, resistance } = analyse(section.value);
	return { overall: classification!.overall, MyRd: resistance!.MyRd! };
}

/** Bottom 300×30, web 1000×6, top b×30 of fy 275: with b 500 the top balances the rest, 15 000 = 9000 + 6000 mm². */
const girder: ISection = {
	kind: 'i',
	fabrication: 'welded',
	h: 1060,
	b: 500,
	bBottom: 300,
	tw: 6,
	tf: 30,
	tfBottom: 30,
	grade: 275
};

describe('a web wholly in tension in the plastic block', () => {
	it('is class 1 with α 0 by Table 5.2 (rules: a part in tension has no class)', () => {
		for (const b of [499.5, 499.99, 500, 500.01, 502]) {
			expect(bent({ ...girder, b }).overall).toBe(1);
			const { elements } = pureCases(testModel({ ...girder, b })).plusMy;
			expect(elements.find(({ part }) => part === 'web')!.class).toBe(1);
		}
	});

	it('leaves the moment without a step as the top flange widens through 500 mm', () => {
		let last = bent({ ...girder, b: 495 }).MyRd;
		for (let b = 495.25; b <= 505; b += 0.25) {
			const { MyRd } = bent({ ...girder, b });
			expect(MyRd).toBeGreaterThanOrEqual(last * (1 - 1e-12));
			// 0.25·30 mm² at most the whole depth away: 2.2 kNm
			expect(MyRd - last).toBeLessThan(2.2);
			last = MyRd;
		}
		// b 500: the axis lies under the top flange, 15000·15 + 6000·500 + 9000·1015 mm³.
		expect(bent(girder).MyRd).toBeCloseTo((275 * (15000 * 15 + 6000 * 500 + 9000 * 1015)) / 1e6, 6);
	});

	it('is held to its ψ limit once the section must hold its elastic stress: class 3 flange', () => {
		// top flange 460×20 of fy 275, c/t (460 − 6)/40 = 11.35 between 10ε 9.24 and 14ε 12.94
		const thin: ISection = { ...girder, h: 1030, b: 460, tf: 20, bBottom: 60, tfBottom: 10 };
		const classes = [6, 2].map((tw) => {
			const model = testModel({ ...thin, tw });
			const { overall, elements } = pureCases(model).plusMy;
			const web = elements.find(({ part }) => part === 'web')!;
			expect(web.alpha).toBe(0);
			// 62ε(1 − ψ)√−ψ, or 42ε/(0.67 + 0.33ψ)
			const { epsilon } = web;
			const psi = Math.max(web.psi!, -3);
			const limit =
				psi <= -1
					? 62 * epsilon * (1 - psi) * Math.sqrt(-psi)
					: (42 * epsilon) / (0.67 + 0.33 * psi);
			expect(web.limits).toEqual([0, 1, 2].map(() => expect.closeTo(limit, 9)));
			expect(overall).toBe(1000 / tw > limit ? 4 : 3);
			for (const { formula, inputs, result } of Object.values(model.workings.explanation())) {
				const found = formulaValue(formula, inputs);
				expect(found.ok && found.value).toBeCloseTo(result.value, 9);
			}
			return overall;
		});
		expect(classes).toEqual([3, 4]);
	});
});
