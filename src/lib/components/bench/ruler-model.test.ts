import { describe, expect, it } from 'vitest';
import { analyse } from '$lib/engine/rules/analyse';
import type { Demand } from '$lib/engine/rules/result';
import { verdict } from '$lib/engine/rules/verdict';
import type { SectionDefinition } from '$lib/engine/section/definition';
import { prepareSection } from '$lib/engine/section/prepare';
import { defaultPreferences } from '$lib/units';
import { rulerModel } from './ruler-model';
import { rulerPath, rulerText } from './ruler-text';
import { openingStudy } from './study';

function ruler(definition: SectionDefinition, demand: Demand) {
	const built = prepareSection(definition);
	if (!built.ok) throw new Error('cannot be built');
	const figures = analyse(built.value, { demands: [{ name: 'A', ...demand }] });
	const { demand: named, ruler: ruled, countable } = verdict(figures, 'A');
	return rulerModel(built.value, named === null ? null : ruled, demand, countable.force);
}

/** 20 × 200, S355 (fy 345 above 16 mm): W = 20 × 200² / 6, plastic 1.5 times. */
const flat: SectionDefinition = { kind: 'flat', b: 20, h: 200, grade: 'S355' };

/** The same bar as an outline, which has no class. */
const outline: SectionDefinition = {
	kind: 'outline',
	outer: [
		[0, 0],
		[20, 0],
		[20, 200],
		[0, 200]
	],
	grade: 'S355'
};

describe('the ruler of a demand', () => {
	it('counts up to first yield in class 3', () => {
		const model = ruler(openingStudy.section, { My: 2400 });
		expect(model.demand).toBe(2400);
		expect(model.count).toBeCloseTo(model.firstYield ?? NaN, 9);
		expect(model.plastic).toBeGreaterThan(model.firstYield ?? Infinity);
		expect(rulerPath(model, defaultPreferences)).toBe('about y–y');
	});

	it('says which side is in tension, and what N is held', () => {
		const model = ruler(openingStudy.section, { My: -800, N: -250 });
		expect(model.demand).toBe(800);
		expect(rulerPath(model, defaultPreferences)).toMatch(
			/^about y–y, top in tension, N −250\.0\skN held$/
		);
	});

	it('counts nothing where no rule reaches, and still shows what the section has', () => {
		const model = ruler(outline, { My: 30 });
		expect(model.count).toBeNull();
		expect(model.firstYield).toBeCloseTo((345 * 20 * 200 ** 2) / 6e6, 6);
		expect(model.plastic).toBeCloseTo((345 * 20 * 200 ** 2) / 4e6, 6);
	});

	it('measures N without a moment in forces, up to the squash load fy A', () => {
		const model = ruler(flat, { N: -500 });
		expect(model).toMatchObject({ quantity: 'force', demand: 500, firstYield: null });
		expect(model.plastic).toBeCloseTo((345 * 20 * 200) / 1e3, 6);
		expect(rulerText(model, defaultPreferences)).toMatch(/^of compression alone; demand 500\.0.kN/);
	});

	it('counts in tension what the engine counts of N alone', () => {
		const model = ruler(openingStudy.section, { N: 900 });
		expect(model.quantity).toBe('force');
		expect(model.count).toBeGreaterThan(900);
		expect(model.plastic).toBeGreaterThanOrEqual(model.count ?? Infinity);
	});

	it('names a turned axis as a line, with the sense beside it', () => {
		const model = ruler(openingStudy.section, { My: -100, Mz: 20 });
		expect(rulerPath(model, defaultPreferences)).toBe('about an axis at −11.3°, top in tension');
	});
});
