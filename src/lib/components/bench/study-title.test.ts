import { expect, it } from 'vitest';
import { openingStudy } from './study';
import { studyTitle } from './study-title';

const girder = {
	shape: null,
	section: { ...openingStudy.section, h: 951.8 } as typeof openingStudy.section
};

it('names a section by its kind and size, in the units and with the decimal mark in use', () => {
	expect(studyTitle(girder)).toBe('Plate girder 951.8 × 400');
	expect(studyTitle(girder, { system: 'si', decimal: 'comma' })).toBe('Plate girder 951,8 × 400');
	// 951.8 / 25.4 = 37.4724…, 400 / 25.4 = 15.7480…
	expect(studyTitle(girder, { system: 'us', decimal: 'point' })).toBe(
		'Plate girder 37.472 × 15.748\u00a0in'
	);
});

it('keeps the designation of a catalogue shape as it is', () => {
	expect(studyTitle({ ...girder, shape: 'W14X90' }, { system: 'us', decimal: 'comma' })).toBe(
		'W14X90'
	);
});
