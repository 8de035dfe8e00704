import type { Point } from '../../../geometry/boundary';
import type { Remaining } from './remaining';

/** What a section is stressed by: a moment in one sense, or compression. */
export type EffectiveBasis = '+My' | '−My' | '+Mz' | '−Mz' | 'N';

/** Elastic stress, compression positive: `level` at the centre, and its rise along y and z; 1/mm² or any scale. */
export interface StressField {
	readonly centre: Point;
	readonly level: number;
	readonly alongY: number;
	readonly alongZ: number;
}

export const stressOf = ({ centre, level, alongY, alongZ }: StressField, at: Point): number =>
	level + alongY * (at.y - centre.y) + alongZ * (at.z - centre.z);

/**
 * Elastic stress of a section under a unit effect about its own centroid: 1 N·mm about the asked axis
 * with no moment across it (Iyz counts), or uniform compression.
 */
export function stressField(section: Remaining, basis: EffectiveBasis): StressField {
	const { y, z, secondY, secondZ, product } = section;
	const centre = { y, z };
	if (basis === 'N') return { centre, level: 1, alongY: 0, alongZ: 0 };
	const whole = secondY * secondZ - product * product;
	const sense = basis.startsWith('+') ? 1 : -1;
	return basis.endsWith('My')
		? {
				centre,
				level: 0,
				alongY: (-sense * product) / whole,
				alongZ: (sense * secondZ) / whole
			}
		: {
				centre,
				level: 0,
				alongY: (-sense * secondY) / whole,
				alongZ: (sense * product) / whole
			};
}
