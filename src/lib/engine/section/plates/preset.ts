import type { GradeDefinition } from '../../material/material';
import { sizeLimits } from '../../tolerances';
import type { Plate, PlatesSection } from '../definition';

/** A size of a preset: mm, or a number of pieces. */
export interface PresetField {
	readonly name: string;
	readonly title: string;
	readonly unit: 'mm' | 'count';
	readonly default: number;
	readonly least: number;
	readonly most: number;
}

export type PresetSizes = Readonly<Record<string, number>>;

/** A shape made of free plates from a few sizes. */
export interface PlatePreset {
	readonly id: string;
	readonly title: string;
	readonly fields: readonly PresetField[];
	/** The section for given sizes, the others at their defaults; middle of the shape at y = 0, its foot at z = 0. */
	readonly section: (sizes: PresetSizes, grade: GradeDefinition) => PlatesSection;
}

/** A length, mm. */
export const length = <Name extends string>(name: Name, title: string, value: number) => ({
	name,
	title,
	unit: 'mm' as const,
	default: value,
	...sizeLimits
});

/** A length that may be 0, mm. */
export const clearance = <Name extends string>(name: Name, title: string, value: number) => ({
	...length(name, title, value),
	least: 0
});

/** A number of pieces, 0 to `most`. */
export const count = <Name extends string>(
	name: Name,
	title: string,
	value: number,
	most: number
) => ({ name, title, unit: 'count' as const, default: value, least: 0, most });

/** What a preset makes of its sizes. */
export type PresetPlates = Pick<PlatesSection, 'plates' | 'tied'>;

/** A preset from its fields and the plates it makes of their values. */
export const preset = <Name extends string>(
	id: string,
	title: string,
	fields: readonly (PresetField & { readonly name: Name })[],
	make: (sizes: Readonly<Record<Name, number>>) => PresetPlates
): PlatePreset => ({
	id,
	title,
	fields,
	section: (sizes, grade) => ({
		kind: 'plates',
		grade,
		...make(
			Object.fromEntries(
				fields.map((field) => [field.name, sizes[field.name] ?? field.default])
			) as Record<Name, number>
		)
	})
});

/** A level plate between two places along y, its middle at z. */
export const level = (
	name: string,
	from: number,
	to: number,
	z: number,
	thickness: number
): Plate => ({ name, width: to - from, thickness, y: (from + to) / 2, z, angle: 0 });

/** An upright plate between two heights, its middle at y. */
export const upright = (
	name: string,
	from: number,
	to: number,
	y: number,
	thickness: number
): Plate => ({ name, width: to - from, thickness, y, z: (from + to) / 2, angle: 90 });
