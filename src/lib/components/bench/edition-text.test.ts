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
