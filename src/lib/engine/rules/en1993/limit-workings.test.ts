import { describe, expect, it } from 'vitest';
import { formulaValue } from '../../explain/formula';
import { workingKey } from '../../explain/keys';
import type { SectionDefinition } from '../../section/definition';
import { classifyDemand } from './demand-class';
import { pureCases } from './model';
import { testModel } from './test-model';

const girder: SectionDefinition = {
	kind: 'i',
	fabrication: 'welded',
	h: 1000,
	b: 300,
	tf: 16,
	bBottom: 400,
	tfBottom: 25,
	tw: 9,
	weldLeg: 6,
	grade: 355,
	partGrades: { bottomFlange: 420 }
};
const sections: [string, SectionDefinition][] = [
	['mono-symmetric hybrid girder', girder],
	['tee', { kind: 'tee', fabrication: 'rolled', h: 200, b: 200, tw: 9, tf: 14, r: 12, grade: 275 }],
	['channel', { kind: 'channel', h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, grade: 355 }],
	['angle', { kind: 'angle', h: 150, b: 100, t: 10, r: 12, grade: 355 }],
	['round tube', { kind: 'circular-hollow', d: 300, t: 6, grade: { fy: 355, E: 200_000 } }],
	[
		'rectangular tube',
		{ kind: 'rectangular-hollow', fabrication: 'cold-formed', h: 300, b: 150, t: 5, grade: 355 }
	]
];

describe('workings of class limits', () => {
	it.each(
		(['EN1993-1-1:2005', 'EN1993-1-1:2022'] as const).flatMap((standard) =>
			sections.map(([name, definition]) => [name, standard, definition] as const)
		)
	)(
		'of a %s by %s give the very limits when their numbers are put in',
		(_name, standard, definition) => {
			const model = testModel(definition, { standard });
			const cases = pureCases(model);
			for (const effects of [
				{ N: -300, My: 40, Mz: 0 },
				{ N: 200, My: -60, Mz: 9 },
				{ N: 0, My: 30, Mz: -12 }
			])
				classifyDemand(model, cases, effects, `N ${effects.N}`);
			const all = Object.entries(model.workings.explanation());
			expect(all.length).toBeGreaterThan(20);
			for (const [key, { formula, inputs, result }] of all) {
				const found = formulaValue(formula, inputs);
				expect(found.ok, `${key}: ${formula}`).toBe(true);
				const value = found.ok ? found.value : NaN;
				expect(Math.abs(value / result.value - 1), `${key}: ${formula}`).toBeLessThan(1e-9);
			}
		}
	);

	it('stand under the case, part and support of their row, with the class’s own limit on top', () => {
		const model = testModel(girder);
		const { elements } = pureCases(model).plusMy;
		const web = elements.find(({ part }) => part === 'web')!;
		const key = (figure: string) => workingKey.limitFigure('plusMy', 'web', 'internal', figure);
		web.limits.forEach((limit, i) =>
			expect(model.workings.get(key(`${i + 1}`))?.result.value).toBe(limit)
		);
		const top = model.workings.get(workingKey.limits('plusMy', 'web', 'internal'));
		expect(top?.result.value).toBe(web.limits[Math.min(web.class, 3) - 1]);
		expect(model.workings.get(key('alpha'))?.result.value).toBe(web.alpha);
		expect(model.workings.get(key('psi'))?.result.value).toBe(web.psi);
	});

	it('name the branch that was used', () => {
		const formula = (definition: SectionDefinition, name: string, figure: string) => {
			const model = testModel(definition);
			pureCases(model);
			const key = workingKey.limitFigure(name, 'web', 'internal', figure);
			return model.workings.get(key)?.formula;
		};
		const even: SectionDefinition = { ...girder, bBottom: 300, tfBottom: 16, partGrades: {} };
		expect(formula(even, 'plusMy', '1')).toBe('λ_1 = 72·ε');
		expect(formula(even, 'compression', '2')).toBe('λ_2 = 38·ε');
		expect(formula(girder, 'plusMy', '1')).toBe('λ_1 = 396·ε/(13·α − 1)');
		expect(formula(girder, 'minusMy', '1')).toBe('λ_1 = 36·ε/α');
		expect(formula(girder, 'minusMy', '3')).toBe('λ_3 = 62·ε·(1 − ψ)·√(−ψ)');
	});
});
