import type { Mechanics } from '../../response/law-groups';
import { plasticMomentOf } from '../../response/plastic';
import { sectionSymmetry } from '../../section/symmetry';
import { iSizes } from '../../section/kinds/i';
import type { SectionClass } from '../result';
import { axisAngles, type AxisSense } from '../section-moments';
import { flangesMoment, type MajorSense } from './effective/flange-moments';
import type { EnModel } from './model';
import { explainMomentUnderShear, type ReducedBy } from './moment-shear-workings';
import { mechanicsWith } from './reduced-mechanics';
import type { AxisShear } from './shear-resistance';
import { momentBesideBuckling } from './web-shear-interaction';

/** Moment resistance of one sense without shear. */
export interface CountedMoment {
	/** Mc,Rd, kNm, with its γ. */
	readonly value: number | null;
	readonly overall: SectionClass;
}

export interface MomentUnderShear {
	/** kNm, design; null where there is no moment resistance or no shear resistance. */
	readonly MyVRd: number | null;
	/** Lost share of the strength of the shear area, or of the web's moment (7.1); 0 at low shear, at most 1. */
	readonly rho: number;
	/** What lowered it; null where nothing did. */
	readonly by: ReducedBy['kind'] | null;
}

/** ρ = (2V/Vpl − 1)² of 6.2.8(3), 0 up to half of Vpl; 1 from Vpl on, where the shear check itself fails. */
export function shearLoss(V: number, plastic: number): number {
	const use = Math.abs(V) / plastic;
	return use <= 0.5 ? 0 : Math.min(1, (2 * use - 1) ** 2);
}

/**
 * Moment resistance in one sense beside the shear V (kN) across its axis: z for bending about y, y for
 * bending about z. Where a web may buckle in shear 7.1 of EN 1993-1-5 is solved for the moment, otherwise
 * 6.2.8 holds (2022: 8.2.8): nothing up to half of Vpl,Rd, beyond it (1 − ρ)fy on the shear area.
 * Never more than Mc,Rd. With N or with shear along both axes take `shearedMechanics`.
 */
export function momentUnderShear(
	model: EnModel,
	sense: AxisSense,
	counted: CountedMoment,
	V: number,
	shear: AxisShear | null,
	name: string | null = null
): MomentUnderShear {
	if (counted.value === null) return { MyVRd: null, rho: 0, by: null };
	if (V === 0) return { MyVRd: counted.value, rho: 0, by: null };
	if (shear === null) return { MyVRd: null, rho: 0, by: null };
	const found =
		shear.buckling === null
			? besideYielding(model, sense, counted, V, shear)
			: momentBesideBuckling(model, sense, counted.value, V, shear.buckling.Vbw);
	const MyVRd = found === null ? counted.value : Math.min(found.moment, counted.value);
	if (found === null) return { MyVRd, rho: 0, by: null };
	if (name !== null)
		explainMomentUnderShear(model, sense, name, { ...found, V, Mc: counted.value, MyVRd });
	return { MyVRd, rho: found.rho, by: found.kind };
}

function besideYielding(
	model: EnModel,
	sense: AxisSense,
	{ value, overall }: CountedMoment,
	V: number,
	shear: AxisShear
): ReducedBy | null {
	const rho = shearLoss(V, shear.plastic);
	if (rho === 0) return null;
	const at = { rho, resistance: shear.plastic };
	if (overall > 2) return besideElastic(model, sense, value!, at);
	return (
		equalFlanges(model, sense, at) ??
		rectangularTube(model, shear, sense, at) ??
		blockMoment(model, sense, shear, at)
	);
}

type At = Pick<ReducedBy, 'rho' | 'resistance'>;

