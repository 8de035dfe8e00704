import { firstYieldOf } from '../../response/first-yield';
import { plasticMomentOf } from '../../response/plastic';
import { sectionSymmetry } from '../../section/symmetry';
import type { DemandState } from '../result';
import { pathOf, type Effects } from './stress-case';
import type { EnModel } from './model';

/**
 * First yield and the full block of a demand's own moment under its N, both without γM0; kNm along
 * the axis at `axisAngle`. A demand without moment is measured along +My.
 */
export function demandLimits(
	model: EnModel,
	effects: Effects
): Pick<DemandState, 'axisAngle' | 'firstYield' | 'fullPlastic'> {
	const bent = effects.My !== 0 || effects.Mz !== 0;
	const along = bent ? effects : { ...effects, My: 1 };
	const path = pathOf(along, 1, sectionSymmetry(model.section));
	const { axisAngle } = path;
	if (along.N === 0 && (along.My === 0 || along.Mz === 0)) {
		const { plusMy, minusMy, plusMz, minusMz } = model.moments;
		const y = along.My < 0 ? minusMy : plusMy;
		const z = along.Mz < 0 ? minusMz : plusMz;
		const pure = along.Mz === 0 ? y : z;
		return { axisAngle, firstYield: pure.firstYield, fullPlastic: pure.plastic.moment };
	}
	return {
		axisAngle,
		firstYield: firstYieldOf(model.mechanics, path).moment,
		fullPlastic: plasticMomentOf(model.mechanics, path).moment
	};
}
