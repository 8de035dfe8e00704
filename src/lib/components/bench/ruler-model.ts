import { regionMoments } from '$lib/engine/geometry/moments';
import { squashLoad } from '$lib/engine/response/plastic';
import { bending } from '$lib/engine/response/respond';
import type { Demand } from '$lib/engine/rules/result';
import type { VerdictRuler } from '$lib/engine/rules/verdict';
import type { PreparedSection } from '$lib/engine/section/prepared';

/**
 * What the ruler shows, all as sizes: of moment, kNm, along the demand's own axis with its N held;
 * of force, kN, where N acts without a moment.
 */
export interface RulerModel {
	readonly quantity: 'moment' | 'force';
	/** Degrees from y, above −90 and up to 90: that of the demand's moment or its opposite. */
	readonly axisAngle: number;
	readonly demand: number | null;
	readonly count: number | null;
	readonly firstYield: number | null;
	readonly plastic: number | null;
	readonly axis: 'y–y' | 'z–z' | 'turned';
	/** The moment is opposite to the axis: top (about y–y) or left (about z–z) in tension. */
	readonly negative: boolean;
	/** kN, held. */
	readonly N: number;
}

const degrees = 180 / Math.PI;

/**
 * The ruler of one demand. Where rules gave the verdict its figures are shown as they are; where
 * none reach the section, first yield and full plastic are the section's own and nothing counts.
 * `countableForce`: kN, what may be counted of N alone.
 */
export function rulerModel(
	section: PreparedSection,
	ruled: VerdictRuler | null,
	demand: Demand,
	countableForce: number | null = null
): RulerModel {
	if (actsAlone(demand)) return forceRuler(section, demand.N, countableForce);
	const { axisAngle, ...figures } = ruled ? fromRules(ruled) : ownFigures(section, demand);
	const level = levelAxis(axisAngle);
	const about = (angle: number) => Math.abs(level.angle - angle) < 1e-6;
	return {
		quantity: 'moment',
		axisAngle: level.angle,
		...figures,
		axis: about(0) ? 'y–y' : about(90) ? 'z–z' : 'turned',
		negative: level.opposite,
		N: demand.N ?? 0
	};
}

const actsAlone = (demand: Demand): demand is Demand & { N: number } =>
	(demand.N ?? 0) !== 0 && !demand.My && !demand.Mz;

/** An axis as a line, above −90° and up to 90°, and whether a moment about `degrees` is opposite to it. */
export function levelAxis(degrees: number): { angle: number; opposite: boolean } {
	const turn = degrees - 360 * Math.ceil((degrees - 180) / 360);
	if (turn > -90 + 1e-9 && turn <= 90 + 1e-9) return { angle: turn, opposite: false };
	return { angle: turn > 0 ? turn - 180 : turn + 180, opposite: true };
}

/** N alone: every part at its own strength in that sense; a uniform section yields all at once. */
function forceRuler(section: PreparedSection, N: number, count: number | null): RulerModel {
	const yielding = section.parts.reduce(
		(sum, { region, material }) => sum + regionMoments(region).area * material.fy * 1e-3,
		0
	);
	return {
		quantity: 'force',
		axisAngle: 0,
		demand: Math.abs(N),
		count,
		firstYield: null,
		plastic: N < 0 ? squashLoad(section) : yielding,
		axis: 'y–y',
		negative: N < 0,
		N
	};
}

type Figures = Pick<RulerModel, 'axisAngle' | 'demand' | 'count' | 'firstYield' | 'plastic'>;

const fromRules = ({
	axisAngle,
	demand,
	countable,
	firstYield,
	fullPlastic
}: VerdictRuler): Figures => ({
	axisAngle,
	demand: demand === 0 ? null : demand,
	count: countable,
	firstYield,
	plastic: fullPlastic
});

function ownFigures(section: PreparedSection, { N = 0, My = 0, Mz = 0 }: Demand): Figures {
	const size = Math.hypot(My, Mz);
	const axisAngle = size > 0 ? Math.atan2(Mz, My) * degrees : 0;
	const bent = bending(section, {
		axisAngle,
		transverse: 'moment-zero',
		N
	});
	return {
		axisAngle,
		demand: size > 0 ? size : null,
		count: null,
		firstYield: bent.firstYield.moment,
		plastic: bent.plasticMoment
	};
}
