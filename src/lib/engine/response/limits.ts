import { stressAt } from '../material/laws';
import type { Mechanics } from './law-groups';
import { plasticMomentOf, type BlockStrengths } from './plastic';
import type { BendingPath } from './state';

/** No law is followed beyond this strain, a plain number: far past any steel, and as far as sums stay exact. */
export const furthestStrain = 100;

/** What a law can give at most within `furthestStrain`, N/mm². */
const mostStresses: BlockStrengths = ({ law, most }) => ({
	tension: Number.isFinite(most.tension) ? most.tension : stressAt(law, furthestStrain),
	compression: Number.isFinite(most.compression)
		? most.compression
		: -stressAt(law, -furthestStrain)
});

/** Whether a curvature (1/mm) keeps every fibre within strains that are followed at all. */
export const isWithinReach = ({ reach }: Mechanics, curvature: number): boolean =>
	Math.abs(curvature) * reach <= furthestStrain;

/** Whether any state at all can carry N (newton). */
export function canCarry(mechanics: Mechanics, N: number): boolean {
	let [crushed, stretched] = [0, 0];
	mechanics.profiles(0).forEach(({ total }, i) => {
		const { tension, compression } = mostStresses(mechanics.groups[i]!);
		stretched += tension * total[0]!;
		crushed += compression * total[0]!;
	});
	const slack = 1e-12 * (crushed + stretched);
	return N >= -crushed - slack && N <= stretched + slack;
}

/** Nearer to the limit than this share of it, a moment would need a curvature without end. */
const unreachable = 1e-10;

/**
 * The moments about the axis (kNm) between which every state under the path's N lies; null where
 * no state carries N.
 */
export function momentLimits(mechanics: Mechanics, path: BendingPath) {
	const most = plasticMomentOf(mechanics, path, mostStresses).moment;
	const turned = { ...path, axisAngle: path.axisAngle + 180 };
	const least = plasticMomentOf(mechanics, turned, mostStresses).moment;
	if (most === null || least === null) return null;
	const margin = unreachable * Math.max(Math.abs(most), Math.abs(least));
	return { least: margin - least, most: most - margin };
}
