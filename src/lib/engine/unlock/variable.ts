import type { SectionDefinition } from '../section/definition';
import type { PlateStock } from './plate-stock';
import type { Girder } from './proposal';

/** A size that may be changed, and how the section follows; sizes in mm. */
export interface Variable {
	readonly part: string;
	readonly field: string;
	readonly value: number;
	/** Values to try: one run for each direction, nearest first. */
	readonly runs: readonly (readonly number[])[];
	readonly changed: (girder: Girder, to: number) => Girder;
}

/** Widths and depths are tried down to this share of what they are and up to this multiple. */
const least = 0.5;
const most = 2;
/** Thicker plates of the stock: a thinner one gains no class. */
export const thicker = (stock: PlateStock, value: number): number[][] => [
	stock.thicknesses.filter((thickness) => thickness > value * (1 + 1e-9))
];

/** Multiples of a step above and below a value. */
export function around(value: number, step: number): number[][] {
	const [up, down]: [number[], number[]] = [[], []];
	const above = Math.floor(value / step + 1 + 1e-9) * step;
	for (let size = above; size <= most * value; size += step) up.push(size);
	const below = Math.ceil(value / step - 1 - 1e-9) * step;
	for (let size = below; size > 0 && size >= least * value; size -= step) down.push(size);
	return [up, down];
}

export type Sized<D extends SectionDefinition> = (definition: D, to: number) => D;

export function variable<D extends SectionDefinition>(
	part: string,
	field: string,
	value: number,
	runs: readonly (readonly number[])[],
	sized: Sized<D>
): Variable {
	const changed = (girder: Girder, to: number): Girder => ({
		...girder,
		// variables are made for the kind of the girder that they change
		definition: sized(girder.definition as D, to)
	});
	return { part, field, value, runs, changed };
}
