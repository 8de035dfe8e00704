import type { Mechanics } from '../../response/law-groups';
import { plasticMomentOf, type PlasticState } from '../../response/plastic';
import type { BendingPath } from '../../response/state';

/**
 * Plastic state reached when N (kN) and M (kNm) grow together: the factor k with
 * Mpl(kN) = kM, between no load and the squash load by false position with the Illinois halving
 * (Dowell and Jarratt 1971).
 */
export function proportionalBlock(
	mechanics: Mechanics,
	path: BendingPath,
	N: number,
	M: number
): PlasticState {
	const at = (factor: number) => plasticMomentOf(mechanics, { ...path, N: factor * N });
	const beyond = (state: PlasticState, factor: number) => (state.moment ?? 0) - factor * M;
	let state = at(0);
	let [low, high] = [0, (2e-3 * mechanics.squash) / Math.abs(N)];
	let [atLow, atHigh] = [beyond(state, 0), -high * M];
	const small = 1e-13 * atLow;
	let side = 0;
	for (let i = 0; i < 60 && high - low > 1e-14 * high; i++) {
		const factor = low + (atLow / (atLow - atHigh)) * (high - low);
		const next = at(factor);
		const value = beyond(next, factor);
		if (next.moment !== null) state = next;
		if (Math.abs(value) <= small) break;
		if (value > 0) {
			[low, atLow] = [factor, value];
			if (side === 1) atHigh /= 2;
			side = 1;
		} else {
			[high, atHigh] = [factor, value];
			if (side === -1) atLow /= 2;
			side = -1;
		}
	}
	return state;
}
