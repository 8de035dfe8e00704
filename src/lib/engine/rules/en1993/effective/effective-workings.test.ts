import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../../explain/formula';
import { workingKey } from '../../../explain/keys';
import type { SectionDefinition } from '../../../section/definition';
import { testModel } from '../test-model';
import { effectiveAxial } from './effective-axial';
import { effectiveMoment } from './effective-moment';

const sections: readonly SectionDefinition[] = [
	{ kind: 'i', fabrication: 'welded', h: 1540, b: 600, tf: 12, tw: 8, weldLeg: 6, grade: 'S355' },
	{
		kind: 'i',
		fabrication: 'welded',
		h: 1200,
		b: 250,
		tf: 10,
		bBottom: 600,
		tfBottom: 40,
		tw: 5,
		grade: 'S460',
		partGrades: { web: 'S355' }
	},
	{ kind: 'channel', h: 400, b: 150, tw: 4, tf: 5, r: 8, grade: 'S355' },
	{ kind: 'tee', fabrication: 'welded', h: 300, b: 300, tw: 6, tf: 8, weldLeg: 4, grade: 'S355' },
	{ kind: 'angle', h: 200, b: 150, t: 6, r: 10, rToe: 5, grade: 'S355' },
	{
		kind: 'rectangular-hollow',
		h: 400,
		b: 200,
		t: 4,
		ro: 6,
		ri: 2,
		fabrication: 'cold-formed',
		grade: 'S355'
	},
	{
		kind: 'box',
		h: 1000,
		b: 900,
		tw: 6,
		tfTop: 8,
		tfBottom: 10,
		webGap: 700,
		weldLeg: 4,
		grade: 'S355'
	},
	{
		kind: 'rectangular-hollow',
		h: 200,
		b: 100,
		t: 10,
		ro: 15,
		ri: 10,
		fabrication: 'hot-finished',
		grade: 'S355'
	}
];

describe('workings of effective sections', () => {
	it.each(sections)('give their results when the numbers are put in: $kind', (definition) => {
		const model = testModel(definition, { gammaM0: 1.05 });
		for (const sense of ['plusMy', 'minusMy', 'plusMz', 'minusMz'] as const)
			effectiveMoment(model, sense);
		effectiveAxial(model);
		const workings = Object.entries(model.workings.explanation());
		expect(workings.length).toBeGreaterThan(40);
		for (const [key, { formula, inputs, result }] of workings) {
			const found = formulaValue(formula, inputs);
			const value = found.ok ? found.value : Number.NaN;
			const scale = Math.max(Math.abs(result.value), 1e-6);
			expect(Math.abs(value - result.value), `${key}: ${formula}`).toBeLessThanOrEqual(
				1e-9 * scale
			);
		}
	});

	it('stand under the names of element, part and figure', () => {
		const model = testModel(sections[0]!);
		const { effective, value } = effectiveMoment(model, 'plusMy')!;
		const web = effective.elements.find(({ element }) => element === 'web')!;
		const at = (key: string) => model.workings.get(key)?.result.value;
		expect(at(workingKey.effectiveWidth('+My', 'web', 'web'))).toBe(web.effective);
		expect(at(workingKey.effectiveWidthFigure('+My', 'web', 'web', 'rho'))).toBe(web.rho);
		expect(at(workingKey.effective('+My', 'area'))).toBe(effective.area);
		expect(at(workingKey.effective('+My', 'moment'))).toBe(value);
	});
});
