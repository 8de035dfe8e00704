import type { SectionDefinition } from '$lib/engine/section/definition';
import { defaultPreferences, formatQuantity, type Preferences } from '$lib/units';
import type { Study } from './study';

type Reading = Pick<Preferences, 'system' | 'decimal'>;

/**
 * The section in few words: the shape's designation, or its kind and size in the reader's units
 * (`I-section 951.8 × 400`, `I-section 37.472 × 15.748 in`).
 */
export function studyTitle(
	{ shape, section }: Pick<Study, 'shape' | 'section'>,
	preferences: Reading = defaultPreferences
): string {
	return shape ?? sectionTitle(section, preferences);
}

function sectionTitle(section: SectionDefinition, preferences: Reading): string {
	const decimals = preferences.system === 'us' ? 3 : 1;
	const size = (value: number, unit = false) =>
		formatQuantity(value, 'length', preferences, { decimals, trim: true, unit });
	const sized = (name: string, ...values: readonly number[]) => {
		const inches = preferences.system === 'us';
		const last = values.length - 1;
		return `${name} ${values.map((value, at) => size(value, inches && at === last)).join(' × ')}`;
	};
	switch (section.kind) {
		case 'i': {
			const name = section.fabrication === 'welded' ? 'Plate girder' : 'I-section';
			return sized(name, section.h, section.b);
		}
		case 'channel':
			return sized('Channel', section.h, section.b);
		case 'tee':
			return sized('Tee', section.h, section.b);
		case 'angle':
			return sized('Angle', section.h, section.b, section.t);
		case 'rectangular-hollow':
			return sized('Hollow', section.h, section.b, section.t);
		case 'circular-hollow':
			return sized('Tube', section.d, section.t);
		case 'box':
			return sized('Box girder', section.h, section.b);
		case 'flat':
			return sized('Flat', section.b, section.h);
		case 'round':
			return sized('Round', section.d);
		case 'plates':
			return `${section.plates.length} plates`;
		case 'outline':
			return 'Outline';
	}
}
