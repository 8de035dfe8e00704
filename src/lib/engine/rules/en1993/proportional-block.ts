import type { Mechanics } from '../../response/law-groups';
import { plasticMomentOf, type PlasticState } from '../../response/plastic';
import type { BendingPath } from '../../response/state';

/**
 * Plastic state reached when N (kN) and M (kNm) grow together: the factor k with
 * Mpl(kN) = kM, by halving between no load and the squash load.
 */
export function proportionalBlock(
	mechanics: Mechanics,
	path: BendingPath,
	N: number,
	M: number
): PlasticState {
	const at = (factor: number) => plasticMomentOf(mechanics, { ...path, N: factor * N });
	let [low, high] = [0, (2e-3 * mechanics.squash) / Math.abs(N)];
	let state = at(0);
	for (let i = 0; i < 60 && high - low > 1e-13 * high; i++) {
		const factor = (low + high) / 2;
		const next = at(factor);
		if (next.moment !== null && next.moment >= factor * M) [low, state] = [factor, next];
		else high = factor;
	}
	return state;
}
