const slug = (text: string) =>
	text
		.toLowerCase()
		.replaceAll('×', 'x')
		.replaceAll(/[^a-z0-9.]+/g, '-')
		.replaceAll(/^-|-$/g, '');

/**
 * Stable, readable id of a catalogue shape, the same at every seeding:
 * ('EN 10365', 'IPE 300') → `en10365-ipe-300`. Part numbers of a standard stay: `EN 10056-1` →
 * `en10056-1`. Decimal points stay too, so that 2.9 mm and 29 mm differ.
 */
export const shapeId = (standardCode: string, designation: string) =>
	`${slug(standardCode.replaceAll(/\s+/g, ''))}-${slug(designation)}`;
