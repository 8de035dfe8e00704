import type { Bender, Bent } from './bender';

/** Where a law's end ends the path: 1/m and kNm. */
export interface PathEnd {
	reason: string;
	curvature: number;
	moment: number;
}

/** Greatest share that a fibre takes of the strain its law is followed to, and that law's reason; 0 where none ends. */
function limitUse(b: Bender, { e0, curvature, turn }: Bent): { use: number; reason: string } {
	const worst = { use: 0, reason: '' };
	const { groups } = b.mechanics;
	if (groups.every(({ law }) => law.limit === undefined)) return worst;
	const { profiles, size } = b.profiles(curvature, turn);
	groups.forEach(({ law: { limit } }, i) => {
		if (!limit) return;
		for (const level of [profiles[i]!.low, profiles[i]!.high]) {
			const strain = e0 - size * level;
			const use = strain > 0 ? strain / limit.tension : -strain / limit.compression;
			if (use > worst.use) Object.assign(worst, { use, reason: limit.reason });
		}
	});
	return worst;
}

const rounding = 1e-9;

/** Whether every fibre lies within the strains that its law is followed to. */
export const isWithinLaws = (b: Bender, bent: Bent): boolean =>
	limitUse(b, bent).use <= 1 + rounding;

/**
 * Where growing curvature first takes a fibre to the end of its law; null when no law ends, or N
 * alone goes beyond. `first` is the curvature to begin from, 1/mm.
 */
export function lawEnd(
	b: Bender,
	bent: (curvature: number) => Bent,
	first: number
): PathEnd | null {
	const useAt = (curvature: number) => limitUse(b, bent(curvature)).use;
	if (b.mechanics.groups.every(({ law }) => law.limit === undefined) || useAt(0) > 1) return null;
	let [low, high] = [0, first];
	for (let i = 0; i < 60 && useAt(high) < 1; i++) [low, high] = [high, high * 2];
	for (let i = 0; i < 60 && high - low > 1e-12 * high; i++) {
		const middle = (low + high) / 2;
		if (useAt(middle) < 1) low = middle;
		else high = middle;
	}
	const state = bent(low);
	if (!state.converged) return null;
	const { reason } = limitUse(b, bent(high));
	return { reason, curvature: low * 1e3, moment: state.forces.M * 1e-6 };
}
