import { bending } from '$lib/engine/response/respond';
import type { Demand } from '$lib/engine/rules/result';
import type { VerdictRuler } from '$lib/engine/rules/verdict';
import type { PreparedSection } from '$lib/engine/section/prepared';

/** What the ruler shows, all as sizes of moment, kNm, along the demand's own axis with its N held. */
export interface RulerModel {
	/** Degrees from y; that of the demand's moment. */
	readonly axisAngle: number;
	readonly demand: number | null;
	readonly count: number | null;
	readonly firstYield: number | null;
	readonly plastic: number | null;
	readonly axis: 'y–y' | 'z–z' | 'turned';
	/** Top (about y–y) or left (about z–z) in tension. */
	readonly negative: boolean;
	/** kN, held. */
	readonly N: number;
}

const degrees = 180 / Math.PI;

/**
 * The ruler of one demand. Where rules gave the verdict its figures are shown as they are; where
 * none reach the section, first yield and full plastic are the section's own and nothing counts.
 */
export function rulerModel(
	section: PreparedSection,
	ruled: VerdictRuler | null,
	demand: Demand
): RulerModel {
	const { axisAngle, ...figures } = ruled ? fromRules(ruled) : ownFigures(section, demand);
	const turn = ((axisAngle % 360) + 360) % 360;
	const about = (angle: number) => Math.abs(turn - angle) < 1e-6;
	return {
		axisAngle,
		...figures,
		axis: about(0) || about(180) ? 'y–y' : about(90) || about(270) ? 'z–z' : 'turned',
		negative: about(180) || about(270),
		N: demand.N ?? 0
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
