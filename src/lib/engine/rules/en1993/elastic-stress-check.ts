import { extentAcross } from '../../geometry/bounds';
import { frameAt } from '../../geometry/frame';
import type { GrossProperties, PreparedSection } from '../../section/prepared';
import type { EnModel } from './model';
import type { Effects } from './stress-case';

/** Elastic stress s0 + sy (y − yc) + sz (z − zc), N/mm², tension positive. */
export interface StressField {
	readonly s0: number;
	readonly sy: number;
	readonly sz: number;
}

/** Elastic stress of the gross section under N and moments; Iyz is taken where there is any. */
export function elasticField(gross: GrossProperties, { N, My, Mz }: Effects): StressField {
	const { area, secondMomentY: Iy, secondMomentZ: Iz, productYZ: Iyz } = gross;
	const whole = Iy * Iz - Iyz ** 2;
	return {
		s0: (N * 1e3) / area,
		sy: ((Mz * Iy + My * Iyz) * 1e6) / whole,
		sz: (-(My * Iz + Mz * Iyz) * 1e6) / whole
	};
}

/** An outermost fibre of a part across one direction of bending. */
export interface Fibre {
	readonly part: string;
	/** Stress of a moment of 1 kNm in that direction, N/mm². */
	readonly perMoment: number;
	readonly fy: number;
	readonly fyc: number;
}

/** A direction of bending, (My, Mz) of length 1. */
export interface Direction {
	readonly y: number;
	readonly z: number;
}

/** The two outermost fibres of every part in bending of that direction. */
export function extremeFibres({ parts, gross }: PreparedSection, { y, z }: Direction): Fibre[] {
	const { sy, sz } = elasticField(gross, { N: 0, My: y, Mz: z });
	const slope = Math.hypot(sy, sz);
	const frame = frameAt(gross.centroid, Math.atan2(-sy, sz));
	return parts.flatMap(({ name, region, material: { fy, fyc } }) => {
		const { low, high } = extentAcross(region.loops, frame);
		return [high, low].map((level) => ({ part: name, perMoment: slope * level, fy, fyc }));
	});
}

/** What the worst fibre uses, and which it is; 6.2.9.2. */
export interface FibreUse {
	readonly fibre: Fibre;
	readonly stress: number;
	readonly strength: number;
	readonly use: number;
}

/** Greatest σ over fy/γM0 with a moment of that size (kNm) and N (kN). */
export function worstFibre(
	{ section, code }: EnModel,
	fibres: readonly Fibre[],
	N: number,
	moment: number
): FibreUse {
	const axial = (N * 1e3) / section.gross.area;
	let worst: FibreUse | null = null;
	for (const fibre of fibres) {
		const stress = axial + moment * fibre.perMoment;
		const strength = (stress > 0 ? fibre.fy : fibre.fyc) / code.gammaM0;
		const use = Math.abs(stress) / strength;
		if (worst === null || use > worst.use) worst = { fibre, stress, strength, use };
	}
	return worst!;
}

/** Greatest moment (kNm) that keeps every fibre within fy/γM0 beside N; 0 where N leaves none. */
export function momentToYield(
	{ section, code }: EnModel,
	fibres: readonly Fibre[],
	N: number
): number {
	const axial = (N * 1e3) / section.gross.area;
	let most = Infinity;
	for (const { perMoment, fy, fyc } of fibres) {
		const [tension, compression] = [fy / code.gammaM0, fyc / code.gammaM0];
		if (perMoment > 0) most = Math.min(most, (tension - axial) / perMoment);
		if (perMoment < 0) most = Math.min(most, (compression + axial) / -perMoment);
		if (axial > tension || -axial > compression) return 0;
	}
	return Math.max(0, Number.isFinite(most) ? most : 0);
}
