import { firstYieldOf } from '../response/first-yield';
import type { Mechanics } from '../response/law-groups';
import { plasticMomentOf, type PlasticState } from '../response/plastic';
import type { PreparedSection } from '../section/prepared';

/** The contract's `moment`: kNm, N = 0, each about its axis with the other curvature zero. */
export interface MomentFigures {
	firstYieldY: number | null;
	firstYieldZ: number | null;
	plasticY: number | null;
	plasticZ: number | null;
	plasticNeutralAxisZ: number | null;
	plasticNeutralAxisY: number | null;
	shapeFactorY: number | null;
	shapeFactorZ: number | null;
}

export type AxisSense = 'plusMy' | 'minusMy' | 'plusMz' | 'minusMz';

/** Both limits of pure bending in one sense; kNm. */
export interface BendingLimits {
	readonly axisAngle: number;
	readonly plastic: PlasticState;
	readonly firstYield: number | null;
}

export type SectionMoments = Readonly<Record<AxisSense, BendingLimits>>;

export const axisAngles: Readonly<Record<AxisSense, number>> = {
	plusMy: 0,
	minusMy: 180,
	plusMz: 90,
	minusMz: 270
};

/** Limits of pure bending in four senses; with `even` strengths a moment turned round is the same. */
export function sectionMoments(mechanics: Mechanics, even: boolean): SectionMoments {
	const at = (sense: AxisSense): BendingLimits => {
		const axisAngle = axisAngles[sense];
		const path = { axisAngle, transverse: 'curvature-zero', N: 0 } as const;
		return {
			axisAngle,
			plastic: plasticMomentOf(mechanics, path),
			firstYield: firstYieldOf(mechanics, path).moment
		};
	};
	const [plusMy, plusMz] = [at('plusMy'), at('plusMz')];
	return {
		plusMy,
		minusMy: even ? { ...plusMy, axisAngle: 180 } : at('minusMy'),
		plusMz,
		minusMz: even ? { ...plusMz, axisAngle: 270 } : at('minusMz')
	};
}

/**
 * The same limits as a resistance takes them: a moment about one axis with no moment across it. A
 * section that bends straight keeps its figures; an angle turns its neutral axis and bears less.
 */
export function resistingMoments(
	mechanics: Mechanics,
	{ gross }: PreparedSection,
	moments: SectionMoments
): SectionMoments {
	const straight = bendsStraight(gross);
	const own = (sense: AxisSense): BendingLimits => {
		const limits = moments[sense];
		if (straight && leavesNoMomentAcross(limits)) return limits;
		const { axisAngle } = limits;
		const path = { axisAngle, transverse: 'moment-zero', N: 0 } as const;
		return {
			axisAngle,
			plastic: plasticMomentOf(mechanics, path),
			firstYield: firstYieldOf(mechanics, path).moment
		};
	};
	return {
		plusMy: own('plusMy'),
		minusMy: own('minusMy'),
		plusMz: own('plusMz'),
		minusMz: own('minusMz')
	};
}

/** Share of a moment below which the moment across it is rounding. */
const nothingAcross = 1e-9;

const bendsStraight = ({ secondMomentY, secondMomentZ, productYZ }: PreparedSection['gross']) =>
	Math.abs(productYZ) <= nothingAcross * Math.min(secondMomentY, secondMomentZ);

function leavesNoMomentAcross({ axisAngle, plastic: { My, Mz } }: BendingLimits): boolean {
	if (My === null || Mz === null) return true;
	const [along, across] = axisAngle % 180 === 0 ? [My, Mz] : [Mz, My];
	return Math.abs(across) <= nothingAcross * Math.abs(along);
}

export function momentFigures(
	{ gross: { centroid } }: PreparedSection,
	{ plusMy, minusMy, plusMz, minusMz }: SectionMoments
): MomentFigures {
	const firstYieldY = least(plusMy.firstYield, minusMy.firstYield);
	const firstYieldZ = least(plusMz.firstYield, minusMz.firstYield);
	const [plasticY, plasticZ] = [plusMy.plastic.moment, plusMz.plastic.moment];
	const levelY = plusMy.plastic.neutralAxis?.distance;
	const levelZ = plusMz.plastic.neutralAxis?.distance;
	return {
		firstYieldY,
		firstYieldZ,
		plasticY,
		plasticZ,
		plasticNeutralAxisZ: levelY === undefined ? null : centroid.z + levelY,
		plasticNeutralAxisY: levelZ === undefined ? null : centroid.y - levelZ,
		shapeFactorY: ratio(plasticY, firstYieldY),
		shapeFactorZ: ratio(plasticZ, firstYieldZ)
	};
}

const least = (a: number | null, b: number | null) =>
	a === null || b === null ? null : Math.min(a, b);

const ratio = (a: number | null, b: number | null) => (a === null || !b ? null : a / b);
