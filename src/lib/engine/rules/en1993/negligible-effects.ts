import type { Demand } from '../result';
import type { EnModel } from './model';

/** An effect below this share of what the section can carry is nil; from no standard. */
const nil = 1e-12;

/** The demand with effects that are nil beside the section's own capacity as zero. */
export function withoutNegligible({ mechanics, moments }: EnModel, demand: Demand): Demand {
	const { N = 0, My = 0, Mz = 0, Vy = 0, Vz = 0 } = demand;
	const force = nil * mechanics.squash * 1e-3;
	const kept = (effect: number, least: number) => (Math.abs(effect) > least ? effect : 0);
	return {
		...demand,
		N: kept(N, force),
		My: kept(My, nil * (moments.plusMy.plastic.moment ?? 0)),
		Mz: kept(Mz, nil * (moments.plusMz.plastic.moment ?? 0)),
		Vy: kept(Vy, force),
		Vz: kept(Vz, force)
	};
}
