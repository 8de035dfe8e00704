import type { FirmSettings } from '$lib/api/firm-settings';
import { codeChoiceOf } from '$lib/api/code';
import { codeChoice } from '$lib/engine/rules/code-choice';
import type { CodeChoice } from '$lib/engine/rules/result';
import { formatNumber, type Preferences } from '$lib/units';
import { editionName } from '../edition-text';
import type { Study } from '../study';

export type Preset = NonNullable<FirmSettings['code']>;

/** The code choices of a study as a firm keeps them. */
export const presetOf = ({ code, strengthBasis }: Study): Preset => ({ ...code, strengthBasis });

/** A study under the firm's choices; what the preset leaves open takes its default. */
export const underPreset = (study: Study, preset: Preset): Study => ({
	...study,
	code: codeChoice(codeChoiceOf(preset)),
	strengthBasis: preset.strengthBasis ?? 'product-standard'
});

/** One choice that differs, in words. */
export interface PresetDifference {
	readonly name: string;
	readonly here: string;
	readonly preset: string;
}

const names: Readonly<Partial<Record<keyof CodeChoice, string>>> = {
	standard: 'Edition',
	gammaM0: 'γM0',
	gammaM1: 'γM1',
	gammaM2: 'γM2',
	eta: 'η',
	classAlpha: 'α of a web under N',
	allowEffectiveClass2: 'Class 3 web as class 2',
	useStressLevel: 'Class 4 at low stress as class 3',
	ltbCurves: 'Buckling curves'
};

const words: Readonly<Record<string, string>> = {
	'actual-N': 'N as it acts',
	proportional: 'in proportion',
	general: 'general',
	'rolled-or-equivalent': 'rolled or equivalent',
	'product-standard': 'product standard',
	'code-table': 'code table'
};

/** Where the choices of two studies or presets differ; those without a say are left out. */
export function presetDifferences(
	here: Preset,
	preset: Preset,
	preferences: Preferences
): PresetDifference[] {
	const [a, b] = [codeChoice(codeChoiceOf(here)), codeChoice(codeChoiceOf(preset))];
	const told = (value: CodeChoice[keyof CodeChoice]) => {
		if (typeof value === 'number')
			return formatNumber(value, preferences, { digits: 4, trim: true });
		if (typeof value === 'boolean') return value ? 'yes' : 'no';
		return words[value] ?? editionName(value as CodeChoice['standard']);
	};
	const found = (Object.keys(names) as (keyof CodeChoice)[])
		.filter((key) => a[key] !== b[key])
		.map((key) => ({ name: names[key] ?? key, here: told(a[key]), preset: told(b[key]) }));
	const [ours, theirs] = [here, preset].map((one) => one.strengthBasis ?? 'product-standard');
	if (ours === theirs) return found;
	const basis = { name: 'Strength from', here: words[ours!]!, preset: words[theirs!]! };
	return [...found, basis];
}