/** 6.2.8(5): [Wpl,y − ρ Aw²/(4tw)] fy/γM0, Aw = hw tw, for an I with equal flanges of one steel. */
function equalFlanges(model: EnModel, sense: AxisSense, at: At): ReducedBy | null {
	const { section, strengths, code } = model;
	const { definition, gross } = section;
	if (definition.kind !== 'i' || !isMajor(sense) || strengths.hybrid || !strengths.even)
		return null;
	if (!sectionSymmetry(section).topBottom) return null;
	const { h, tfTop, tfBottom, tw } = iSizes(definition);
	const hw = h - tfTop - tfBottom;
	const W = gross.plasticModulusY;
	const fy = strengths.least;
	const moment = ((W - (at.rho * (hw * tw) ** 2) / (4 * tw)) * fy * 1e-6) / code.gammaM0;
	return { kind: 'equal-flanges', ...at, moment, W, hw, tw, fy };
}

/**
 * A rectangular tube: the shear area stands as two strips of the wall's thickness about mid-depth, so
 * that Wpl loses ρ Av²/(8t); 6.2.8(3) put into the form of 6.2.8(5).
 */
function rectangularTube(
	{ section: { definition, gross }, strengths, code }: EnModel,
	{ area }: AxisShear,
	sense: AxisSense,
	at: At
): ReducedBy | null {
	if (definition.kind !== 'rectangular-hollow' || strengths.hybrid || !strengths.even) return null;
	const W = isMajor(sense) ? gross.plasticModulusY : gross.plasticModulusZ;
	const { t } = definition;
	const fy = strengths.least;
	const moment = ((W - (at.rho * area ** 2) / (8 * t)) * fy * 1e-6) / code.gammaM0;
	return { kind: 'tube', ...at, moment, W, area, t, fy };
}

/** Any other class 1 or 2 section: its plastic block with (1 − ρ)fy on the shear area. */
function blockMoment(model: EnModel, sense: AxisSense, shear: AxisShear, at: At): ReducedBy {
	const mechanics = shearedMechanics(model, [{ shear, rho: at.rho }]);
	const transverse = model.section.gross.productYZ === 0 ? 'curvature-zero' : 'moment-zero';
	const path = { axisAngle: axisAngles[sense], transverse, N: 0 } as const;
	const block = plasticMomentOf(mechanics, path).moment ?? 0;
	return { kind: 'block', ...at, moment: block / model.code.gammaM0, block };
}

/**
 * Class 3 and 4: the state that gives Mc,Rd with the share 1 − ρ and that of the flanges alone with the
 * share ρ are in equilibrium together, and stress the web to (1 − ρ)fy at most: ρ Mf + (1 − ρ) Mc. Sections
 * without flanges of their own have Mf = 0. On the safe side of 6.2.8(3).
 */
function besideElastic(model: EnModel, sense: AxisSense, Mc: number, at: At): ReducedBy {
	const found = isMajor(sense) ? flangesMoment(model, sense) : null;
	const Mf = Math.min(found?.value ?? 0, Mc);
	return { kind: 'shares', ...at, moment: at.rho * Mf + (1 - at.rho) * Mc, Mf };
}

export const isMajor = (sense: AxisSense): sense is MajorSense =>
	sense === 'plusMy' || sense === 'minusMy';

/** Shear along one axis with the share ρ of strength that it takes. */
export interface ShearLoss {
	readonly shear: AxisShear;
	readonly rho: number;
}

/**
 * The section's plastic mechanics with (1 − ρ)fy on its shear areas, for M–V–N (6.2.10) and for shear
 * along both axes. A part that lies in a shear area by a share only loses that share of ρ.
 */
export function shearedMechanics(
	{ section, mechanics }: EnModel,
	losses: readonly ShearLoss[]
): Mechanics {
	if (losses.every(({ rho }) => rho === 0)) return mechanics;
	const left = (part: string) =>
		losses.reduce(
			(least, { shear, rho }) => Math.min(least, 1 - rho * (shear.shearArea.shares[part] ?? 0)),
			1
		);
	return mechanicsWith(section, ({ name, material: { fy, fyc } }) => ({
		fy: fy * left(name),
		fyc: fyc * left(name)
	}));
}
