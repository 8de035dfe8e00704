import type { Demand } from '../result';
import type { AxisSense } from '../section-moments';
import type { ClassifiedCase } from './classify';
import type { EnContext } from './en-context';
import type { Direction } from './elastic-stress-check';
import type { ShearState } from './shear-state';
import type { Effects } from './stress-case';

/** A demand as its checks take it: what acts, which way it bends, its class and its shear. */
export interface DemandCase {
	readonly context: EnContext;
	readonly demand: Demand;
	readonly name: string;
	readonly effects: Effects;
	/** Size of its moment, kNm, and its direction; a demand without one is measured along +My. */
	readonly size: number;
	readonly direction: Direction;
	readonly classified: ClassifiedCase;
	/** The class for member buckling, which no low stress betters. */
	readonly memberClass: ClassifiedCase;
	readonly shear: ShearState;
}

export const senseY = (y: number): AxisSense => (y < 0 ? 'minusMy' : 'plusMy');
export const senseZ = (z: number): AxisSense => (z < 0 ? 'minusMz' : 'plusMz');

/** The one axis that a direction bends about, or null where it bends about both. */
export function singleSense({ y, z }: Direction): AxisSense | null {
	if (z === 0) return senseY(y);
	return y === 0 ? senseZ(z) : null;
}

export function directionOf({ My, Mz }: Effects): { size: number; direction: Direction } {
	const size = Math.hypot(My, Mz);
	if (size === 0) return { size, direction: { y: 1, z: 0 } };
	return { size, direction: { y: My / size, z: Mz / size } };
}

/** Direction of a moment, degrees from y. */
export const angleOf = ({ y, z }: Direction): number =>
	z === 0 ? (y < 0 ? 180 : 0) : (Math.atan2(z, y) * 180) / Math.PI;
