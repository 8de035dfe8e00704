import type { Demand } from '$lib/engine/rules/result';
import { levelAxis } from './ruler-model';

/** How a demand bends: axis as a line, degrees from y, and the moment about it, kNm with its sign. */
export interface DemandBend {
	readonly axisAngle: number;
	readonly moment: number;
	/** Bending about both axes, free to turn: no moment but the demand's then acts. */
	readonly biaxial: boolean;
}

/** The demand's own axis and moment; null without a moment. */
export function demandBend({ My = 0, Mz = 0 }: Demand): DemandBend | null {
	const size = Math.hypot(My, Mz);
	if (size === 0) return null;
	const { angle, opposite } = levelAxis((Math.atan2(Mz, My) * 180) / Math.PI);
	return { axisAngle: angle, moment: opposite ? -size : size, biaxial: My !== 0 && Mz !== 0 };
}
