import { expect, it } from 'vitest';
import { codeText, editionText } from './edition-text';
import { openingStudy } from './study';

it('writes γM0 and η with the reader’s decimal mark', () => {
	expect(editionText(openingStudy, { decimal: 'comma' })).toMatch(/γM0 1,00 · η 1,20$/);
	expect(editionText(openingStudy, { decimal: 'point' })).toMatch(/γM0 1\.00 · η 1\.20$/);
});

it('says whether a class 3 web is counted as class 2', () => {
	expect(codeText(openingStudy)).toContain('is counted');
	expect(codeText({ code: { allowEffectiveClass2: false } })).toContain('is not counted');
});

it('names every other choice only where it is not the usual one', () => {
	const usual = codeText(openingStudy);
	expect(usual).not.toMatch(/stress is low|proportion|rolled|γM/);
	const code = {
		standard: 'EN1993-1-1:2005',
		useStressLevel: true,
		classAlpha: 'proportional',
		ltbCurves: 'rolled-or-equivalent',
		gammaM1: 1.1
	} as const;
	const said = codeText({ code });
	for (const part of ['5.5.2(9)', 'in proportion', '6.3.2.3', 'γM1 1.1'])
		expect(said).toContain(part);
	expect(codeText({ code: { ...code, standard: 'EN1993-1-1:2022' } })).not.toContain('6.3.2.3');
});
