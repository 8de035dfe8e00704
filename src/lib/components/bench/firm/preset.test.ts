import { describe, expect, it } from 'vitest';
import { openingStudy } from '../study';
import { presetDifferences, presetOf, underPreset } from './preset';

const si = { system: 'si', decimal: 'point' } as const;

describe('the firm’s preset', () => {
	it('is followed by a study that was put under it', () => {
		const preset = { gammaM0: 1.05, strengthBasis: 'code-table' as const };
		const study = underPreset(openingStudy, preset);
		expect(study).toMatchObject({ code: { gammaM0: 1.05 }, strengthBasis: 'code-table' });
		expect(presetDifferences(presetOf(study), preset, si)).toEqual([]);
	});

	it('names each choice that differs, defaults counted as chosen', () => {
		const preset = { gammaM0: 1.05, eta: 1 };
		expect(presetDifferences(presetOf(openingStudy), preset, si)).toEqual([
			{ name: 'γM0', here: '1', preset: '1.05' },
			{ name: 'η', here: '1.2', preset: '1' }
		]);
	});
});
