import { initialModulus } from '$lib/engine/material/laws';
import type { PreparedSection } from '$lib/engine/section/prepared';
import { transformedProperties } from '$lib/engine/section/transformed';
import { formatQuantity, unitLabel, type Preferences, type Quantity } from '$lib/units';

export interface TransformedRow {
	readonly name: string;
	readonly figure: string;
	readonly unit: string;
}

export interface TransformedRows {
	/** The modulus that they refer to, that of the first part, with its unit. */
	readonly modulus: string;
	readonly rows: readonly TransformedRow[];
}

/** Moduli this close, as a share, are one. */
const same = 1e-9;

/** Properties with every part counted by its E over that of the first; null where E is one. */
export function transformedRows(
	section: PreparedSection,
	preferences: Preferences
): TransformedRows | null {
	const moduli = section.parts.map(({ material }) => initialModulus(material.law));
	const E = moduli[0]!;
	if (moduli.every((one) => Math.abs(one - E) <= same * E)) return null;
	const { EA, EIy, EIz, EIyz, centroid } = transformedProperties(section);
	const row = (name: string, quantity: Quantity, value: number): TransformedRow => ({
		name,
		figure: formatQuantity(value, quantity, preferences, { digits: 4, grouping: 'always' }),
		unit: unitLabel(quantity, preferences)
	});
	const product = Math.abs(EIyz) > same * Math.max(EIy, EIz);
	return {
		modulus: formatQuantity(E, 'stress', preferences, { digits: 4, unit: true }),
		rows: [
			row('Area', 'area', EA / E),
			row('Second moment, y–y', 'secondMoment', EIy / E),
			row('Second moment, z–z', 'secondMoment', EIz / E),
			...(product ? [row('Product of inertia', 'secondMoment', EIyz / E)] : []),
			row('Centroid from base', 'length', centroid.z - section.bounds.bottom),
			row('Centroid from left', 'length', centroid.y - section.bounds.left)
		]
	};
}
