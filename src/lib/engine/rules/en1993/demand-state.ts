import { firstYieldOf } from '../../response/first-yield';
import { plasticMomentOf } from '../../response/plastic';
import { sectionSymmetry } from '../../section/symmetry';
import type { DemandState } from '../result';
import type { DemandChecks } from './demand-checks';
import { pathOf, type Effects } from './stress-case';
import type { EnModel } from './model';

type Ruler = Pick<
	DemandState,
	'axisAngle' | 'moment' | 'countable' | 'countableForce' | 'firstYield' | 'fullPlastic'
>;

/**
 * Where a demand stands on the ruler of its own moment, N held: what may be counted by the linear
 * sum, first yield and the full block under that N (both without γM0). kNm along the axis at
 * `axisAngle`; a demand without moment is measured along +My. N alone has a countable force (kN)
 * and no countable moment. Nothing is counted while a check is missing that may lower it.
 */
export function demandRuler(
	model: EnModel,
	effects: Effects,
	used: DemandChecks,
	countableAlone: number | null
): Ruler {
	const size = Math.hypot(effects.My, effects.Mz);
	const along = size === 0 ? { ...effects, My: 1 } : effects;
	const limits = limitsAlong(model, along);
	const { axialShare, bendingShare, withheld } = used;
	const onlyN = size === 0 && effects.N !== 0;
	const held = axialShare === null || withheld.length > 0;
	const rest = held || onlyN ? null : Math.max(0, 1 - axialShare);
	const whole = size === 0 ? countableAlone : bendingShare === null ? null : size / bendingShare;
	return {
		...limits,
		moment: size,
		countable: rest === null || whole === null ? null : rest * whole,
		countableForce: onlyN && !held ? Math.abs(effects.N) / axialShare : null
	};
}

function limitsAlong(model: EnModel, effects: Effects) {
	const path = pathOf(effects, 1, sectionSymmetry(model.section));
	const { axisAngle } = path;
	if (effects.N === 0 && (effects.My === 0 || effects.Mz === 0)) {
		const { plusMy, minusMy, plusMz, minusMz } = model.moments;
		const y = effects.My < 0 ? minusMy : plusMy;
		const z = effects.Mz < 0 ? minusMz : plusMz;
		const pure = effects.Mz === 0 ? y : z;
		return { axisAngle, firstYield: pure.firstYield, fullPlastic: pure.plastic.moment };
	}
	return {
		axisAngle,
		firstYield: firstYieldOf(model.mechanics, path).moment,
		fullPlastic: plasticMomentOf(model.mechanics, path).moment
	};
}
