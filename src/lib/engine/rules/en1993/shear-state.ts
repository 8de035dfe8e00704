import type { Mechanics } from '../../response/law-groups';
import type { Demand } from '../result';
import type { EnModel } from './model';
import type { ShearLoss } from './moment-shear';
import { plateGirderOf } from './plate-girder';
import type { AxisShear, ShearResistances } from './shear-resistance';

/** What the shear of one demand does to the strength of the section, 6.2.8 and 6.2.10. */
export interface ShearState {
	readonly resistances: ShearResistances;
	/** ρ along each axis: strength that the shear area loses; 0 up to half of the resistance. */
	readonly rhoY: number;
	readonly rhoZ: number;
	readonly high: boolean;
	/** Shear along z buckles the web of a girder, so that EN 1993-1-5 7.1 stands for 6.2.8. */
	readonly buckled: boolean;
}

export const noShear = (resistances: ShearResistances): ShearState => ({
	resistances,
	rhoY: 0,
	rhoZ: 0,
	high: false,
	buckled: false
});

/** Beyond half of the resistance by more than rounding. */
const half = 0.5 * (1 + 1e-12);

/** ρ = (2V/VRd − 1)², 6.2.8(3); at most 1. */
function reduction(V: number, axis: AxisShear | null): number {
	if (V === 0 || axis === null) return 0;
	const share = Math.abs(V) / (axis.buckling === null ? axis.plastic : axis.resistance);
	return share > half ? Math.min(1, (2 * share - 1) ** 2) : 0;
}

export function shearState(
	{ section }: EnModel,
	{ Vy = 0, Vz = 0 }: Demand,
	resistances: ShearResistances
): ShearState {
	const girder = plateGirderOf(section.definition);
	const buckled = girder !== null && resistances.z !== null && resistances.z.buckling !== null;
	const rhoY = reduction(Vy, resistances.y);
	const rhoZ = buckled ? 0 : reduction(Vz, resistances.z);
	return { resistances, rhoY, rhoZ, high: rhoY > 0 || rhoZ > 0, buckled };
}

/** What each shear area loses, for the plastic block. */
export const shearLosses = ({ resistances: { y, z }, rhoY, rhoZ }: ShearState): ShearLoss[] => [
	...(y && rhoY > 0 ? [{ shear: y, rho: rhoY }] : []),
	...(z && rhoZ > 0 ? [{ shear: z, rho: rhoZ }] : [])
];

/** Plastic resistance to N beside the shear, kN, design. */
export function shearedAxial(model: EnModel, mechanics: Mechanics): number {
	const { section, strengths, code } = model;
	if (!strengths.hybrid) return (mechanics.squash * 1e-3) / code.gammaM0;
	const whole = section.gross.area * strengths.least;
	return (Math.min(whole, mechanics.squash) * 1e-3) / code.gammaM0;
}
